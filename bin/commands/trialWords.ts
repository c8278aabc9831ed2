import type { TrialResult } from '../../compiler/index';

/** How the trials of a compile went, in a few words after a comma; nothing when none were held. */
export function trialWords(trials: readonly TrialResult[]): string {
  if (trials.length === 0) return '';
  const failed = trials.filter(({ passed }) => !passed).map(({ trial }) => trial);
  if (failed.length === 0) return `, ${trials.length} trials passed`;
  return `, ${trials.length - failed.length} of ${trials.length} trials passed (not ${failed.join(', ')})`;
}
