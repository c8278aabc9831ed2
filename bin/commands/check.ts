import { compile, type Finding } from '../../compiler/index';
import { hasErrors, printFindings } from './printFindings';
import { readHouse } from './readHouse';
import { readParameters } from './readParameters';
import { readRequest } from './readRequest';
import { WrongUse } from './WrongUse';

/** `check FILE…`: compiles recipes and prints what is wrong; writes nothing. */
export function check(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, {
    house: { type: 'string' },
    json: { type: 'boolean' },
  });
  if (positionals.length === 0) throw new WrongUse('Name at least one recipe file.');
  const houses = readHouse(values.house);
  const results = positionals.map((file) => {
    const { recipe, bases } = readRequest(file);
    const { findings } = compile({ recipe, bases, houses });
    return { file, findings, sources: [recipe, ...Object.values(bases), ...Object.values(houses)] };
  });
  if (values.json) {
    console.log(
      JSON.stringify(
        results.map(({ file, findings }) => ({ file, findings })),
        null,
        2,
      ),
    );
  } else {
    for (const { file, findings, sources } of results) {
      printFindings(findings, sources);
      console.log(`${file}: ${countWords(findings)}`);
    }
  }
  return results.some(({ findings }) => hasErrors(findings)) ? 1 : 0;
}

/** How many findings of each weight, in words. */
export function countWords(findings: readonly Finding[]): string {
  if (findings.length === 0) return 'nothing is wrong';
  const count = (severity: Finding['severity']): number =>
    findings.filter((finding) => finding.severity === severity).length;
  return `${count('error')} errors, ${count('warning')} warnings, ${count('info')} notes`;
}
