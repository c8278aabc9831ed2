import {
  addScaledInto,
  axisAngleInto,
  lengthOf,
  type Mutable,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  rotateInto,
} from '../math/inPlace';
import { REACH_TOLERANCE } from '../math/tolerances';

/** A chain of bones whose bends are scaled together, in the world as it is at rest. */
export interface ChainFold {
  /** Unit direction of each bone at rest. */
  readonly directions: readonly Mutable[];
  /** For each joint between bones: unit axis and angle in radians of one unit of fold. */
  readonly axes: readonly Mutable[];
  readonly angles: Float64Array;
  /** Fold at rest: 1 for a bent chain, whose unit is its rest bend; 0 for a straight one, whose unit is a radian. */
  readonly restFold: 0 | 1;
  /** Present length of each bone. */
  readonly lengths: Float64Array;
  /** Written: rotation of each bone from rest. */
  readonly turns: readonly Mutable[];
  /** Written: from the start to the end of the chain. */
  readonly span: Mutable;
}

/** Makes the memory of a chain whose bones have these directions at rest. */
export function makeChainFold(
  directions: readonly Mutable[],
  axes: readonly Mutable[],
  angles: readonly number[],
  restFold: 0 | 1,
): ChainFold {
  return {
    directions,
    axes,
    angles: Float64Array.from(angles),
    restFold,
    lengths: new Float64Array(directions.length),
    turns: directions.map(() => makeQuat()),
    span: makeVec(),
  };
}

/** Places tried on the way to the nearest fold that reaches far enough, or near enough. */
const SCAN_STEPS = 32;
/** Halvings of the interval found: after these a double has no place left between its ends. */
const BISECTIONS = 60;

const turn = makeQuat();
const bone = makeVec();

/** Share of the fold that joint `index` of `count` takes more (or, negative, less) at bias 1: from 1 to −1. */
function lean(index: number, count: number): number {
  return count < 2 ? 0 : 1 - (2 * index) / (count - 1);
}

/** Folds every bend to `fold` × (1 + bias × lean) of its unit; writes turns and span. */
export function foldInto(chain: ChainFold, fold: number, bias: number): void {
  const { directions, axes, angles, lengths, turns, span, restFold } = chain;
  const count = angles.length;
  for (let i = 0; i < directions.length; i += 1) {
    const here = turns[i] as Mutable;
    if (i === 0) {
      here.fill(0);
      here[3] = 1;
      span.fill(0);
    } else {
      const bend = fold * (1 + bias * lean(i - 1, count));
      axisAngleInto(turn, axes[i - 1] as Mutable, (Math.max(0, bend) - restFold) * (angles[i - 1] as number));
      multiplyQuatInto(here, turns[i - 1] as Mutable, turn);
    }
    rotateInto(bone, here, directions[i] as Mutable);
    addScaledInto(span, span, bone, lengths[i] as number);
  }
}

/** The greatest fold: the one at which the first of the bends is half a turn. */
function greatestFold(chain: ChainFold, bias: number): number {
  let most = 0;
  for (let i = 0; i < chain.angles.length; i += 1) {
    most = Math.max(most, (chain.angles[i] as number) * (1 + bias * lean(i, chain.angles.length)));
  }
  return most > 0 ? Math.PI / most : chain.restFold;
}

/**
 * Finds the fold at which start and end are `asked` apart, nearest to the fold of rest: stretched out toward 0 when
 * more is asked than at rest (0 itself at full reach), folded up when less. `SCAN_STEPS` even steps find the first interval that holds it and
 * `BISECTIONS` halvings settle it; when none does, the step that comes nearest. Writes turns and span.
 */
export function foldToDistance(chain: ChainFold, asked: number, most: number, bias: number): void {
  const { span, restFold } = chain;
  foldInto(chain, restFold, bias);
  const atRest = lengthOf(span);
  if (Math.abs(asked - atRest) <= most * REACH_TOLERANCE) return;
  const isFarther = asked > atRest;
  if (asked >= most * (1 - REACH_TOLERANCE)) {
    // At full reach the fold is 0; halving would find it only to the root of what rounding leaves.
    foldInto(chain, 0, bias);
    return;
  }
  const last = isFarther ? 0 : greatestFold(chain, bias);
  let from = restFold as number;
  let to = from;
  let bestFold = from;
  let bestMiss = Math.abs(asked - atRest);
  let isFound = false;
  for (let step = 1; step <= SCAN_STEPS; step += 1) {
    const fold = restFold + ((last - restFold) * step) / SCAN_STEPS;
    foldInto(chain, fold, bias);
    const reached = lengthOf(span);
    if (isFarther ? reached >= asked : reached <= asked) {
      to = fold;
      isFound = true;
      break;
    }
    const miss = Math.abs(asked - reached);
    if (miss < bestMiss) {
      bestMiss = miss;
      bestFold = fold;
    }
    from = fold;
  }
  if (!isFound) {
    foldInto(chain, bestFold, bias);
    return;
  }
  for (let i = 0; i < BISECTIONS; i += 1) {
    const middle = (from + to) / 2;
    if (middle === from || middle === to) break;
    foldInto(chain, middle, bias);
    const reached = lengthOf(span);
    if (isFarther ? reached >= asked : reached <= asked) to = middle;
    else from = middle;
  }
  foldInto(chain, to, bias);
}
