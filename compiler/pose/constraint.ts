import { invariant } from '../findings/invariant';
import type { Mat4 } from '../math/mat4';
import {
  composeMat4,
  decomposeMat4,
  IDENTITY_MAT4,
  invertMat4,
  multiplyMat4,
  rotationOf,
  transformPoint,
} from '../math/mat4';
import { conjugateQuat, multiplyQuat } from '../math/quat';
import { addScaled, ZERO } from '../math/vec3';
import type { Quat, RigConstraint, Vec3 } from '../rig/Rig';
import { averageRotation } from './averageRotation';
import {
  multiplyInto,
  readMatrix,
  readPosition,
  turnAxes,
  writeMatrix,
  writePosition,
} from './worldMatrices';

/** One source as prepared against rest: what the target is, seen from the source. */
interface PreparedSource {
  readonly node: number;
  readonly offset: Float64Array;
  readonly point: Vec3;
  readonly turn: Quat;
}

interface PreparedConstraint {
  readonly kind: RigConstraint['kind'];
  readonly target: number;
  readonly sources: readonly PreparedSource[];
  readonly weights: readonly number[];
}

function prepareSource(node: number, source: Mat4, target: Mat4, keepOffset: boolean): PreparedSource {
  const inverse = invertMat4(source);
  invariant(inverse !== undefined, 'rest matrices hold no scale and can be inverted');
  const offset = keepOffset ? multiplyMat4(inverse, target) : IDENTITY_MAT4;
  return {
    node,
    offset: Float64Array.from(offset),
    point: [offset[12], offset[13], offset[14]],
    turn: rotationOf(offset),
  };
}

function averagePoint(
  world: Float64Array,
  sources: readonly PreparedSource[],
  weights: readonly number[],
): Vec3 {
  return sources.reduce<Vec3>(
    (sum, source, i) =>
      addScaled(sum, transformPoint(readMatrix(world, source.node), source.point), weights[i] ?? 0),
    ZERO,
  );
}

function averageTurn(
  world: Float64Array,
  sources: readonly PreparedSource[],
  weights: readonly number[],
): Quat {
  const turns = sources.map((source) =>
    multiplyQuat(rotationOf(readMatrix(world, source.node)), source.turn),
  );
  return averageRotation(turns, weights);
}

function averageScale(
  world: Float64Array,
  sources: readonly PreparedSource[],
  weights: readonly number[],
): Vec3 {
  return sources.reduce<Vec3>(
    (sum, source, i) => addScaled(sum, decomposeMat4(readMatrix(world, source.node)).scale, weights[i] ?? 0),
    ZERO,
  );
}

function replacePart(
  { kind, target }: PreparedConstraint,
  world: Float64Array,
  sources: readonly PreparedSource[],
  weights: readonly number[],
): void {
  switch (kind) {
    case 'parent': {
      const [only] = sources;
      if (sources.length === 1 && only !== undefined) {
        multiplyInto(world, target * 16, world, only.node * 16, only.offset, 0);
        return;
      }
      const at = averagePoint(world, sources, weights);
      const turn = averageTurn(world, sources, weights);
      writeMatrix(world, target, composeMat4(at, turn, averageScale(world, sources, weights)));
      return;
    }
    case 'point':
      writePosition(world, target, averagePoint(world, sources, weights));
      return;
    case 'orient': {
      const own = rotationOf(readMatrix(world, target));
      turnAxes(world, target, multiplyQuat(averageTurn(world, sources, weights), conjugateQuat(own)));
      return;
    }
    case 'scale': {
      const own = rotationOf(readMatrix(world, target));
      const size = averageScale(world, sources, weights);
      writeMatrix(world, target, composeMat4(readPosition(world, target), own, size));
      return;
    }
    default:
      kind satisfies never;
  }
}

/**
 * Prepares a constraint against rest; the function it returns replaces the target's part of `world` by the weighted
 * sources'. `blend` (0 to 1, or null for the constraint's own weights) weighs the first source, the rest of 1 the
 * second. Sources of weight 0 take no part; with none left the target stays as it is.
 */
export function prepareConstraint(
  constraint: RigConstraint,
  indexOf: (name: string) => number,
  restWorld: readonly Mat4[],
): (world: Float64Array, blend: number | null) => void {
  const restOf = (node: number): Mat4 => restWorld[node] ?? IDENTITY_MAT4;
  const target = indexOf(constraint.target);
  const prepared: PreparedConstraint = {
    kind: constraint.kind,
    target,
    sources: constraint.sources.map(({ node }) =>
      prepareSource(indexOf(node), restOf(indexOf(node)), restOf(target), constraint.keepOffset),
    ),
    weights: constraint.sources.map(({ weight }) => weight),
  };
  const [first] = prepared.sources;
  // The usual case, one source that counts, is kept free of any list made while evaluating.
  if (first !== undefined && prepared.sources.length === 1 && constraint.blend === null) {
    const always = [1];
    const takesPart = (prepared.weights[0] ?? 0) > 0;
    return (world) => {
      if (takesPart) replacePart(prepared, world, prepared.sources, always);
    };
  }
  return (world, blend) => {
    const share = blend === null ? null : Math.min(1, Math.max(0, blend));
    const weightOf = (i: number): number =>
      share === null ? (prepared.weights[i] ?? 0) : i === 0 ? share : i === 1 ? 1 - share : 0;
    const taking = prepared.sources
      .map((source, i) => ({ source, weight: weightOf(i) }))
      .filter(({ weight }) => weight > 0);
    const total = taking.reduce((sum, { weight }) => sum + weight, 0);
    if (!(total > 0)) return;
    replacePart(
      prepared,
      world,
      taking.map(({ source }) => source),
      taking.map(({ weight }) => weight / total),
    );
  };
}
