import { DIRECTION_TOLERANCE, SLERP_LINEAR_COSINE } from './tolerances';

/**
 * Vectors (3 numbers) and quaternions (x y z w) that are written in place, for code that runs once a frame and must
 * not allocate. The result goes to `out`, which may be one of the arguments. The same definitions as `vec3.ts` and
 * `quat.ts`, which return new values and are used everywhere else.
 */
export type Mutable = Float64Array;

/** A vector of zeros to be written. */
export function makeVec(from: ArrayLike<number> = [0, 0, 0]): Mutable {
  return Float64Array.from(from);
}

/** A quaternion to be written; identity unless given. */
export function makeQuat(from: ArrayLike<number> = [0, 0, 0, 1]): Mutable {
  return Float64Array.from(from);
}

export function copyVec(out: Mutable, v: Mutable): void {
  out[0] = v[0] as number;
  out[1] = v[1] as number;
  out[2] = v[2] as number;
}

export function copyQuat(out: Mutable, q: Mutable): void {
  out[0] = q[0] as number;
  out[1] = q[1] as number;
  out[2] = q[2] as number;
  out[3] = q[3] as number;
}

/** a − b. */
export function subInto(out: Mutable, a: Mutable, b: Mutable): void {
  out[0] = (a[0] as number) - (b[0] as number);
  out[1] = (a[1] as number) - (b[1] as number);
  out[2] = (a[2] as number) - (b[2] as number);
}

/** v × factor. */
export function scaleInto(out: Mutable, v: Mutable, factor: number): void {
  out[0] = (v[0] as number) * factor;
  out[1] = (v[1] as number) * factor;
  out[2] = (v[2] as number) * factor;
}

/** a + factor × b. */
export function addScaledInto(out: Mutable, a: Mutable, b: Mutable, factor: number): void {
  out[0] = (a[0] as number) + (b[0] as number) * factor;
  out[1] = (a[1] as number) + (b[1] as number) * factor;
  out[2] = (a[2] as number) + (b[2] as number) * factor;
}

/** a × b, right-handed. */
export function crossInto(out: Mutable, a: Mutable, b: Mutable): void {
  const x = (a[1] as number) * (b[2] as number) - (a[2] as number) * (b[1] as number);
  const y = (a[2] as number) * (b[0] as number) - (a[0] as number) * (b[2] as number);
  const z = (a[0] as number) * (b[1] as number) - (a[1] as number) * (b[0] as number);
  out[0] = x;
  out[1] = y;
  out[2] = z;
}

export function dotOf(a: Mutable, b: Mutable): number {
  return (
    (a[0] as number) * (b[0] as number) +
    (a[1] as number) * (b[1] as number) +
    (a[2] as number) * (b[2] as number)
  );
}

export function lengthOf(v: Mutable): number {
  const x = v[0] as number;
  const y = v[1] as number;
  const z = v[2] as number;
  return Math.sqrt(x * x + y * y + z * z);
}

export function distanceOf(a: Mutable, b: Mutable): number {
  const x = (a[0] as number) - (b[0] as number);
  const y = (a[1] as number) - (b[1] as number);
  const z = (a[2] as number) - (b[2] as number);
  return Math.sqrt(x * x + y * y + z * z);
}

/** v at length one, whatever its size; the zero vector stays zero. */
export function normaliseInto(out: Mutable, v: Mutable): void {
  let x = v[0] as number;
  let y = v[1] as number;
  let z = v[2] as number;
  const largest = Math.max(Math.abs(x), Math.abs(y), Math.abs(z));
  if (!(largest > 0)) {
    out[0] = 0;
    out[1] = 0;
    out[2] = 0;
    return;
  }
  x /= largest;
  y /= largest;
  z /= largest;
  const size = Math.sqrt(x * x + y * y + z * z);
  out[0] = x / size;
  out[1] = y / size;
  out[2] = z / size;
}

/** The part of v at right angles to the unit vector. */
export function rejectInto(out: Mutable, v: Mutable, unit: Mutable): void {
  addScaledInto(out, v, unit, -dotOf(v, unit));
}

