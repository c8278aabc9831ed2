import type { TwoBoneSpecification } from '../../expand/types';
import { STRAIGHT_TOLERANCE } from '../../solve/tolerances';
import { bendOf } from '../bendOf';
import { chainsByJoint } from '../chainsByJoint';
import { pointPath } from '../pointPath';
import { limbPositions } from '../positionsOf';
import type { Rule } from '../Rule';

/** Degrees; below it a digit in one landmark decides which way the limb folds. Common practice. */
const SLIGHT = 2;

/** A limb that is all but straight folds the way its rounding errors point. */
export const limbNearlyStraight: Rule = {
  code: 'limb-nearly-straight',
  severity: 'warning',
  category: 'geometry',
  summary: 'A limb bent so little that its fold is left to chance.',
  message: '"{mid}" is bent by {degrees} degrees, too little to say surely which way "{solver}" folds.',
  help: 'Move the middle point a little further in the direction in which it should lead when the limb folds.',
  create({ resolved, solved, report }) {
    const limbs: TwoBoneSpecification[] = [];
    return {
      solver(solver) {
        if (solver.kind === 'two_bone') limbs.push(solver);
      },
      finish() {
        const chainOf = limbs.length > 0 ? chainsByJoint(resolved) : null;
        for (const { id, joints } of limbs) {
          const places = limbPositions(solved, joints);
          const chain = chainOf?.get(joints[1]);
          if (!places || !chain) continue;
          const { degrees } = bendOf(...places);
          // A straight limb says by its pole's bend which way it folds, or gets a finding of its own.
          if (degrees >= SLIGHT || (degrees * Math.PI) / 180 <= STRAIGHT_TOLERANCE * 10) continue;
          report(pointPath(chain, chain.jointIds.indexOf(joints[1])), {
            mid: joints[1],
            solver: id,
            degrees: Number(degrees.toPrecision(2)),
          });
        }
      },
    };
  },
};
