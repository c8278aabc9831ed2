import type { TwoBoneSpecification } from '../../expand/types';
import { angleBetween } from '../../math/vec3';
import { STRAIGHT_TOLERANCE } from '../../solve/tolerances';
import { bendOf } from '../bendOf';
import { chainsByJoint } from '../chainsByJoint';
import { pointPath } from '../pointPath';
import { limbPositions } from '../positionsOf';
import type { Rule } from '../Rule';

/** Degrees; below it a digit in one landmark decides which way the limb folds. Common practice. */
const SLIGHT = 2;
/** Radians between the bend that was written and the one that the points show. */
const AGREED = Math.PI / 3;

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
        if (limbs.length === 0) return;
        const chainOf = chainsByJoint(resolved);
        const controls = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const { id, joints, pole } of limbs) {
          const places = limbPositions(solved, joints);
          const chain = chainOf.get(joints[1]);
          if (!places || !chain) continue;
          const { degrees, toward } = bendOf(...places);
          const place = controls.get(pole)?.place;
          const said = place?.kind === 'pole' ? place.bend : null;
          // Points and words agree which way it folds; where they do not, the points win unnoticed.
          if (said && angleBetween(said, toward) < AGREED) continue;
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
