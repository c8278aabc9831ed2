import { RULES } from '../check/rules/index';
import { deliverFindings } from '../deliver/findings';
import type { Severity } from '../findings/Finding';
import type { HouseRules } from '../schema/generated/houseTypes';
import { trialFindings } from '../trials/findings';

/** Codes whose severity is a matter of a studio's taste. Errors of the language stay errors whatever a house says. */
const OPEN_CODES: ReadonlySet<string> = new Set([
  ...RULES.map(({ code }) => code),
  ...Object.keys(trialFindings),
  ...Object.keys(deliverFindings),
]);

/** The severities that house rules change, of those they may change. */
export function houseSeverities({ severities = {} }: HouseRules): ReadonlyMap<string, Severity | 'off'> {
  return new Map(Object.entries(severities).filter(([code]) => OPEN_CODES.has(code)));
}
