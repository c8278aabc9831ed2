import type { FindingList } from '../findings/FindingList';
import type { Quat } from '../rig/Rig';
import type { Span } from '../source/SourceText';
import { slipwayFindings } from './findings';
import type { PlacedStep } from './readStep';
import type { StepOf } from './Step';

/** Rotations may be written with as few as six decimals; the runner brings them to length one. */
const UNIT_TOLERANCE = 1e-5;

export type RangedStep = StepOf<'attr' | 'limit'>;

/** Whether a rest rotation has length one, as nearly as a rounded one can; else a finding. */
export function checkTurn(turn: Quat, span: Span, findings: FindingList): boolean {
  const length = Math.hypot(...turn);
  if (Math.abs(length - 1) <= UNIT_TOLERANCE) return true;
  findings.report(slipwayFindings, 'script-turn-not-unit', span, { length: Number(length.toPrecision(6)) });
  return false;
}

/** Whether min is at most max and an attribute's default lies between; else a finding. */
export function checkRange({ step, span }: PlacedStep<RangedStep>, findings: FindingList): boolean {
  const { min, max } = step.values;
  let fact = '';
  if (min !== null && max !== null && min > max) fact = `min is ${min} and max only ${max}.`;
  else if (step.verb === 'attr') {
    const initial = step.values.default;
    if (min !== null && initial < min) fact = `The default ${initial} is below min, ${min}.`;
    if (max !== null && initial > max) fact = `The default ${initial} is above max, ${max}.`;
  }
  if (fact === '') return true;
  findings.report(slipwayFindings, 'script-range-empty', span, { fact });
  return false;
}
