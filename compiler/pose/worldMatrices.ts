import {
  crossInto,
  dotOf,
  lengthOf,
  type Mutable,
  makeVec,
  normaliseInto,
  perpendicularInto,
  quatFromAxesInto,
  rejectInto,
  rotateInto,
} from '../math/inPlace';
import type { Mat4 } from '../math/mat4';
import { composeMat4, multiplyMat4 } from '../math/mat4';
import { normaliseQuat } from '../math/quat';
import { DIRECTION_TOLERANCE } from '../math/tolerances';
import type { Rig, RigNode, Vec3 } from '../rig/Rig';

/** Rest transform of a node against its parent; a rounded rotation is brought to length one. */
export function restMatrix(node: RigNode): Mat4 {
  return composeMat4(node.at, normaliseQuat(node.turn));
}

/** World matrix of every node at rest, in the order of `rig.nodes`, from rest transforms alone. */
export function restWorldMatrices(rig: Rig): readonly Mat4[] {
  const byName = new Map<string, Mat4>();
  return rig.nodes.map((node) => {
    const own = restMatrix(node);
    const parent = node.parent === null ? undefined : byName.get(node.parent);
    const world = parent === undefined ? own : multiplyMat4(parent, own);
    byName.set(node.name, world);
    return world;
  });
}

/** Matrix number `index` of a flat array of world matrices. */
export function readMatrix(world: Float64Array, index: number): Mat4 {
  const o = index * 16;
  const n = (i: number): number => world[o + i] as number;
  return [n(0), n(1), n(2), 0, n(4), n(5), n(6), 0, n(8), n(9), n(10), 0, n(12), n(13), n(14), 1];
}

/** Position part of matrix number `index`, as a new value. */
export function readPosition(world: Float64Array, index: number): Vec3 {
  const o = index * 16 + 12;
  return [world[o] as number, world[o + 1] as number, world[o + 2] as number];
}

/** Writes one matrix into a flat array. */
export function writeMatrix(world: Float64Array, index: number, matrix: ArrayLike<number>): void {
  world.set(matrix, index * 16);
}

/** Position part of the matrix at `o`, written to `out`. */
export function positionInto(out: Mutable, matrices: Float64Array, o: number): void {
  out[0] = matrices[o + 12] as number;
  out[1] = matrices[o + 13] as number;
  out[2] = matrices[o + 14] as number;
}

/** Writes only the position part of the matrix at `o`. */
export function writePosition(matrices: Float64Array, o: number, at: Mutable): void {
  matrices[o + 12] = at[0] as number;
  matrices[o + 13] = at[1] as number;
  matrices[o + 14] = at[2] as number;
}

/** The matrix at `o` applied to a point. */
export function transformPointInto(out: Mutable, matrices: Float64Array, o: number, p: Mutable): void {
  const x = p[0] as number;
  const y = p[1] as number;
  const z = p[2] as number;
  const m = matrices;
  const px = (m[o] as number) * x + (m[o + 4] as number) * y + (m[o + 8] as number) * z;
  const py = (m[o + 1] as number) * x + (m[o + 5] as number) * y + (m[o + 9] as number) * z;
  const pz = (m[o + 2] as number) * x + (m[o + 6] as number) * y + (m[o + 10] as number) * z;
  out[0] = px + (m[o + 12] as number);
  out[1] = py + (m[o + 13] as number);
  out[2] = pz + (m[o + 14] as number);
}

const columnX = makeVec();
const columnY = makeVec();
const columnZ = makeVec();

function columnInto(out: Mutable, matrices: Float64Array, o: number): void {
  out[0] = matrices[o] as number;
  out[1] = matrices[o + 1] as number;
  out[2] = matrices[o + 2] as number;
}

function isZero(v: Mutable): boolean {
  return v[0] === 0 && v[1] === 0 && v[2] === 0;
}

/** Lengths of the three axes of the matrix at `o`, the third negative when the matrix mirrors. */
export function axisLengthsInto(out: Mutable, matrices: Float64Array, o: number): void {
  columnInto(columnX, matrices, o);
  columnInto(columnY, matrices, o + 4);
  columnInto(columnZ, matrices, o + 8);
  const depth = lengthOf(columnZ);
  out[0] = lengthOf(columnX);
  out[1] = lengthOf(columnY);
  crossInto(columnX, columnX, columnY);
  out[2] = dotOf(columnX, columnZ) < 0 ? -depth : depth;
}

