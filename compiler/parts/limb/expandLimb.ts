import type { ExpandPart } from '../types';
import { expandReachingChain } from './expandReachingChain';
import { expandTwist } from './expandTwist';
import { limbIds } from './limbIds';

/** A chain of three joints that can be turned joint by joint or made to follow a goal, with twist joints on request. */
export const expandLimb: ExpandPart<'limb'> = ({ id, side }, part) => {
  const ids = limbIds(id, part);
  const made = expandReachingChain(side, id, part, ids, { kind: 'two_bone' }, {});
  const [upper = '', lower = '', end = ''] = ids.joints;
  const role = part.role ?? 'skin';
  const upperTwist = expandTwist({
    id: `${upper}_twist`,
    side,
    bone: upper,
    tip: lower,
    base: part.parent,
    driver: upper,
    count: part.twist?.upper ?? 0,
    fades: 'out',
    role,
  });
  const lowerTwist = expandTwist({
    id: `${lower}_twist`,
    side,
    bone: lower,
    tip: end,
    base: lower,
    driver: end,
    count: part.twist?.lower ?? 0,
    fades: 'in',
    role,
  });
  return {
    ...made,
    chains: { ...made.chains, ...upperTwist.chains, ...lowerTwist.chains },
    solvers: { ...made.solvers, ...upperTwist.solvers, ...lowerTwist.solvers },
  };
};
