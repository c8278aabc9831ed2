import type { Quat, Vec3 } from '../rig/Rig';
import { DIRECTION_TOLERANCE, SLERP_LINEAR_COSINE } from './tolerances';
import { cross, dot, length, normalise, perpendicularTo } from './vec3';

export const IDENTITY_QUAT: Quat = [0, 0, 0, 1];

/** Hamilton product: the rotation that does `b` first, then `a`. */
export function multiplyQuat(a: Quat, b: Quat): Quat {
  const [ax, ay, az, aw] = a;
  const [bx, by, bz, bw] = b;
  return [
    aw * bx + ax * bw + ay * bz - az * by,
    aw * by - ax * bz + ay * bw + az * bx,
    aw * bz + ax * by - ay * bx + az * bw,
    aw * bw - ax * bx - ay * by - az * bz,
  ];
}

/** The opposite rotation of a unit quaternion. */
export function conjugateQuat(q: Quat): Quat {
  return [0 - q[0], 0 - q[1], 0 - q[2], q[3]];
}

/** The quaternion at length one; the zero quaternion gives identity. */
export function normaliseQuat(q: Quat): Quat {
  const size = Math.hypot(q[0], q[1], q[2], q[3]);
  return size > 0 ? [q[0] / size, q[1] / size, q[2] / size, q[3] / size] : IDENTITY_QUAT;
}

/** Four-dimensional dot product; its absolute value is the cosine of half the angle between two rotations. */
export function dotQuat(a: Quat, b: Quat): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2] + a[3] * b[3];
}

/** Of the two signs of one rotation, the one whose last non-zero of w, z, y, x is positive; no −0. */
export function canonicalQuat(q: Quat): Quat {
  const lead = q[3] || q[2] || q[1] || q[0];
  return lead < 0 ? [0 - q[0], 0 - q[1], 0 - q[2], 0 - q[3]] : [q[0] + 0, q[1] + 0, q[2] + 0, q[3] + 0];
}

/** The vector turned by a unit quaternion. */
export function rotate(q: Quat, v: Vec3): Vec3 {
  const [x, y, z, w] = q;
  const tx = 2 * (y * v[2] - z * v[1]);
  const ty = 2 * (z * v[0] - x * v[2]);
  const tz = 2 * (x * v[1] - y * v[0]);
  return [v[0] + w * tx + y * tz - z * ty, v[1] + w * ty + z * tx - x * tz, v[2] + w * tz + x * ty - y * tx];
}

/** Rotation by `radians` about `axis` (any length); a zero axis gives identity. */
export function quatFromAxisAngle(axis: Vec3, radians: number): Quat {
  const [x, y, z] = normalise(axis);
  if (x === 0 && y === 0 && z === 0) return IDENTITY_QUAT;
  const s = Math.sin(radians / 2);
  return [x * s, y * s, z * s, Math.cos(radians / 2)];
}

/** Rotation whose matrix has the given right-handed orthonormal columns; any other input is not checked. */
export function quatFromAxes(x: Vec3, y: Vec3, z: Vec3): Quat {
  // The largest of the four squares is divided by, so nothing is lost near half turns.
  const trace = x[0] + y[1] + z[2];
  if (trace > 0) {
    const s = 2 * Math.sqrt(1 + trace);
    return normaliseQuat([(y[2] - z[1]) / s, (z[0] - x[2]) / s, (x[1] - y[0]) / s, s / 4]);
  }
  if (x[0] >= y[1] && x[0] >= z[2]) {
    const s = 2 * Math.sqrt(1 + x[0] - y[1] - z[2]);
    return normaliseQuat([s / 4, (y[0] + x[1]) / s, (z[0] + x[2]) / s, (y[2] - z[1]) / s]);
  }
  if (y[1] >= z[2]) {
    const s = 2 * Math.sqrt(1 + y[1] - x[0] - z[2]);
    return normaliseQuat([(y[0] + x[1]) / s, s / 4, (z[1] + y[2]) / s, (z[0] - x[2]) / s]);
  }
  const s = 2 * Math.sqrt(1 + z[2] - x[0] - y[1]);
  return normaliseQuat([(z[0] + x[2]) / s, (z[1] + y[2]) / s, s / 4, (x[1] - y[0]) / s]);
}

/**
 * Shortest rotation that carries direction `from` onto direction `to` (any lengths). Opposite directions: half a
 * turn about `perpendicularTo(from)`. A zero vector on either side: identity.
 */
export function quatBetween(from: Vec3, to: Vec3): Quat {
  const a = normalise(from);
  const b = normalise(to);
  if (length(a) === 0 || length(b) === 0) return IDENTITY_QUAT;
  const axis = cross(a, b);
  const cosine = dot(a, b);
  if (cosine < 0 && length(axis) < DIRECTION_TOLERANCE) {
    const [x, y, z] = perpendicularTo(a);
    return [x, y, z, 0];
  }
  // From the sum of the two directions the half angle keeps its digits near half a turn, where 1 + cosine does not.
  const half = Math.hypot(a[0] + b[0], a[1] + b[1], a[2] + b[2]);
  return normaliseQuat([axis[0] / half, axis[1] / half, axis[2] / half, half / 2]);
}

/**
 * Spherical mix of two unit quaternions at fraction `t` (0: `a`, 1: `b`), always along the shorter arc; at exactly
 * half a turn apart, along the arc of the signs given.
 */
export function slerp(a: Quat, b: Quat, t: number): Quat {
  const raw = dotQuat(a, b);
  const sign = raw < 0 ? -1 : 1;
  const cosine = Math.abs(raw);
  let wa = 1 - t;
  let wb = t;
  if (cosine < SLERP_LINEAR_COSINE) {
    const angle = Math.acos(cosine);
    const sine = Math.sin(angle);
    wa = Math.sin(wa * angle) / sine;
    wb = Math.sin(wb * angle) / sine;
  }
  wb *= sign;
  return normaliseQuat([
    a[0] * wa + b[0] * wb,
    a[1] * wa + b[1] * wb,
    a[2] * wa + b[2] * wb,
    a[3] * wa + b[3] * wb,
  ]);
}

/** The rotation as seen in the mirror x = 0 (S·R·S with S = diag(−1, 1, 1)); twice gives the input back. */
export function mirrorQuatX(q: Quat): Quat {
  return [q[0], 0 - q[1], 0 - q[2], q[3]];
}
