import { readFileSync, statSync } from 'node:fs';
import type { SourceText } from '../../compiler/index';
import { WrongUse } from './WrongUse';

/** Far above anything people write; a larger file is none of ours, and is not read into memory. */
const MOST_BYTES = 64 * 1024 * 1024;

/** The text of a file, under the name it was called by; a file that cannot be read is a wrong use. */
export function readText(path: string): SourceText {
  try {
    if (statSync(path).size > MOST_BYTES) throw new WrongUse(`${path} is larger than 64 MiB.`);
    return { name: path, text: readFileSync(path, 'utf8') };
  } catch (error) {
    if (error instanceof WrongUse) throw error;
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
