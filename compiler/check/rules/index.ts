import type { Rule } from '../Rule';
import { constraintsCompete } from './constraints-compete';
import { controlAllLocked } from './control-all-locked';
import { controlSteersNothing } from './control-steers-nothing';
import { guideLineWithoutLength } from './guide-line-without-length';
import { landmarkUnused } from './landmark-unused';
import { limitInverted } from './limit-inverted';
import { nothingCarries } from './nothing-carries';
import { parameterUnused } from './parameter-unused';
import { restOutsideLimits } from './rest-outside-limits';
import { solversShareJoint } from './solvers-share-joint';

/** Every rule, those first whose finding most often explains the others. */
export const RULES: readonly Rule[] = [
  limitInverted,
  restOutsideLimits,
  constraintsCompete,
  solversShareJoint,
  nothingCarries,
  controlSteersNothing,
  controlAllLocked,
  guideLineWithoutLength,
  parameterUnused,
  landmarkUnused,
];
