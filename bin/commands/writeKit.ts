import { dirname, join } from 'node:path';
import { makeConformanceKit } from '../../compiler/index';
import { readParameters } from './readParameters';
import { WrongUse } from './WrongUse';
import { writeFiles } from './writeFiles';

/** `kit --out DIR`: writes the conformance kit for people who write adapters. */
export function writeKit(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, { out: { type: 'string' } });
  if (positionals.length > 0) throw new WrongUse('The kit takes no files.');
  const { out } = values;
  if (out === undefined) throw new WrongUse('Say with --out into which folder to write.');
  const files = makeConformanceKit();
  for (const folder of new Set(files.map(({ name }) => dirname(name)))) {
    writeFiles(
      join(out, folder),
      files
        .filter(({ name }) => dirname(name) === folder)
        .map(({ name, text }) => ({
          name: name.slice(folder === '.' ? 0 : folder.length + 1),
          text,
          encoding: 'utf8',
        })),
    );
  }
  console.log(`${out}: ${files.length} files`);
  return 0;
}
