import { describe, expect, it } from 'vitest';
import { makeVec } from '@/compiler/math/inPlace';
import { distance } from '@/compiler/math/vec3';
import { SplineCurve } from '@/compiler/pose/splineCurve';
import type { Vec3 } from '@/compiler/rig/Rig';
import { spreadByArcLength } from '@/compiler/solve/arcLength';
import { type CurvePiece, smoothPiece } from '@/compiler/solve/curvePieces';
import { readReference } from '../math/readReference';

/** Length of a piece by Simpson's rule over its speed: another rule than the one the compiler uses. */
function simpson(piece: CurvePiece, steps = 4000): number {
  let sum = piece.speed(0) + piece.speed(1);
  for (let i = 1; i < steps; i += 1) sum += (i % 2 === 1 ? 4 : 2) * piece.speed(i / steps);
  return sum / (3 * steps);
}

interface SmoothCase {
  readonly points: readonly Vec3[];
  readonly alpha: number;
  readonly length_P1_P2: number;
}

describe('smooth pieces', () => {
  // Source: tests/data/numeric/catmull_rom.json, computed independently; the centripetal cases are ours.
  const cases = readReference<{ cases: readonly SmoothCase[] }>('catmull_rom.json').cases.filter(
    ({ alpha, points }) => alpha === 0.5 && points.length === 4,
  );

  it('has cases to compare with', () => {
    expect(cases.length).toBeGreaterThan(0);
  });

  it.each(cases.map((item, index) => [index, item] as const))(
    'are as long as listed, case %d',
    (_, { points, length_P1_P2: listed }) => {
      const [a, b, c, d] = points as [Vec3, Vec3, Vec3, Vec3];
      expect(Math.abs(simpson(smoothPiece(a, b, c, d)) - listed)).toBeLessThan(1e-6);
    },
  );
});

interface BezierCase {
  readonly control_points: readonly Vec3[];
  readonly length: number;
  readonly at_fraction: readonly { readonly fraction: number; readonly point: Vec3 }[];
  readonly note: string;
}

/**
 * Source: tests/data/numeric/arc_length_bezier.json, by quadrature and partly by closed forms named there. Of four
 * control points the curve of a spline chain is the cubic Bézier curve. It is measured by sixteen straight pieces, so
 * that its length lies below the true one by up to about two parts in a thousand where it bends most; its definition
 * in Slipway is that sum, and the exact length is what it must stay near.
 */
describe.each(readReference<{ cases: readonly BezierCase[] }>('arc_length_bezier.json').cases)(
  'the curve of a spline chain, $note',
  ({ control_points: points, length, at_fraction: marks }) => {
    const curve = new SplineCurve(points.length);
    points.forEach((at, index) => {
      curve.points[index]?.set(at);
    });
    curve.measure(makeVec([0, 0, 1]));

    it('is as long as the exact curve, less what straight pieces cut off', () => {
      expect(curve.length).toBeLessThan(length + 1e-9);
      expect(curve.length / length).toBeGreaterThan(0.998);
    });

    it.each(marks)('stands near the exact point at $fraction of its length', ({ fraction, point }) => {
      const place = makeVec();
      curve.atLengthInto(fraction * curve.length, place, makeVec(), makeVec());
      const got: Vec3 = [place[0] as number, place[1] as number, place[2] as number];
      expect(distance(got, point) / length).toBeLessThan(0.002);
    });
  },
);

it('spreads joints over a quarter circle of many points by equal angles', () => {
  // Closed form: equal arcs of a circle are equal angles.
  const at = (share: number): Vec3 => [Math.cos((share * Math.PI) / 2), Math.sin((share * Math.PI) / 2), 0];
  const points = Array.from({ length: 65 }, (_, index) => at(index / 64));
  const joints = spreadByArcLength(points, 9, 'smooth') ?? [];
  expect(joints).toHaveLength(9);
  for (const [index, joint] of joints.entries()) {
    expect(distance(joint, at(index / 8))).toBeLessThan(1e-5);
  }
});
