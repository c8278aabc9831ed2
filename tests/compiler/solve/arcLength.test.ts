import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distance } from '@/compiler/math/vec3';
import type { Vec3 } from '@/compiler/rig/Rig';
import { spreadByArcLength } from '@/compiler/solve/arcLength';
import { smoothPiece } from '@/compiler/solve/curvePieces';

/**
 * Source: tests/data/numeric/catmull_rom.json, Catmull–Rom pieces by the Barry–Goldman pyramid (1988), computed
 * independently of this code; the centripetal cases (alpha 0.5) are ours.
 */
interface CurveCase {
  readonly points: readonly Vec3[];
  readonly alpha: number;
  readonly length_P1_P2: number;
  readonly samples: readonly { readonly u: number; readonly point: Vec3 }[];
}
const { cases } = JSON.parse(
  readFileSync(new URL('../../data/numeric/catmull_rom.json', import.meta.url), 'utf8'),
) as { cases: readonly CurveCase[] };
const centripetal = cases.filter(({ alpha, points }) => alpha === 0.5 && points.length === 4);

describe('smooth pieces against the Barry–Goldman pyramid', () => {
  it('has cases to compare with', () => expect(centripetal.length).toBeGreaterThan(0));

  it.each(centripetal.map((item, index) => [index, item] as const))('case %d', (_, { points, samples }) => {
    const [a, b, c, d] = points as [Vec3, Vec3, Vec3, Vec3];
    const piece = smoothPiece(a, b, c, d);
    for (const { u, point } of samples) {
      expect(distance(piece.at(u), point)).toBeLessThan(1e-9);
    }
  });
});

describe('spreading joints by arc length', () => {
  it('spreads evenly along one straight line', () => {
    const spread = spreadByArcLength(
      [
        [0, 0, 0],
        [0, 0, 12],
      ],
      5,
      'smooth',
    );
    expect(spread).toEqual([
      [0, 0, 0],
      [0, 0, 3],
      [0, 0, 6],
      [0, 0, 9],
      [0, 0, 12],
    ]);
  });

  it('spreads evenly along a bent line', () => {
    const spread =
      spreadByArcLength(
        [
          [0, 0, 0],
          [3, 0, 0],
          [3, 5, 0],
        ],
        5,
        'straight',
      ) ?? [];
    const worked: Vec3[] = [
      [0, 0, 0],
      [2, 0, 0],
      [3, 1, 0],
      [3, 3, 0],
      [3, 5, 0],
    ];
    expect(spread).toHaveLength(worked.length);
    for (const [index, point] of worked.entries()) {
      expect(distance(point, spread[index] as Vec3)).toBeLessThan(1e-12);
    }
  });

  it('passes through the points it is given', () => {
    const points: Vec3[] = [
      [0, 0, 0],
      [1, 2, 0],
      [3, 2, 1],
      [4, 0, 1],
    ];
    const many = spreadByArcLength(points, 4001, 'smooth') ?? [];
    for (const point of points) {
      expect(Math.min(...many.map((placed) => distance(placed, point)))).toBeLessThan(2e-3);
    }
  });

  it('leaves equal lengths of curve between neighbours', () => {
    // Spread a thousand times finer, every thousandth joint must be the same and all chords nearly the same.
    const points: Vec3[] = [
      [0, 0, 0],
      [1, 2, 0],
      [3, 2, 1],
      [4, 0, 1],
    ];
    const count = 7;
    const fine = 1000;
    const placed = spreadByArcLength(points, count, 'smooth') ?? [];
    const many = spreadByArcLength(points, (count - 1) * fine + 1, 'smooth') ?? [];
    for (const [index, point] of placed.entries()) {
      expect(distance(point, many[index * fine] as Vec3)).toBeLessThan(1e-9);
    }
    const chord = (index: number) => distance(many[index] as Vec3, many[index + 1] as Vec3);
    expect(chord(0)).toBeCloseTo(chord(fine * 3 + 11), 8);
    expect(chord(0)).toBeCloseTo(chord(fine * 6 - 1), 8);
  });

  it('gives null when no length is left', () => {
    expect(spreadByArcLength([[1, 2, 3]], 4, 'smooth')).toBeNull();
    expect(
      spreadByArcLength(
        [
          [1, 2, 3],
          [1, 2, 3],
        ],
        4,
        'straight',
      ),
    ).toBeNull();
  });

  const coordinate = fc.double({ min: -100, max: 100, noNaN: true });
  const point = fc.tuple(coordinate, coordinate, coordinate);

  it('keeps both ends exactly and stays finite for any points', () => {
    fc.assert(
      fc.property(
        fc.array(point, { minLength: 2, maxLength: 8 }),
        fc.integer({ min: 2, max: 20 }),
        (points, count) => {
          const spread = spreadByArcLength(points, count, 'smooth');
          if (spread === null) return;
          expect(spread).toHaveLength(count);
          expect(spread[0]).toEqual(points[0]);
          expect(spread.flat().every(Number.isFinite)).toBe(true);
        },
      ),
    );
  });

  it('scales with its points', () => {
    fc.assert(
      fc.property(fc.array(point, { minLength: 3, maxLength: 5 }), (points) => {
        const one = spreadByArcLength(points, 6, 'smooth');
        const ten = spreadByArcLength(
          points.map(([x, y, z]) => [x * 8, y * 8, z * 8] as Vec3),
          6,
          'smooth',
        );
        if (!one || !ten) return;
        for (const [index, [x, y, z]] of one.entries()) {
          expect(distance([x * 8, y * 8, z * 8], ten[index] as Vec3)).toBeLessThan(1e-5);
        }
      }),
    );
  });
});
