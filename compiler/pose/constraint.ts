import { invariant } from '../findings/invariant';
import {
  addScaledInto,
  conjugateInto,
  copyQuat,
  type Mutable,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  normaliseQuatInto,
  slerpInto,
} from '../math/inPlace';
import { IDENTITY_MAT4, invertMat4, multiplyMat4, rotationOf } from '../math/mat4';
import type { RigConstraint } from '../rig/Rig';
import { prepareAimConstraint } from './aimConstraint';
import { type RigMemory, restOf, type Step } from './RigMemory';
import {
  axisLengthsInto,
  composeInto,
  multiplyInto,
  positionInto,
  rotationInto,
  transformPointInto,
  turnAxes,
  writePosition,
} from './worldMatrices';

/** Weighs the sources of a constraint: fills `shares`, which sum to one, or says that none takes part. */
export type Weigh = (shares: Float64Array) => boolean;

function prepareWeights(constraint: RigConstraint, memory: RigMemory, blendSlot: number | null): Weigh {
  const { values } = memory;
  const own = Float64Array.from(constraint.sources, ({ weight }) => Math.max(0, weight));
  const total = own.reduce((sum, weight) => sum + weight, 0);
  if (blendSlot === null) {
    return (shares) => {
      for (let i = 0; i < own.length; i += 1) shares[i] = (own[i] as number) / total;
      return total > 0;
    };
  }
  return (shares) => {
    const share = Math.min(1, Math.max(0, values[blendSlot] as number));
    shares[0] = share;
    shares[1] = 1 - share;
    return true;
  };
}

/** Offset of the target from each source at rest, 16 numbers a source, and its rotation, 4 a source. */
function prepareOffsets(constraint: RigConstraint, memory: RigMemory) {
  const target = restOf(memory, memory.indexOf(constraint.target));
  const matrices = new Float64Array(constraint.sources.length * 16);
  const turns: Mutable[] = [];
  constraint.sources.forEach(({ node }, index) => {
    const inverse = invertMat4(restOf(memory, memory.indexOf(node)));
    invariant(inverse !== undefined, 'rest matrices hold no scale and can be inverted');
    const offset = constraint.keepOffset ? multiplyMat4(inverse, target) : IDENTITY_MAT4;
    matrices.set(offset, index * 16);
    turns.push(makeQuat(rotationOf(offset)));
  });
  return { matrices, turns };
}

/**
 * Prepares a constraint against rest; the step it returns replaces the target's part of the world matrices by the
 * weighted sources'. Sources of weight 0 take no part; with none left the target stays as it is.
 */
export function prepareConstraint(
  constraint: RigConstraint,
  memory: RigMemory,
  blendSlot: number | null,
): Step {
  const weigh = prepareWeights(constraint, memory, blendSlot);
  if (constraint.kind === 'aim') return prepareAimConstraint(constraint, memory, weigh);
  const { world } = memory;
  const t = memory.indexOf(constraint.target) * 16;
  const sources = Int32Array.from(constraint.sources, ({ node }) => memory.indexOf(node) * 16);
  const { matrices, turns } = prepareOffsets(constraint, memory);
  const shares = new Float64Array(Math.max(2, sources.length));
  const at = makeVec();
  const turn = makeQuat();
  const size = makeVec();
  const one = makeVec();
  const quat = makeQuat();
  const first = makeQuat();
  const sum = makeQuat();

  const averagePoint = (): void => {
    at.fill(0);
    for (let i = 0; i < sources.length; i += 1) {
      const share = shares[i] as number;
      if (share === 0) continue;
      positionInto(one, matrices, i * 16);
      transformPointInto(one, world, sources[i] as number, one);
      addScaledInto(at, at, one, share);
    }
  };
  const turnOf = (out: Mutable, i: number): void => {
    rotationInto(out, world, sources[i] as number);
    multiplyQuatInto(out, out, turns[i] as Mutable);
  };
  /** One: itself; two: the shorter arc; more: the sum of quaternions on one half of the sphere. */
  const averageTurn = (): void => {
    let count = 0;
    let last = 0;
    let leading = 0;
    for (let i = 0; i < sources.length; i += 1) {
      if (shares[i] === 0) continue;
      if (count === 0) leading = i;
      else last = i;
      count += 1;
    }
    turnOf(first, leading);
    copyQuat(turn, first);
    if (count === 1) return;
    if (count === 2) {
      turnOf(quat, last);
      slerpInto(turn, first, quat, shares[last] as number);
      return;
    }
    sum.fill(0);
    for (let i = leading; i < sources.length; i += 1) {
      const share = shares[i] as number;
      if (share === 0) continue;
      turnOf(quat, i);
      let dot = 0;
      for (let c = 0; c < 4; c += 1) dot += (first[c] as number) * (quat[c] as number);
      const signed = dot < 0 ? -share : share;
      for (let c = 0; c < 4; c += 1) sum[c] = (sum[c] as number) + (quat[c] as number) * signed;
    }
    normaliseQuatInto(turn, sum);
  };
  const averageScale = (): void => {
    size.fill(0);
    for (let i = 0; i < sources.length; i += 1) {
      const share = shares[i] as number;
      if (share === 0) continue;
      axisLengthsInto(one, world, sources[i] as number);
      addScaledInto(size, size, one, share);
    }
  };

  /** The one source that takes part; −1 when several do. */
  const onlyShare = (): number => {
    let only = -1;
    for (let i = 0; i < sources.length; i += 1) {
      if (shares[i] === 0) continue;
      if (only >= 0) return -1;
      only = i;
    }
    return only;
  };

  switch (constraint.kind) {
    case 'parent':
      if (sources.length === 1 && blendSlot === null) {
        const s = sources[0] as number;
        return () => {
          if (weigh(shares)) multiplyInto(world, t, world, s, matrices, 0);
        };
      }
      return () => {
        if (!weigh(shares)) return;
        const only = onlyShare();
        if (only >= 0) {
          multiplyInto(world, t, world, sources[only] as number, matrices, only * 16);
          return;
        }
        averagePoint();
        averageTurn();
        averageScale();
        composeInto(world, t, at, turn, size);
      };
    case 'point':
      return () => {
        if (!weigh(shares)) return;
        averagePoint();
        writePosition(world, t, at);
      };
    case 'orient':
      return () => {
        if (!weigh(shares)) return;
        averageTurn();
        rotationInto(quat, world, t);
        conjugateInto(quat, quat);
        multiplyQuatInto(quat, turn, quat);
        turnAxes(world, t, quat);
      };
    case 'scale':
      return () => {
        if (!weigh(shares)) return;
        averageScale();
        positionInto(at, world, t);
        rotationInto(turn, world, t);
        composeInto(world, t, at, turn, size);
      };
    default:
      return constraint satisfies never;
  }
}
