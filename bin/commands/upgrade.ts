import { basename, dirname } from 'node:path';
import { emitUpgrade, planUpgrade } from '../../compiler/index';
import { readHouse } from './readHouse';
import { readParameters } from './readParameters';
import { readRig } from './readRig';
import { WrongUse } from './WrongUse';
import { writeFiles } from './writeFiles';

/** `upgrade A B`: prints, or writes, the script that turns a scene holding version A into one holding version B. */
export function upgrade(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, {
    out: { type: 'string' },
    house: { type: 'string' },
  });
  const [before, after, ...others] = positionals;
  if (before === undefined || after === undefined || others.length > 0) {
    throw new WrongUse('Name two versions: recipes or scripts.');
  }
  const houses = readHouse(values.house);
  const [from, to] = [readRig(before, houses), readRig(after, houses)];
  if (from === null || to === null) return 1;
  const text = emitUpgrade(planUpgrade(from, to));
  if (values.out === undefined) process.stdout.write(text);
  else {
    writeFiles(dirname(values.out), [{ name: basename(values.out), text, encoding: 'utf8' }]);
    console.log(`${values.out}: ${text.split('\n').length - 4} steps`);
  }
  return 0;
}
