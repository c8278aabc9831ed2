import { evaluationFindings } from '../check/checkEvaluationRing';
import { RULES } from '../check/rules/index';
import { deliverFindings } from '../deliver/findings';
import { documentFindings } from '../documents/findings';
import { expandFindings } from '../expand/findings';
import { expressionFindings } from '../expressions/findings';
import { poseFindings } from '../pose/findings';
import { resolveFindings } from '../resolve/findings';
import { schemaFindings } from '../schema/findings';
import { slipwayFindings } from '../slipway/findings';
import { solveFindings } from '../solve/findings';
import { syntaxFindings } from '../syntax/findings';
import { trialFindings } from '../trials/findings';
import { upgradeFindings } from '../upgrade/findings';
import type { FindingDeclaration } from './catalogue';

/** Every code the compiler can give, stage by stage; the only list there is. */
const DECLARATIONS: Readonly<Record<string, FindingDeclaration>> = {
  ...syntaxFindings,
  ...schemaFindings,
  ...documentFindings,
  ...expressionFindings,
  ...expandFindings,
  ...resolveFindings,
  ...solveFindings,
  ...evaluationFindings,
  ...Object.fromEntries(RULES.map((rule) => [rule.code, rule])),
  ...deliverFindings,
  ...trialFindings,
  ...slipwayFindings,
  ...upgradeFindings,
  ...poseFindings,
};

/** What a code stands for, or undefined for an unknown code. */
export function findDeclaration(code: string): FindingDeclaration | undefined {
  return Object.hasOwn(DECLARATIONS, code) ? DECLARATIONS[code] : undefined;
}

/** Every code, sorted. */
export function listFindingCodes(): readonly string[] {
  return Object.keys(DECLARATIONS).sort();
}
