import type { NumberOrAttribute, PoseValues } from '../rig/Rig';
import { bend, displacement } from './displacement';
import { attributeOf, joinPoses, nudgedPose, type PoseDraft, put } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** Even pieces that a blend's way is first cut in. */
const PIECES = 6;
/** Halvings of the piece that looks most like a jump; the further ones only while it goes on looking like one. */
const HALVINGS = { least: 6, most: 24 };
/** Part of the way next to its ends over which the rig is watched. */
const END_STEP = 1e-7;
/**
 * Relative to the rig's size: the jump that is allowed. It is read off the second difference of positions over the
 * last, smallest piece, h = 1/768 of the way or less, which a smooth blend makes h² times its curvature: half a turn
 * at the end of the rig has a curvature of some 20 sizes, so 3.4e-5 of a size. A kink shrinks with h and has vanished
 * after the further halvings; a jump stays. One is seen from about 1e-3 on, a millimetre on a metre.
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

/** A stretch of the way, with the world at both ends. */
interface Piece {
  readonly start: number;
  readonly width: number;
  readonly from: Float64Array;
  readonly to: Float64Array;
}

/**
 * The node and the two pieces that look most like a jump: where a node's motion in one piece differs from that in the
 * next by as much as it moves at all. A smooth motion, however wide, differs little from piece to piece.
 */
function findSuspect(pieces: readonly Piece[], count: number, size: number) {
  let most = { node: 0, score: 0 };
  let around: readonly [Piece, Piece] = [pieces[0] as Piece, pieces[1] as Piece];
  for (let node = 0; node < count; node += 1) {
    let first = 0;
    for (let i = 0; i < pieces.length; i += 1) {
      const { from, to } = pieces[i] as Piece;
      const second = displacement(from, node, to, node, size);
      if (i > 0 && first + second > 0) {
        const before = pieces[i - 1] as Piece;
        const off = bend(before.from, from, to, node, size);
        const score = (off * off) / (first + second);
        if (score > most.score) {
          most = { node, score };
          around = [before, pieces[i] as Piece];
        }
      }
      first = second;
    }
  }
  return { node: most.node, around };
}

/** Walks all blends together through a pose, and closes in on what looks most like a jump. */
function tryFading(mixes: readonly Mix[], base: PoseValues, bench: TrialBench, tally: Tally): void {
  const { rig, poser, size } = bench;
  const poseAt = (way: number): PoseValues => {
    const draft: PoseDraft = {};
    for (const { control, attribute, from, to } of mixes) {
      put(draft, control, { [attribute]: from + (to - from) * way });
    }
    return joinPoses(base, draft);
  };
  /** The poser's own world, which the next evaluation overwrites. */
  const worldAt = (way: number): Float64Array => {
    poser.evaluate(poseAt(way));
    return poser.world;
  };
  const compare = (a: Float64Array, b: Float64Array, way: number): void => {
    const pose = poseAt(way);
    rig.nodes.forEach(({ id }, index) => {
      tally.add(displacement(a, index, b, index, size), id, pose);
    });
  };
  const width = 1 / PIECES;
  const stops = Array.from({ length: PIECES + 1 }, (_, index) => worldAt(index * width).slice());
  const pieces = Array.from({ length: PIECES }, (_, index): Piece => {
    const [from, to] = [stops[index] as Float64Array, stops[index + 1] as Float64Array];
    return { start: index * width, width, from, to };
  });
  compare(stops[0] as Float64Array, worldAt(END_STEP), END_STEP);
  compare(stops[PIECES] as Float64Array, worldAt(1 - END_STEP), 1 - END_STEP);

  const { node, around } = findSuspect(pieces, rig.nodes.length, size);
  const bendOf = ({ start, width, from, to }: Piece): number =>
    bend(from, worldAt(start + width / 2), to, node, size);
  const [before, after] = around;
  let last = bendOf(before) > bendOf(after) ? before : after;
  const [unused] = stops.filter((stop) => stop !== last.from && stop !== last.to);
  let free = unused as Float64Array;
  for (let halving = 0; ; halving += 1) {
    const half = last.width / 2;
    const middle = worldAt(last.start + half);
    const { from, to, start } = last;
    const isSuspect = bend(from, middle, to, node, size) > POP_TOLERANCE * size;
    // Written over what is no longer looked at, so that closing in allocates nothing.
    free.set(middle);
    if (halving >= (isSuspect ? HALVINGS.most : HALVINGS.least)) {
      const pose = poseAt(start + half);
      rig.nodes.forEach(({ id }, index) => {
        tally.add(bend(from, middle, to, index, size), id, pose);
      });
      return;
    }
    // A jump stays in one of the halves whole, while all that moves smoothly halves with them.
    const isInFirst =
      displacement(last.from, node, middle, node, size) >= displacement(middle, node, last.to, node, size);
    const kept = free;
    free = isInFirst ? to : from;
    last = isInFirst
      ? { start, width: half, from, to: kept }
      : { start: start + half, width: half, from: kept, to };
  }
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
