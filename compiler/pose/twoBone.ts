import { quatFromAxisAngle, rotate } from '../math/quat';
import { PLANE_TOLERANCE, REACH_TOLERANCE } from '../math/tolerances';
import { addScaled, cross, distance, length, normalise, rejectFrom, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';

export interface TwoBoneInput {
  readonly start: Vec3;
  readonly goal: Vec3;
  readonly pole: Vec3;
  /** Lengths of both bones; greater than zero. */
  readonly upper: number;
  readonly lower: number;
  /** Angle in radians about start → goal by which the middle joint stands off the pole's plane. */
  readonly swivel: number;
  /** Unit direction start → end to use when goal and start fall together. */
  readonly restDirection: Vec3;
  /** Unit direction of the bend, at right angles to `restDirection`, to use when the pole names no plane. */
  readonly restBend: Vec3;
}

export interface TwoBoneSolution {
  readonly mid: Vec3;
  readonly end: Vec3;
  /** Unit normal of the plane of the three joints: (start → goal) × bend. */
  readonly normal: Vec3;
}

/** The direction at right angles to `along` in which `pole` lies from `start`; undefined when it names no plane. */
export function poleDirection(start: Vec3, along: Vec3, pole: Vec3, chainLength: number): Vec3 | undefined {
  const toPole = sub(pole, start);
  const side = rejectFrom(toPole, along);
  const noise = PLANE_TOLERANCE * Math.max(length(toPole), chainLength);
  // Made orthogonal twice: the first time may cancel many digits when the pole is far off along the line.
  return length(side) > noise ? normalise(rejectFrom(normalise(side), along)) : undefined;
}

function bendDirection(input: TwoBoneInput, along: Vec3): Vec3 {
  const towardPole = poleDirection(input.start, along, input.pole, input.upper + input.lower);
  if (towardPole !== undefined) return rotate(quatFromAxisAngle(along, input.swivel), towardPole);
  const bend = rejectFrom(input.restBend, along);
  if (length(bend) > PLANE_TOLERANCE) return normalise(bend);
  // The rest bend lies on the line as well; its plane's normal does not.
  return normalise(cross(cross(input.restDirection, input.restBend), along));
}

/** `d` within what the chain can span, with the ends of that range reached exactly. */
function clampReach(d: number, upper: number, lower: number): number {
  const least = Math.abs(upper - lower);
  const most = upper + lower;
  if (d >= most * (1 - REACH_TOLERANCE)) return most;
  return d <= least + most * REACH_TOLERANCE ? least : d;
}

/**
 * Places the middle and end of two bones of fixed length by the law of cosines: the end on the goal, or as near as
 * the bones allow on the line from start to goal; the bend toward the pole, turned by the swivel. World positions;
 * never NaN for finite input with positive lengths.
 */
export function solveTwoBone(input: TwoBoneInput): TwoBoneSolution {
  const { start, goal, upper, lower } = input;
  const asked = distance(start, goal);
  const along = asked > (upper + lower) * REACH_TOLERANCE ? normalise(sub(goal, start)) : input.restDirection;
  const bend = bendDirection(input, along);
  const d = clampReach(asked, upper, lower);
  const foot = d > 0 ? ((upper - lower) * ((upper + lower) / d) + d) / 2 : 0;
  const a = Math.min(upper, Math.max(-upper, foot));
  // (upper − a)(upper + a) keeps the digits that upper² − a² loses near full reach.
  const height = Math.sqrt(Math.max(0, (upper - a) * (upper + a)));
  return {
    mid: addScaled(addScaled(start, along, a), bend, height),
    end: addScaled(start, along, d),
    normal: cross(along, bend),
  };
}
