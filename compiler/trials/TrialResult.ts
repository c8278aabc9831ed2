import type { LengthUnit, PoseValues } from '../rig/Rig';

/** Every trial, in the order in which they run and are shown. */
export const TRIAL_NAMES = [
  'rest',
  'zero',
  'carry',
  'mirror',
  'pole',
  'reach',
  'blend',
  'guide',
  'limits',
  'hidden',
  'containment',
  'names',
] as const;

export type TrialName = (typeof TRIAL_NAMES)[number];

/** What one trial measured on a rig. */
export interface TrialResult {
  readonly trial: TrialName;
  readonly passed: boolean;
  /** The worst that was measured, in `unit`; passed when it is at most `tolerance`. */
  readonly measured: number;
  readonly tolerance: number;
  /** The scene's unit for what moves, degrees for what turns, `things` where a trial counts. */
  readonly unit: LengthUnit | 'degrees' | 'things';
  /** How many comparisons were made; 0 when the rig has nothing that this trial is about. */
  readonly checked: number;
  /** Ids of the nodes that failed, the worst first, five at most. */
  readonly worst: readonly string[];
  /** Control values, by name, at which the worst shows; empty for rest. */
  readonly pose: PoseValues;
}
