import { compile } from '../../compiler/index';
import { countWords } from './countWords';
import { hasErrors, printFindings } from './printFindings';
import { startProgress } from './progress';
import { readHouse } from './readHouse';
import { readParameters } from './readParameters';
import { readRequest } from './readRequest';
import { sayUnusedHouse } from './sayUnusedHouse';
import { trialWords } from './trialWords';
import { WrongUse } from './WrongUse';

/** `check FILE…`: compiles recipes and prints what is wrong; writes nothing. */
export function check(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, {
    house: { type: 'string' },
    json: { type: 'boolean' },
  });
  if (positionals.length === 0) throw new WrongUse('Name at least one recipe file.');
  const houses = readHouse(values.house);
  // All are read before any is compiled, so that a file that is not there is said at once.
  const requests = positionals.map((file) => ({ file, ...readRequest(file) }));
  const progress = startProgress(positionals.length, { isWanted: !values.json });
  const results = requests.map(({ file, recipe, bases }, index) => {
    progress.show(index, file);
    const { findings, rig, trials } = compile({ recipe, bases, houses });
    return {
      file,
      findings,
      rig,
      trials,
      sources: [recipe, ...Object.values(bases), ...Object.values(houses)],
    };
  });
  progress.clear();
  sayUnusedHouse(values.house, houses, results);
  if (values.json) {
    console.log(
      JSON.stringify(
        results.map(({ file, findings, trials }) => ({ file, findings, trials })),
        null,
        2,
      ),
    );
  } else {
    for (const { file, findings, trials, sources } of results) {
      printFindings(findings, sources);
      console.log(`${file}: ${countWords(findings)}${trialWords(trials)}`);
    }
  }
  return results.some(({ findings }) => hasErrors(findings)) ? 1 : 0;
}