/** A unit vector at right angles to v: v × the axis it leans on least (x before y before z); X for zero. */
export function perpendicularInto(out: Mutable, v: Mutable): void {
  const vx = v[0] as number;
  const vy = v[1] as number;
  const vz = v[2] as number;
  const x = Math.abs(vx);
  const y = Math.abs(vy);
  const z = Math.abs(vz);
  if (x <= y && x <= z) {
    out[0] = 0;
    out[1] = vz;
    out[2] = -vy;
  } else if (y <= z) {
    out[0] = -vz;
    out[1] = 0;
    out[2] = vx;
  } else {
    out[0] = vy;
    out[1] = -vx;
    out[2] = 0;
  }
  normaliseInto(out, out);
  if (out[0] === 0 && out[1] === 0 && out[2] === 0) out[0] = 1;
}

/** v turned by a unit quaternion. */
export function rotateInto(out: Mutable, q: Mutable, v: Mutable): void {
  const x = q[0] as number;
  const y = q[1] as number;
  const z = q[2] as number;
  const w = q[3] as number;
  const vx = v[0] as number;
  const vy = v[1] as number;
  const vz = v[2] as number;
  const tx = 2 * (y * vz - z * vy);
  const ty = 2 * (z * vx - x * vz);
  const tz = 2 * (x * vy - y * vx);
  out[0] = vx + w * tx + y * tz - z * ty;
  out[1] = vy + w * ty + z * tx - x * tz;
  out[2] = vz + w * tz + x * ty - y * tx;
}

/** v turned by the opposite of a unit quaternion. */
export function unrotateInto(out: Mutable, q: Mutable, v: Mutable): void {
  const x = -(q[0] as number);
  const y = -(q[1] as number);
  const z = -(q[2] as number);
  const w = q[3] as number;
  const vx = v[0] as number;
  const vy = v[1] as number;
  const vz = v[2] as number;
  const tx = 2 * (y * vz - z * vy);
  const ty = 2 * (z * vx - x * vz);
  const tz = 2 * (x * vy - y * vx);
  out[0] = vx + w * tx + y * tz - z * ty;
  out[1] = vy + w * ty + z * tx - x * tz;
  out[2] = vz + w * tz + x * ty - y * tx;
}

/** The rotation that does b first, then a. */
export function multiplyQuatInto(out: Mutable, a: Mutable, b: Mutable): void {
  const ax = a[0] as number;
  const ay = a[1] as number;
  const az = a[2] as number;
  const aw = a[3] as number;
  const bx = b[0] as number;
  const by = b[1] as number;
  const bz = b[2] as number;
  const bw = b[3] as number;
  out[0] = aw * bx + ax * bw + ay * bz - az * by;
  out[1] = aw * by - ax * bz + ay * bw + az * bx;
  out[2] = aw * bz + ax * by - ay * bx + az * bw;
  out[3] = aw * bw - ax * bx - ay * by - az * bz;
}

/** The opposite rotation of a unit quaternion. */
export function conjugateInto(out: Mutable, q: Mutable): void {
  out[0] = -(q[0] as number);
  out[1] = -(q[1] as number);
  out[2] = -(q[2] as number);
  out[3] = q[3] as number;
}

/** q at length one; the zero quaternion gives identity. */
export function normaliseQuatInto(out: Mutable, q: Mutable): void {
  const x = q[0] as number;
  const y = q[1] as number;
  const z = q[2] as number;
  const w = q[3] as number;
  const size = Math.sqrt(x * x + y * y + z * z + w * w);
  out[0] = size > 0 ? x / size : 0;
  out[1] = size > 0 ? y / size : 0;
  out[2] = size > 0 ? z / size : 0;
  out[3] = size > 0 ? w / size : 1;
}

/** Rotation by `radians` about a unit axis. */
export function axisAngleInto(out: Mutable, axis: Mutable, radians: number): void {
  const s = Math.sin(radians / 2);
  out[0] = (axis[0] as number) * s;
  out[1] = (axis[1] as number) * s;
  out[2] = (axis[2] as number) * s;
  out[3] = Math.cos(radians / 2);
}

/** Spherical mix at fraction t along the shorter arc; see `slerp` in `quat.ts`. */
export function slerpInto(out: Mutable, a: Mutable, b: Mutable, t: number): void {
  const raw =
    (a[0] as number) * (b[0] as number) +
    (a[1] as number) * (b[1] as number) +
    (a[2] as number) * (b[2] as number) +
    (a[3] as number) * (b[3] as number);
  const cosine = Math.abs(raw);
  let wa = 1 - t;
  let wb = t;
  if (cosine < SLERP_LINEAR_COSINE) {
    const angle = Math.acos(cosine);
    const sine = Math.sin(angle);
    wa = Math.sin(wa * angle) / sine;
    wb = Math.sin(wb * angle) / sine;
  }
  if (raw < 0) wb = -wb;
  out[0] = (a[0] as number) * wa + (b[0] as number) * wb;
  out[1] = (a[1] as number) * wa + (b[1] as number) * wb;
  out[2] = (a[2] as number) * wa + (b[2] as number) * wb;
  out[3] = (a[3] as number) * wa + (b[3] as number) * wb;
  normaliseQuatInto(out, out);
}

