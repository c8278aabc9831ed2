import { add, addScaled, distance, length, mix, scale, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';

/** A curve piece over 0…1 with its first derivative, in scene units. */
export interface CurvePiece {
  at(t: number): Vec3;
  speed(t: number): number;
}

/** The line between two points, at even speed. */
export function straightPiece(from: Vec3, to: Vec3): CurvePiece {
  const size = distance(from, to);
  return { at: (t) => mix(from, to, t), speed: () => size };
}

/**
 * Centripetal Catmull–Rom piece from `b` to `c` (Barry and Goldman 1988; Yuksel, Schaefer and Keyser 2011: knots
 * by the square root of distance, so that no loops or cusps appear within a piece), as a cubic Hermite curve.
 */
export function smoothPiece(a: Vec3, b: Vec3, c: Vec3, d: Vec3): CurvePiece {
  const ab = Math.sqrt(distance(a, b));
  const bc = Math.sqrt(distance(b, c));
  const cd = Math.sqrt(distance(c, d));
  const tangent = (p: Vec3, q: Vec3, r: Vec3, before: number, after: number): Vec3 => {
    const rise = scale(sub(q, p), 1 / before);
    const whole = scale(sub(r, p), 1 / (before + after));
    const fall = scale(sub(r, q), 1 / after);
    return scale(add(sub(rise, whole), fall), bc);
  };
  const start = tangent(a, b, c, ab, bc);
  const end = tangent(b, c, d, bc, cd);
  // p(t) = b + t·start + t²·k2 + t³·k3 meets both ends and both tangents.
  const chord = sub(c, b);
  const k2 = sub(sub(scale(chord, 3), scale(start, 2)), end);
  const k3 = add(add(scale(chord, -2), start), end);
  return {
    at: (t) => (t === 1 ? c : addScaled(addScaled(addScaled(b, start, t), k2, t * t), k3, t * t * t)),
    speed: (t) => length(addScaled(addScaled(start, k2, 2 * t), k3, 3 * t * t)),
  };
}
