import { readFileSync } from 'node:fs';
import type { SourceText } from '../../compiler/index';
import { WrongUse } from './WrongUse';

/** The text of a file, under the name it was called by; a file that cannot be read is a wrong use. */
export function readText(path: string): SourceText {
  try {
    return { name: path, text: readFileSync(path, 'utf8') };
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    const reason =
      code === 'ENOENT'
        ? 'there is no such file'
        : code === 'EISDIR'
          ? 'it is a folder'
          : (code ?? 'unknown');
    throw new WrongUse(`${path} cannot be read: ${reason}.`);
  }
}
