import { quatFromAxisAngle, rotate } from '../math/quat';
import { POLE_TOLERANCE, REACH_TOLERANCE } from '../math/tolerances';
import { addScaled, cross, distance, length, normalise, rejectFrom, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';

/** How far apart start and end are, and where the middle joint stands: along that line and off it. */
export interface Reach {
  readonly distance: number;
  readonly foot: number;
  readonly height: number;
}

/** Reach at rest, in units of both lengths together. */
export interface RestReach extends Reach {
  /** Angle in radians, about start → end, from the plane the chain bends in to where its middle joint really stands. */
  readonly swivel: number;
}

export interface TwoBoneInput {
  readonly start: Vec3;
  readonly goal: Vec3;
  readonly pole: Vec3;
  /** Lengths of both bones; greater than zero. */
  readonly upper: number;
  readonly lower: number;
  /** Null when the bones no longer have their rest proportions. */
  readonly restReach: RestReach | null;
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
  const noise = POLE_TOLERANCE * Math.max(length(toPole), chainLength);
  // Made orthogonal twice: the first time may cancel many digits when the pole is far off along the line.
  return length(side) > noise ? normalise(rejectFrom(normalise(side), along)) : undefined;
}

function bendDirection(input: TwoBoneInput, along: Vec3): Vec3 {
  const towardPole = poleDirection(input.start, along, input.pole, input.upper + input.lower);
  if (towardPole !== undefined) return rotate(quatFromAxisAngle(along, input.swivel), towardPole);
  const bend = rejectFrom(input.restBend, along);
  if (length(bend) > POLE_TOLERANCE) return normalise(bend);
  // The rest bend lies on the line as well; its plane's normal does not.
  return normalise(cross(cross(input.restDirection, input.restBend), along));
}

/** The rest reach at its present size, when it is what is asked for; so rest comes out exactly, bent or straight. */
function restReachFor(asked: number, { upper, lower, restReach }: TwoBoneInput): RestReach | null {
  const most = upper + lower;
  if (restReach === null || Math.abs(asked - restReach.distance * most) > most * REACH_TOLERANCE) return null;
  const { distance: d, foot, height, swivel } = restReach;
  return { distance: d * most, foot: foot * most, height: height * most, swivel };
}

/** The triangle of both bones for a distance that is asked for, as near as the bones allow. */
function reachFor(asked: number, { upper, lower }: TwoBoneInput): Reach {
  const most = upper + lower;
  const least = Math.abs(upper - lower);
  const tolerance = most * REACH_TOLERANCE;
  const d = asked >= most - tolerance ? most : asked <= least + tolerance ? least : asked;
  const foot = d > 0 ? ((upper - lower) * (most / d) + d) / 2 : 0;
  const a = Math.min(upper, Math.max(-upper, foot));
  // (upper − a)(upper + a) keeps the digits that upper² − a² loses near full reach.
  return { distance: d, foot: a, height: Math.sqrt(Math.max(0, (upper - a) * (upper + a))) };
}

/**
 * Places the middle and end of two bones of fixed length by the law of cosines: the end on the goal, or as near as
 * the bones allow on the line from start to goal; the bend toward the pole, turned by the swivel. World positions;
 * never NaN for finite input with positive lengths.
 */
export function solveTwoBone(input: TwoBoneInput): TwoBoneSolution {
  const { start, goal } = input;
  const asked = distance(start, goal);
  const isApart = asked > (input.upper + input.lower) * REACH_TOLERANCE;
  const along = isApart ? normalise(sub(goal, start)) : input.restDirection;
  const bend = bendDirection(input, along);
  const rest = restReachFor(asked, input);
  const reach = rest ?? reachFor(asked, input);
  const away =
    rest === null || rest.swivel === 0 ? bend : rotate(quatFromAxisAngle(along, rest.swivel), bend);
  return {
    mid: addScaled(addScaled(start, along, reach.foot), away, reach.height),
    end: addScaled(start, along, reach.distance),
    normal: cross(along, bend),
  };
}
