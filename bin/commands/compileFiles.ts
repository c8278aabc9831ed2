import { type BuildFile, buildFiles, type Compilation, compile, type SourceText } from '../../compiler/index';
import { countWords } from './countWords';
import { hasErrors, printFindings } from './printFindings';
import { startProgress } from './progress';
import { readHouse } from './readHouse';
import { readParameters } from './readParameters';
import { readRequest } from './readRequest';
import { sayUnusedHouse } from './sayUnusedHouse';
import { trialWords } from './trialWords';
import { WrongUse } from './WrongUse';
import { writeFiles } from './writeFiles';

/** Parameter values from `name=number`, each option one of them. */
function readValues(pairs: readonly string[]): Readonly<Record<string, number>> {
  return Object.fromEntries(
    pairs.map((pair) => {
      const [name = '', text = ''] = pair.split(/=(.*)/s);
      const value = Number(text);
      if (name === '' || text.trim() === '' || !Number.isFinite(value)) {
        throw new WrongUse(`--params takes name=number, not "${pair}".`);
      }
      return [name, value];
    }),
  );
}

/** Refuses recipes whose builds would lie over one another. */
function checkNames(
  results: readonly { readonly file: string; readonly files: readonly BuildFile[] }[],
): void {
  const writers = new Map<string, string>();
  for (const { file, files } of results) {
    for (const { name } of files) {
      const other = writers.get(name);
      if (other !== undefined) throw new WrongUse(`${other} and ${file} would both write ${name}.`);
      writers.set(name, file);
    }
  }
}

/** One recipe file with what its compile gave. */
interface CompiledFile extends Pick<Compilation, 'findings' | 'rig' | 'trials'> {
  readonly file: string;
  readonly files: readonly BuildFile[];
  readonly sources: readonly SourceText[];
}

/** `compile FILE… --out DIR`: writes script, rig, findings and manifest of each recipe. */
export async function compileFiles(parameters: readonly string[]): Promise<number> {
  const { values, positionals } = readParameters(parameters, {
    out: { type: 'string' },
    character: { type: 'string' },
    params: { type: 'string', multiple: true },
    house: { type: 'string' },
    json: { type: 'boolean' },
  });
  const { out, character } = values;
  if (positionals.length === 0) throw new WrongUse('Name at least one recipe file.');
  if (out === undefined) throw new WrongUse('Say with --out into which folder to write.');
  if (character !== undefined && positionals.length > 1)
    throw new WrongUse('--character names one character: give one file.');
  const params = readValues(values.params ?? []);
  const houses = readHouse(values.house);

  // All are read before any is compiled, so that a file that is not there is said at once.
  const requests = positionals.map((file) => ({ file, ...readRequest(file) }));
  const progress = startProgress(positionals.length, { isWanted: !values.json });
  const results: CompiledFile[] = [];
  for (const [index, { file, recipe, bases }] of requests.entries()) {
    progress.show(index, file);
    const compilation = compile({
      recipe,
      bases,
      houses,
      character: { ...(character === undefined ? {} : { name: character }), params },
    });
    const sources = [recipe, ...Object.values(bases), ...Object.values(houses)];
    const { findings, rig, trials } = compilation;
    results.push({ file, findings, rig, trials, files: await buildFiles(compilation), sources });
  }
  progress.clear();
  sayUnusedHouse(values.house, houses, results);
  checkNames(results);
  writeFiles(
    out,
    results.flatMap(({ files }) => files),
  );

  if (values.json) {
    console.log(
      JSON.stringify(
        results.map(({ file, findings, trials, files }) => ({
          file,
          findings,
          trials,
          files: files.map(({ name }) => name),
        })),
        null,
        2,
      ),
    );
  } else {
    for (const { file, findings, trials, files, sources } of results) {
      printFindings(findings, sources);
      console.log(
        `${file}: ${countWords(findings)}${trialWords(trials)}; wrote ${files.map(({ name }) => name).join(', ')}`,
      );
    }
  }
  return results.some(({ findings }) => hasErrors(findings)) ? 1 : 0;
}
