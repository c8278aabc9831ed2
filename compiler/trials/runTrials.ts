import type { Rig } from '../rig/Rig';
import { tryBlend } from './blend';
import { tryCarry } from './carry';
import { tryContainment } from './containment';
import { tryGuide } from './guide';
import { tryHidden } from './hidden';
import { tryLimits } from './limits';
import { tryMirror } from './mirror';
import { tryNames } from './names';
import { tryPole } from './pole';
import { tryReach } from './reach';
import { tryRest } from './rest';
import { makeTrialBench, type TrialBench } from './TrialBench';
import type { TrialIntent } from './TrialIntent';
import { TRIAL_NAMES, type TrialName, type TrialResult } from './TrialResult';
import { tryZero } from './zero';

const TRIALS: Readonly<Record<TrialName, (bench: TrialBench) => TrialResult>> = {
  rest: tryRest,
  zero: tryZero,
  carry: tryCarry,
  mirror: tryMirror,
  pole: tryPole,
  reach: tryReach,
  blend: tryBlend,
  guide: tryGuide,
  limits: tryLimits,
  hidden: tryHidden,
  containment: tryContainment,
  names: tryNames,
};

/** Holds a rig against what its recipe asks of it, by evaluating it in set poses; the same rig always gives the same. */
export function runTrials(rig: Rig, intent: TrialIntent): readonly TrialResult[] {
  const bench = makeTrialBench(rig, intent);
  return TRIAL_NAMES.map((name) => TRIALS[name](bench));
}
