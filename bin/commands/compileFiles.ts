import { buildFiles, compile } from '../../compiler/index';
import { countWords } from './check';
import { hasErrors, printFindings } from './printFindings';
import { readHouse } from './readHouse';
import { readParameters } from './readParameters';
import { readRequest } from './readRequest';
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

/** `compile FILE… --out DIR`: writes script, rig, findings and manifest of each recipe. */
export function compileFiles(parameters: readonly string[]): number {
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
  const isTerminal = process.stderr.isTTY && !values.json;

  const results = positionals.map((file, index) => {
    if (isTerminal) process.stderr.write(`\r${index + 1}/${positionals.length} ${file}\u001b[K`);
    const { recipe, bases } = readRequest(file);
    const compilation = compile({
      recipe,
      bases,
      houses,
      character: { ...(character === undefined ? {} : { name: character }), params },
    });
    const files = buildFiles(compilation);
    writeFiles(out, files);
    const sources = [recipe, ...Object.values(bases), ...Object.values(houses)];
    return { file, findings: compilation.findings, files: files.map(({ name }) => name), sources };
  });
  if (isTerminal) process.stderr.write('\r\u001b[K');

  if (values.json) {
    console.log(
      JSON.stringify(
        results.map(({ file, findings, files }) => ({ file, findings, files })),
        null,
        2,
      ),
    );
  } else {
    for (const { file, findings, files, sources } of results) {
      printFindings(findings, sources);
      console.log(`${file}: ${countWords(findings)}; wrote ${files.join(', ')}`);
    }
  }
  return results.some(({ findings }) => hasErrors(findings)) ? 1 : 0;
}