/** Rotation whose matrix has the given right-handed orthonormal columns. */
export function quatFromAxesInto(out: Mutable, x: Mutable, y: Mutable, z: Mutable): void {
  const xx = x[0] as number;
  const yy = y[1] as number;
  const zz = z[2] as number;
  const trace = xx + yy + zz;
  if (trace > 0) {
    const s = 2 * Math.sqrt(1 + trace);
    out[3] = s / 4;
    out[0] = ((y[2] as number) - (z[1] as number)) / s;
    out[1] = ((z[0] as number) - (x[2] as number)) / s;
    out[2] = ((x[1] as number) - (y[0] as number)) / s;
  } else if (xx >= yy && xx >= zz) {
    const s = 2 * Math.sqrt(1 + xx - yy - zz);
    out[0] = s / 4;
    out[1] = ((y[0] as number) + (x[1] as number)) / s;
    out[2] = ((z[0] as number) + (x[2] as number)) / s;
    out[3] = ((y[2] as number) - (z[1] as number)) / s;
  } else if (yy >= zz) {
    const s = 2 * Math.sqrt(1 + yy - xx - zz);
    out[1] = s / 4;
    out[0] = ((y[0] as number) + (x[1] as number)) / s;
    out[2] = ((z[1] as number) + (y[2] as number)) / s;
    out[3] = ((z[0] as number) - (x[2] as number)) / s;
  } else {
    const s = 2 * Math.sqrt(1 + zz - xx - yy);
    out[2] = s / 4;
    out[0] = ((z[0] as number) + (x[2] as number)) / s;
    out[1] = ((z[1] as number) + (y[2] as number)) / s;
    out[3] = ((x[1] as number) - (y[0] as number)) / s;
  }
  normaliseQuatInto(out, out);
}

const halfAxis = makeVec();

/** Shortest rotation from one unit vector to another; opposite ones by half a turn about `perpendicularInto`. */
export function betweenInto(out: Mutable, a: Mutable, b: Mutable): void {
  const cosine = dotOf(a, b);
  crossInto(halfAxis, a, b);
  if (cosine < 0 && lengthOf(halfAxis) < DIRECTION_TOLERANCE) {
    perpendicularInto(halfAxis, a);
    out[0] = halfAxis[0] as number;
    out[1] = halfAxis[1] as number;
    out[2] = halfAxis[2] as number;
    out[3] = 0;
    return;
  }
  const sx = (a[0] as number) + (b[0] as number);
  const sy = (a[1] as number) + (b[1] as number);
  const sz = (a[2] as number) + (b[2] as number);
  const half = Math.sqrt(sx * sx + sy * sy + sz * sz);
  out[0] = (halfAxis[0] as number) / half;
  out[1] = (halfAxis[1] as number) / half;
  out[2] = (halfAxis[2] as number) / half;
  out[3] = half / 2;
  normaliseQuatInto(out, out);
}

const frameX = makeVec();
const frameY = makeVec();
const frameZ = makeVec();

/**
 * Rotation with its x axis along `along` and its y axis along the part of `side` at right angles to it; should that
 * part of the direction of `side` be shorter than `noise`, a direction at right angles to x.
 */
export function frameInto(out: Mutable, along: Mutable, side: Mutable, noise: number): void {
  normaliseInto(frameX, along);
  normaliseInto(frameY, side);
  rejectInto(frameY, frameY, frameX);
  if (lengthOf(frameY) > noise) {
    normaliseInto(frameY, frameY);
    // Made orthogonal twice: the first time may cancel many digits when the two nearly lie on one line.
    rejectInto(frameY, frameY, frameX);
    normaliseInto(frameY, frameY);
  } else perpendicularInto(frameY, frameX);
  crossInto(frameZ, frameX, frameY);
  quatFromAxesInto(out, frameX, frameY, frameZ);
}

/** Angle in radians from a to b about the unit vector `axis`. */
export function signedAngleOf(a: Mutable, b: Mutable, axis: Mutable): number {
  crossInto(halfAxis, a, b);
  return Math.atan2(dotOf(axis, halfAxis), dotOf(a, b));
}
