import { explainFinding, listFindingCodes } from '../../compiler/index';
import { readParameters } from './readParameters';
import { WrongUse } from './WrongUse';

/** `explain CODE`: prints the page of a finding. */
export function explain(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, { json: { type: 'boolean' } });
  const [code, ...others] = positionals;
  if (code === undefined || others.length > 0) throw new WrongUse('Name one finding code.');
  const explanation = explainFinding(code);
  if (!explanation)
    throw new WrongUse(`There is no finding "${code}". Codes are: ${listFindingCodes().join(', ')}`);
  console.log(values.json ? JSON.stringify(explanation, null, 2) : explanation.page.trimEnd());
  return 0;
}
