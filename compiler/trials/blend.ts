import type { NumberOrAttribute, PoseValues } from '../rig/Rig';
import { displacement } from './displacement';
import { attributeOf, joinPoses, nudgedPose, type PoseDraft, put } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** Even pieces that a blend's way is first cut in, and halvings of the piece over which the rig moves most. */
const PIECES = 8;
const HALVINGS = 7;
/** Part of the way next to its ends over which the rig is watched. */
const END_STEP = 1e-5;
/**
 * Relative to the rig's size: the jump that is allowed. It is read off the second difference of positions over the
 * last, smallest piece, h = 1/2048 of the way, which a smooth blend makes h² times its curvature: half a turn at the
 * end of the rig has a curvature of some 20 sizes, so 5e-6 of a size. Over `END_STEP` such a blend moves 6e-5. A pop is
 * seen from about 1e-3 on, a millimetre on a metre.
 */
const POP_TOLERANCE = 1e-4;

interface Mix {
  readonly control: string;
  readonly attribute: string;
  readonly from: number;
  readonly to: number;
}

/** Attributes that fade between two ways of moving, each with the range it fades over. */
function findMixes(bench: TrialBench): readonly Mix[] {
  const { rig } = bench;
  const amounts: (NumberOrAttribute | null)[] = rig.constraints.map(({ blend }) => blend);
  for (const solver of rig.solvers) {
    if ('blend' in solver) amounts.push(solver.blend);
    if ('stretch' in solver) amounts.push(solver.stretch);
    if ('volume' in solver) amounts.push(solver.volume);
  }
  const mixes = new Map<string, Mix>();
  for (const amount of amounts) {
    const found = attributeOf(amount, bench);
    if (!found || found.attribute.labels !== null) continue;
    const { control, attribute } = found;
    const from = Math.max(0, attribute.min ?? 0);
    const to = Math.min(1, attribute.max ?? 1);
    if (from < to)
      mixes.set(`${control} ${attribute.name}`, { control, attribute: attribute.name, from, to });
  }
  return [...mixes.values()];
}

/** Walks all blends together through a pose and finds where the rig moves most over the smallest step. */
function tryFading(mixes: readonly Mix[], base: PoseValues, bench: TrialBench, tally: Tally): void {
  const { rig, poser, size } = bench;
  const poseAt = (way: number): PoseValues => {
    const draft: PoseDraft = {};
    for (const { control, attribute, from, to } of mixes) {
      put(draft, control, { [attribute]: from + (to - from) * way });
    }
    return joinPoses(base, draft);
  };
  const worldAt = (way: number): Float64Array => {
    poser.evaluate(poseAt(way));
    return poser.world.slice();
  };
  const movedMost = (a: Float64Array, b: Float64Array): number => {
    let most = 0;
    for (let i = 0; i < rig.nodes.length; i += 1) most = Math.max(most, displacement(a, i, b, i, size));
    return most;
  };
  const compare = (a: Float64Array, b: Float64Array, way: number): void => {
    const pose = poseAt(way);
    rig.nodes.forEach(({ id }, index) => {
      tally.add(displacement(a, index, b, index, size), id, pose);
    });
  };
  const stops = Array.from({ length: PIECES + 1 }, (_, index) => worldAt(index / PIECES));
  let piece = 0;
  let most = 0;
  for (let index = 0; index < PIECES; index += 1) {
    const moved = movedMost(stops[index] as Float64Array, stops[index + 1] as Float64Array);
    if (moved > most) {
      most = moved;
      piece = index;
    }
  }
  // Off its ends a blend is most likely to pop, and there the widest piece need not be.
  compare(stops[0] as Float64Array, worldAt(END_STEP), END_STEP);
  compare(stops[PIECES] as Float64Array, worldAt(1 - END_STEP), 1 - END_STEP);
  let from = stops[piece] as Float64Array;
  let to = stops[piece + 1] as Float64Array;
  let way = piece / PIECES;
  let width = 1 / PIECES;
  for (let halving = 0; halving < HALVINGS; halving += 1) {
    width /= 2;
    const middle = worldAt(way + width);
    // A pop stays in one of the halves whole, while all that moves smoothly halves with them.
    if (movedMost(from, middle) >= movedMost(middle, to)) to = middle;
    else {
      from = middle;
      way += width;
    }
  }
  const middle = worldAt(way + width / 2);
  // What a smooth motion puts halfway between both ends, but for its curvature; a jump does not.
  const halfway = from.map((value, index) => value + ((to[index] as number) - value) / 2);
  compare(halfway, middle, way + width / 2);
}

/** Every choice of space gives the same at rest, so that choosing moves nothing but what was moved before. */
function tryChoosing(bench: TrialBench, tally: Tally): void {
  const { rig, poser, evaluatedRest, size } = bench;
  const most = Math.max(0, ...rig.spaces.map(({ sources }) => sources.length));
  for (let choice = 0; choice < most; choice += 1) {
    const pose: PoseDraft = {};
    for (const { control, attribute, sources } of rig.spaces) {
      put(pose, control, { [attribute]: Math.min(choice, sources.length - 1) });
    }
    poser.evaluate(pose);
    rig.nodes.forEach(({ id }, index) => {
      tally.add(displacement(poser.world, index, evaluatedRest, index, size), id, pose);
    });
  }
}

/**
 * Nothing pops: when blends fade from one end to the other everything moves without a jump, in a pose in which both
 * ends differ, and choosing another space or blend at rest moves nothing.
 */
export function tryBlend(bench: TrialBench): TrialResult {
  const { rig, size, poser, evaluatedRest } = bench;
  const tally = new Tally('blend', rig.scene.unit, POP_TOLERANCE * size);
  tryChoosing(bench, tally);
  const mixes = findMixes(bench);
  if (mixes.length > 0) {
    tryFading(mixes, nudgedPose(bench, 4), bench, tally);
    // All the way on one side is the rest trial's.
    for (const way of [0, 0.5]) {
      const pose: PoseDraft = {};
      for (const { control, attribute, from, to } of mixes) {
        put(pose, control, { [attribute]: from + (to - from) * way });
      }
      poser.evaluate(pose);
      rig.nodes.forEach(({ id }, index) => {
        tally.add(displacement(poser.world, index, evaluatedRest, index, size), id, pose);
      });
    }
  }
  return tally.result();
}
