import { expandReachingChain } from '../limb/expandReachingChain';
import { limbIds } from '../limb/limbIds';
import type { ExpandPart } from '../types';

/** A chain of four joints that folds as one; the attribute `lead` moves the fold between knee and hock. */
export const expandLegThree: ExpandPart<'leg_three'> = ({ id, side }, part) => {
  const ids = limbIds(id, part);
  const lead = { default: 0, min: -1, max: 1, note: 'moves the fold to the knee (1) or the hock (-1)' };
  return expandReachingChain(side, id, part, ids, { kind: 'reach', bias: `${ids.goal}.lead` }, { lead });
};