/**
 * Rotation of the matrix at `o`, as `rotationOf` in `mat4.ts` defines it: x keeps its direction, y its plane with x.
 */
export function rotationInto(out: Mutable, matrices: Float64Array, o: number): void {
  columnInto(columnX, matrices, o);
  columnInto(columnY, matrices, o + 4);
  columnInto(columnZ, matrices, o + 8);
  normaliseInto(columnX, columnX);
  if (isZero(columnX)) {
    crossInto(columnX, columnY, columnZ);
    normaliseInto(columnX, columnX);
    if (isZero(columnX)) perpendicularInto(columnX, columnY);
  }
  normaliseInto(columnY, columnY);
  rejectInto(columnY, columnY, columnX);
  if (lengthOf(columnY) < DIRECTION_TOLERANCE) {
    normaliseInto(columnZ, columnZ);
    crossInto(columnY, columnZ, columnX);
  }
  if (lengthOf(columnY) < DIRECTION_TOLERANCE) perpendicularInto(columnY, columnX);
  else normaliseInto(columnY, columnY);
  crossInto(columnZ, columnX, columnY);
  quatFromAxesInto(out, columnX, columnY, columnZ);
}

/** Turns the axes of the matrix at `o` rigidly, whatever scale they carry; its position stays. */
export function turnAxes(matrices: Float64Array, o: number, turn: Mutable): void {
  for (let c = o; c < o + 12; c += 4) {
    columnInto(columnX, matrices, c);
    rotateInto(columnX, turn, columnX);
    matrices[c] = columnX[0] as number;
    matrices[c + 1] = columnX[1] as number;
    matrices[c + 2] = columnX[2] as number;
  }
}

/** Writes T × R × S at `o`. */
export function composeInto(
  matrices: Float64Array,
  o: number,
  at: Mutable,
  turn: Mutable,
  size: Mutable,
): void {
  const x = turn[0] as number;
  const y = turn[1] as number;
  const z = turn[2] as number;
  const w = turn[3] as number;
  const sx = size[0] as number;
  const sy = size[1] as number;
  const sz = size[2] as number;
  matrices[o] = (1 - 2 * (y * y + z * z)) * sx;
  matrices[o + 1] = 2 * (x * y + w * z) * sx;
  matrices[o + 2] = 2 * (x * z - w * y) * sx;
  matrices[o + 4] = 2 * (x * y - w * z) * sy;
  matrices[o + 5] = (1 - 2 * (x * x + z * z)) * sy;
  matrices[o + 6] = 2 * (y * z + w * x) * sy;
  matrices[o + 8] = 2 * (x * z + w * y) * sz;
  matrices[o + 9] = 2 * (y * z - w * x) * sz;
  matrices[o + 10] = (1 - 2 * (x * x + y * y)) * sz;
  matrices[o + 12] = at[0] as number;
  matrices[o + 13] = at[1] as number;
  matrices[o + 14] = at[2] as number;
}

/**
 * out[o] = a[ao] × b[bo], all affine and flat, nothing allocated; `out` must not be one of the factors' places. Their
 * fourth rows are taken to be 0 0 0 1 and are not written.
 */
export function multiplyInto(
  out: Float64Array,
  o: number,
  a: Float64Array,
  ao: number,
  b: Float64Array,
  bo: number,
): void {
  const a0 = a[ao] as number;
  const a1 = a[ao + 1] as number;
  const a2 = a[ao + 2] as number;
  const a4 = a[ao + 4] as number;
  const a5 = a[ao + 5] as number;
  const a6 = a[ao + 6] as number;
  const a8 = a[ao + 8] as number;
  const a9 = a[ao + 9] as number;
  const a10 = a[ao + 10] as number;
  for (let c = 0; c < 12; c += 4) {
    const x = b[bo + c] as number;
    const y = b[bo + c + 1] as number;
    const z = b[bo + c + 2] as number;
    out[o + c] = a0 * x + a4 * y + a8 * z;
    out[o + c + 1] = a1 * x + a5 * y + a9 * z;
    out[o + c + 2] = a2 * x + a6 * y + a10 * z;
  }
  const x = b[bo + 12] as number;
  const y = b[bo + 13] as number;
  const z = b[bo + 14] as number;
  out[o + 12] = a0 * x + a4 * y + a8 * z + (a[ao + 12] as number);
  out[o + 13] = a1 * x + a5 * y + a9 * z + (a[ao + 13] as number);
  out[o + 14] = a2 * x + a6 * y + a10 * z + (a[ao + 14] as number);
}
