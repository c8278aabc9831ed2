import type { ChainSpecification, TwoBoneSpecification } from '../expand/types';
import { rotate } from '../math/quat';
import type { Vec3 } from '../rig/Rig';
import { type Bend, bendOf } from './bendOf';
import { chainsByJoint } from './chainsByJoint';
import { type Hinge, hingeOf } from './hingeOf';
import { limbPositions } from './positionsOf';
import type { RuleContext } from './Rule';

/** A limb whose middle joint is a hinge, and how both lie to each other at rest. */
export interface HingedLimb {
  readonly chain: ChainSpecification;
  readonly mid: string;
  readonly hinge: Hinge;
  readonly bend: Bend;
  /** Unit direction in the world about which the hinge turns. */
  readonly axis: Vec3;
}

/** Every bent limb of two bones whose middle joint may turn in one way only. */
export function hingesOfLimbs(
  { resolved, solved }: RuleContext,
  solvers: readonly TwoBoneSpecification[],
): readonly HingedLimb[] {
  if (solvers.length === 0) return [];
  const chainOf = chainsByJoint(resolved);
  return solvers.flatMap(({ joints }) => {
    const [, mid] = joints;
    const chain = chainOf.get(mid);
    const hinge = chain ? hingeOf(chain, mid) : null;
    const places = limbPositions(solved, joints);
    const turn = solved.places.get(mid)?.turn;
    if (!chain || !hinge || !places || !turn) return [];
    const own: Vec3 = [
      Number(hinge.channel === 'rx'),
      Number(hinge.channel === 'ry'),
      Number(hinge.channel === 'rz'),
    ];
    const bend = bendOf(...places);
    return bend.degrees > 0 ? [{ chain, mid, hinge, bend, axis: rotate(turn, own) }] : [];
  });
}
