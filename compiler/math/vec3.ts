import type { Vec3 } from '../rig/Rig';

export const ZERO: Vec3 = [0, 0, 0];
export const ONE: Vec3 = [1, 1, 1];
export const X_AXIS: Vec3 = [1, 0, 0];
export const Y_AXIS: Vec3 = [0, 1, 0];
export const Z_AXIS: Vec3 = [0, 0, 1];

/** Sum of two vectors. */
export function add(a: Vec3, b: Vec3): Vec3 {
  return [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
}

/** `a` minus `b`. */
export function sub(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}

/** Vector times a number. */
export function scale(v: Vec3, factor: number): Vec3 {
  return [v[0] * factor, v[1] * factor, v[2] * factor];
}

/** `a` plus `factor` times `b`. */
export function addScaled(a: Vec3, b: Vec3, factor: number): Vec3 {
  return [a[0] + b[0] * factor, a[1] + b[1] * factor, a[2] + b[2] * factor];
}

/** The vector pointing the other way; zeros stay positive zeros, so that emitted numbers never show −0. */
export function negate(v: Vec3): Vec3 {
  return [0 - v[0], 0 - v[1], 0 - v[2]];
}

/** Dot product. */
export function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

/** Right-handed cross product. */
export function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

/** Length, without overflow or underflow on the way. */
export function length(v: Vec3): number {
  return Math.hypot(v[0], v[1], v[2]);
}

/** Distance between two points. */
export function distance(a: Vec3, b: Vec3): number {
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
}

/** The vector at length one; the zero vector gives `ZERO`. Any finite size is taken, also the largest. */
export function normalise(v: Vec3): Vec3 {
  const largest = Math.max(Math.abs(v[0]), Math.abs(v[1]), Math.abs(v[2]));
  if (!(largest > 0)) return ZERO;
  // Dividing by the largest part first keeps the length between 1 and 2, where nothing over- or underflows.
  const x = v[0] / largest;
  const y = v[1] / largest;
  const z = v[2] / largest;
  const size = Math.sqrt(x * x + y * y + z * z);
  return [x / size, y / size, z / size];
}

/** The point at fraction `t` from `a` (0) to `b` (1); exact at both ends. */
export function mix(a: Vec3, b: Vec3, t: number): Vec3 {
  return [a[0] * (1 - t) + b[0] * t, a[1] * (1 - t) + b[1] * t, a[2] * (1 - t) + b[2] * t];
}

/** The part of `v` at right angles to the unit vector `unit`; zero when they are parallel. */
export function rejectFrom(v: Vec3, unit: Vec3): Vec3 {
  return addScaled(v, unit, -dot(v, unit));
}

/**
 * A unit vector at right angles to `v`, always the same one for the same `v`: `v` crossed with the axis it leans
 * on least (X before Y before Z). The zero vector gives X.
 */
export function perpendicularTo(v: Vec3): Vec3 {
  const [x, y, z] = [Math.abs(v[0]), Math.abs(v[1]), Math.abs(v[2])];
  const axis = x <= y && x <= z ? X_AXIS : y <= z ? Y_AXIS : Z_AXIS;
  const side = normalise(cross(v, axis));
  return side === ZERO ? X_AXIS : side;
}

/** Angle in radians, 0 to π, exact also near 0 and π; 0 when either vector is zero. */
export function angleBetween(a: Vec3, b: Vec3): number {
  return Math.atan2(length(cross(a, b)), dot(a, b));
}

/** Angle in radians, −π to π, from `a` to `b` as seen looking against the unit vector `axis`. */
export function signedAngle(a: Vec3, b: Vec3, axis: Vec3): number {
  return Math.atan2(dot(axis, cross(a, b)), dot(a, b));
}
