import { distance, scale, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';
import { type CurvePiece, smoothPiece, straightPiece } from './curvePieces';

/** Nodes and weights of five-point Gauss–Legendre quadrature on 0…1 (Abramowitz and Stegun, table 25.4). */
const GAUSS: readonly (readonly [number, number])[] = [
  [0.5, 0.28444444444444444],
  [0.23076534494715845, 0.23931433524968324],
  [0.7692346550528415, 0.23931433524968324],
  [0.04691007703066802, 0.11846344252809454],
  [0.9530899229693319, 0.11846344252809454],
];

function gauss(piece: CurvePiece, from: number, to: number): number {
  let sum = 0;
  for (const [node, weight] of GAUSS) sum += weight * piece.speed(from + (to - from) * node);
  return sum * (to - from);
}

/** Halvings of a piece at most; 2⁻¹⁶ of a piece is far below any tolerance here. */
const DEEPEST_SPLIT = 16;
/** Relative error at which splitting stops; a hundred times tighter than positions are rounded to. */
const ARC_TOLERANCE = 1e-12;

function adaptive(
  piece: CurvePiece,
  from: number,
  to: number,
  whole: number,
  scaleOfError: number,
  depth: number,
): number {
  const middle = (from + to) / 2;
  const first = gauss(piece, from, middle);
  const second = gauss(piece, middle, to);
  if (depth >= DEEPEST_SPLIT || Math.abs(first + second - whole) <= ARC_TOLERANCE * scaleOfError)
    return first + second;
  return (
    adaptive(piece, from, middle, first, scaleOfError, depth + 1) +
    adaptive(piece, middle, to, second, scaleOfError, depth + 1)
  );
}

/** Length of a piece between two of its parameters. */
function arcLength(piece: CurvePiece, from: number, to: number): number {
  const whole = gauss(piece, from, to);
  return adaptive(piece, from, to, whole, Math.max(whole, Number.MIN_VALUE), 0);
}

/** The parameter at which a piece has run `target` of its length, by Newton's method kept inside a bracket. */
function parameterAt(piece: CurvePiece, target: number, total: number): number {
  let low = 0;
  let high = 1;
  let t = target / total;
  for (let step = 0; step < 60; step += 1) {
    const error = arcLength(piece, 0, t) - target;
    if (Math.abs(error) <= ARC_TOLERANCE * total) break;
    if (error > 0) high = t;
    else low = t;
    const speed = piece.speed(t);
    const next = speed > 0 ? t - error / speed : low;
    t = next > low && next < high ? next : (low + high) / 2;
  }
  return t;
}

function extrapolate(end: Vec3, inner: Vec3): Vec3 {
  return sub(scale(end, 2), inner);
}

function pieces(points: readonly Vec3[], curve: 'smooth' | 'straight'): readonly CurvePiece[] {
  const made: CurvePiece[] = [];
  for (let index = 0; index + 1 < points.length; index += 1) {
    const b = points[index] as Vec3;
    const c = points[index + 1] as Vec3;
    if (curve === 'straight' || points.length === 2) {
      made.push(straightPiece(b, c));
    } else {
      made.push(
        smoothPiece(points[index - 1] ?? extrapolate(b, c), b, c, points[index + 2] ?? extrapolate(c, b)),
      );
    }
  }
  return made;
}

/**
 * Places `count` (two or more) points evenly by arc length along a curve through `points`, ends included exactly.
 * Points that coincide with their neighbour are passed over; null when no length is left.
 */
export function spreadByArcLength(
  points: readonly Vec3[],
  count: number,
  curve: 'smooth' | 'straight',
): readonly Vec3[] | null {
  const apart = points.filter(
    (point, index) => index === 0 || distance(point, points[index - 1] as Vec3) > 0,
  );
  const first = apart[0];
  const last = apart[apart.length - 1];
  if (apart.length < 2 || !first || !last) return null;
  const parts = pieces(apart, curve);
  const lengths = parts.map((piece) => arcLength(piece, 0, 1));
  const total = lengths.reduce((sum, size) => sum + size, 0);
  const placed: Vec3[] = [first];
  let piece = 0;
  let before = 0;
  for (let index = 1; index < count - 1; index += 1) {
    const target = (total * index) / (count - 1);
    while (piece < parts.length - 1 && target > before + (lengths[piece] as number)) {
      before += lengths[piece] as number;
      piece += 1;
    }
    const here = parts[piece] as CurvePiece;
    const size = lengths[piece] as number;
    placed.push(
      here.at(curve === 'straight' ? (target - before) / size : parameterAt(here, target - before, size)),
    );
  }
  placed.push(last);
  return placed;
}
