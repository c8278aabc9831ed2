import type { Quat, Vec3 } from '../rig/Rig';
import { quatFromAxes } from './quat';
import { DIRECTION_TOLERANCE } from './tolerances';
import { cross, dot, length, normalise, perpendicularTo, rejectFrom, ZERO } from './vec3';

/** Affine transform of column vectors, column-major: entries 0–2, 4–6, 8–10 are the axes, 12–14 the position. */
export type Mat4 = readonly [
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
];

export const IDENTITY_MAT4: Mat4 = [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1];

/** The three columns of the rotation matrix of a unit quaternion. */
export function quatToAxes(q: Quat): readonly [Vec3, Vec3, Vec3] {
  const [x, y, z, w] = q;
  return [
    [1 - 2 * (y * y + z * z), 2 * (x * y + w * z), 2 * (x * z - w * y)],
    [2 * (x * y - w * z), 1 - 2 * (x * x + z * z), 2 * (y * z + w * x)],
    [2 * (x * z + w * y), 2 * (y * z - w * x), 1 - 2 * (x * x + y * y)],
  ];
}

/** Translate × rotate × scale; `turn` a unit quaternion. */
export function composeMat4(at: Vec3, turn: Quat, size: Vec3 = [1, 1, 1]): Mat4 {
  const [x, y, z] = quatToAxes(turn);
  return matFromColumns(
    [x[0] * size[0], x[1] * size[0], x[2] * size[0]],
    [y[0] * size[1], y[1] * size[1], y[2] * size[1]],
    [z[0] * size[2], z[1] * size[2], z[2] * size[2]],
    at,
  );
}

/** The matrix with the given axes as columns and the given position. */
export function matFromColumns(x: Vec3, y: Vec3, z: Vec3, at: Vec3): Mat4 {
  return [x[0], x[1], x[2], 0, y[0], y[1], y[2], 0, z[0], z[1], z[2], 0, at[0], at[1], at[2], 1];
}

/** The three axis columns of a matrix, not normalised. */
export function columnsOf(m: Mat4): readonly [Vec3, Vec3, Vec3] {
  return [
    [m[0], m[1], m[2]],
    [m[4], m[5], m[6]],
    [m[8], m[9], m[10]],
  ];
}

/** The position a matrix carries its origin to. */
export function positionOf(m: Mat4): Vec3 {
  return [m[12], m[13], m[14]];
}

/** `m` applied to a point. */
export function transformPoint(m: Mat4, p: Vec3): Vec3 {
  return [
    m[0] * p[0] + m[4] * p[1] + m[8] * p[2] + m[12],
    m[1] * p[0] + m[5] * p[1] + m[9] * p[2] + m[13],
    m[2] * p[0] + m[6] * p[1] + m[10] * p[2] + m[14],
  ];
}

/** `m` applied to a direction: without its position, lengths not kept under scale. */
export function transformDirection(m: Mat4, v: Vec3): Vec3 {
  return [
    m[0] * v[0] + m[4] * v[1] + m[8] * v[2],
    m[1] * v[0] + m[5] * v[1] + m[9] * v[2],
    m[2] * v[0] + m[6] * v[1] + m[10] * v[2],
  ];
}

/** Affine product: the transform that does `b` first, then `a`. */
export function multiplyMat4(a: Mat4, b: Mat4): Mat4 {
  const [x, y, z] = columnsOf(b);
  return matFromColumns(
    transformDirection(a, x),
    transformDirection(a, y),
    transformDirection(a, z),
    transformPoint(a, positionOf(b)),
  );
}

/** Determinant of the upper three by three. */
export function determinantOf(m: Mat4): number {
  const [x, y, z] = columnsOf(m);
  return dot(x, cross(y, z));
}

/** Inverse of an affine matrix; undefined when it flattens space (a zero scale, for one). */
export function invertMat4(m: Mat4): Mat4 | undefined {
  const [x, y, z] = columnsOf(m);
  const determinant = dot(x, cross(y, z));
  const bound = length(x) * length(y) * length(z);
  if (!(Math.abs(determinant) > bound * DIRECTION_TOLERANCE)) return undefined;
  const yz = cross(y, z);
  const zx = cross(z, x);
  const xy = cross(x, y);
  const inverse = matFromColumns(
    [yz[0] / determinant, zx[0] / determinant, xy[0] / determinant],
    [yz[1] / determinant, zx[1] / determinant, xy[1] / determinant],
    [yz[2] / determinant, zx[2] / determinant, xy[2] / determinant],
    ZERO,
  );
  const at = transformDirection(inverse, positionOf(m));
  return [...inverse.slice(0, 12), 0 - at[0], 0 - at[1], 0 - at[2], 1] as unknown as Mat4;
}

/**
 * Right-handed orthonormal axes nearest in plan to three columns: x keeps its direction, y its plane with x, z
 * follows. A vanished x is taken from y × z, a vanished or parallel y from z × x, else from `perpendicularTo(x)`;
 * nothing left at all gives the identity.
 */
export function orthonormaliseAxes(x: Vec3, y: Vec3, z: Vec3): readonly [Vec3, Vec3, Vec3] {
  const yUnit = normalise(y);
  let first = normalise(x);
  if (first === ZERO) first = normalise(cross(y, z));
  if (first === ZERO) first = yUnit === ZERO ? [1, 0, 0] : perpendicularTo(yUnit);
  let second = rejectFrom(yUnit, first);
  if (length(second) < DIRECTION_TOLERANCE) second = cross(normalise(z), first);
  second = length(second) < DIRECTION_TOLERANCE ? perpendicularTo(first) : normalise(second);
  return [first, second, cross(first, second)];
}

/** Rotation part of an affine matrix by `orthonormaliseAxes`, so shear and scale do not tilt its x axis. */
export function rotationOf(m: Mat4): Quat {
  return quatFromAxes(...orthonormaliseAxes(...columnsOf(m)));
}

/**
 * Position, rotation and scale of an affine matrix. Scale is the length of each column; a mirrored matrix has its z
 * scale negative. Without shear, `composeMat4` gives the matrix back; shear is dropped.
 */
export function decomposeMat4(m: Mat4): { readonly at: Vec3; readonly turn: Quat; readonly scale: Vec3 } {
  const [x, y, z] = columnsOf(m);
  const sign = determinantOf(m) < 0 ? -1 : 1;
  return { at: positionOf(m), turn: rotationOf(m), scale: [length(x), length(y), sign * length(z)] };
}

/** The transform as seen in the mirror x = 0 (S·M·S with S = diag(−1, 1, 1, 1)); twice gives the input back. */
export function mirrorMat4X(m: Mat4): Mat4 {
  return [
    m[0],
    0 - m[1],
    0 - m[2],
    0,
    0 - m[4],
    m[5],
    m[6],
    0,
    0 - m[8],
    m[9],
    m[10],
    0,
    0 - m[12],
    m[13],
    m[14],
    1,
  ];
}
