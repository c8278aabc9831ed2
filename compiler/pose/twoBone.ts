import {
  addScaledInto,
  axisAngleInto,
  crossInto,
  distanceOf,
  lengthOf,
  type Mutable,
  makeQuat,
  makeVec,
  normaliseInto,
  rejectInto,
  rotateInto,
  subInto,
} from '../math/inPlace';
import { POLE_TOLERANCE, REACH_TOLERANCE } from '../math/tolerances';

/** Reach at rest, in units of both lengths together. */
export interface RestReach {
  /** Distance from start to end, and where the middle joint stands: along that line and off it. */
  readonly distance: number;
  readonly foot: number;
  readonly height: number;
  /** Angle in radians, about start → end, from the plane the chain bends in to where its middle joint really stands. */
  readonly swivel: number;
}

export interface TwoBoneInput {
  readonly start: Mutable;
  readonly goal: Mutable;
  readonly pole: Mutable;
  /** Lengths of both bones; greater than zero. */
  upper: number;
  lower: number;
  /** Distance from start to end that the chain is asked for; at most what the goal asks. */
  asked: number;
  /** Null when the bones no longer have their rest proportions. */
  restReach: RestReach | null;
  /** Angle in radians about start → goal by which the middle joint stands off the pole's plane. */
  swivel: number;
  /** Unit direction start → end to use when goal and start fall together. */
  readonly restDirection: Mutable;
  /** Unit direction of the bend, at right angles to `restDirection`, to use when the pole names no plane. */
  readonly restBend: Mutable;
}

/** World positions of middle and end, written by `solveTwoBone`. */
export interface TwoBoneSolution {
  readonly mid: Mutable;
  readonly end: Mutable;
  /** Unit normal of the plane of the three joints: (start → goal) × bend. */
  readonly normal: Mutable;
}

const toPole = makeVec();
const side = makeVec();

/**
 * Writes the direction at right angles to the unit vector `along` in which `pole` lies from `start`; false, with
 * nothing of use written, when it names no plane.
 */
export function poleDirectionInto(
  out: Mutable,
  start: Mutable,
  along: Mutable,
  pole: Mutable,
  chainLength: number,
): boolean {
  subInto(toPole, pole, start);
  rejectInto(side, toPole, along);
  if (!(lengthOf(side) > POLE_TOLERANCE * Math.max(lengthOf(toPole), chainLength))) return false;
  // Made orthogonal twice: the first time may cancel many digits when the pole is far off along the line.
  normaliseInto(side, side);
  rejectInto(side, side, along);
  normaliseInto(out, side);
  return true;
}

const swing = makeQuat();
const carried = makeVec();

/**
 * Writes the unit direction in which the chain bends, at right angles to `along`: toward the pole, turned by the
 * swivel, or as at rest when the pole names no plane.
 */
export function bendDirectionInto(
  out: Mutable,
  along: Mutable,
  chainLength: number,
  input: Pick<TwoBoneInput, 'start' | 'pole' | 'swivel' | 'restBend' | 'restDirection'>,
): void {
  if (poleDirectionInto(out, input.start, along, input.pole, chainLength)) {
    if (input.swivel === 0) return;
    axisAngleInto(swing, along, input.swivel);
    rotateInto(out, swing, out);
    return;
  }
  rejectInto(out, input.restBend, along);
  if (!(lengthOf(out) > POLE_TOLERANCE)) {
    // The rest bend lies on the line as well; its plane's normal does not.
    crossInto(carried, input.restDirection, input.restBend);
    crossInto(out, carried, along);
  }
  normaliseInto(out, out);
}

/** Writes the unit direction from start to goal; the rest direction when they fall together. */
export function chainDirectionInto(
  out: Mutable,
  start: Mutable,
  goal: Mutable,
  chainLength: number,
  restDirection: Mutable,
): void {
  if (distanceOf(start, goal) > chainLength * REACH_TOLERANCE) {
    subInto(out, goal, start);
    normaliseInto(out, out);
  } else {
    out[0] = restDirection[0] as number;
    out[1] = restDirection[1] as number;
    out[2] = restDirection[2] as number;
  }
}

const along = makeVec();
const bend = makeVec();

/**
 * Places the middle and end of two bones of fixed length by the law of cosines: the end at `asked` on the line from
 * start to goal, as near as the bones allow; the bend toward the pole, turned by the swivel. World positions; never
 * NaN for finite input with positive lengths.
 */
export function solveTwoBone(input: TwoBoneInput, out: TwoBoneSolution): void {
  const { start, upper, lower, restReach, asked } = input;
  const most = upper + lower;
  chainDirectionInto(along, start, input.goal, most, input.restDirection);
  bendDirectionInto(bend, along, most, input);
  crossInto(out.normal, along, bend);

  // The rest reach at its present size, when it is what is asked for, so that rest comes out exactly.
  const isRest = restReach !== null && Math.abs(asked - restReach.distance * most) <= most * REACH_TOLERANCE;
  let reached = 0;
  let foot = 0;
  let height = 0;
  if (isRest) {
    reached = restReach.distance * most;
    foot = restReach.foot * most;
    height = restReach.height * most;
    if (restReach.swivel !== 0) {
      axisAngleInto(swing, along, restReach.swivel);
      rotateInto(bend, swing, bend);
    }
  } else {
    const least = Math.abs(upper - lower);
    const tolerance = most * REACH_TOLERANCE;
    reached = asked >= most - tolerance ? most : asked <= least + tolerance ? least : asked;
    const a = reached > 0 ? ((upper - lower) * (most / reached) + reached) / 2 : 0;
    foot = Math.min(upper, Math.max(-upper, a));
    // (upper − a)(upper + a) keeps the digits that upper² − a² loses near full reach.
    height = Math.sqrt(Math.max(0, (upper - foot) * (upper + foot)));
  }
  addScaledInto(out.mid, start, along, foot);
  addScaledInto(out.mid, out.mid, bend, height);
  addScaledInto(out.end, start, along, reached);
}
