import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  angleBetween,
  cross,
  dot,
  length,
  mix,
  normalise,
  perpendicularTo,
  rejectFrom,
  signedAngle,
  ZERO,
} from '@/compiler/math/vec3';
import { direction, point } from './arbitraries';
import { expectNear } from './expectNear';

describe('directions', () => {
  it('normalises vectors of any finite size', () => {
    expectNear(normalise([3, 0, 4]), [0.6, 0, 0.8]);
    expectNear(normalise([3e307, 0, 4e307]), [0.6, 0, 0.8]);
    expectNear(normalise([3e-320, 0, 4e-320]), [0.6, 0, 0.8], 1e-3);
  });

  it('gives zero for the zero vector and for what is no number', () => {
    expect(normalise([0, 0, 0])).toBe(ZERO);
    expect(normalise([Number.NaN, Number.NaN, Number.NaN])).toBe(ZERO);
  });

  it('finds a perpendicular of length one to anything, and X for zero', () => {
    expect(perpendicularTo([0, 0, 0])).toEqual([1, 0, 0]);
    fc.assert(
      fc.property(direction, (v) => {
        const side = perpendicularTo(v);
        expect(Math.abs(dot(side, v))).toBeLessThan(1e-12);
        expect(length(side)).toBeCloseTo(1, 12);
      }),
    );
  });

  it('takes away exactly the part along a direction', () => {
    fc.assert(
      fc.property(point, direction, (v, along) => {
        const unit = normalise(along);
        expect(Math.abs(dot(rejectFrom(v, unit), unit))).toBeLessThan(1e-9);
      }),
    );
  });
});

describe('products and angles', () => {
  it('has a right-handed cross product', () => {
    expect(cross([1, 0, 0], [0, 1, 0])).toEqual([0, 0, 1]);
  });

  it('measures angles near 0 and near half a turn without losing digits', () => {
    // Worked by hand: atan2(1e-9, ±1).
    expect(angleBetween([1, 0, 0], [1, 1e-9, 0])).toBeCloseTo(1e-9, 20);
    expect(Math.PI - angleBetween([1, 0, 0], [-1, 1e-9, 0])).toBeCloseTo(1e-9, 15);
    expect(angleBetween([0, 0, 0], [1, 0, 0])).toBe(0);
  });

  it('signs an angle by the right hand about its axis', () => {
    expect(signedAngle([1, 0, 0], [0, 1, 0], [0, 0, 1])).toBeCloseTo(Math.PI / 2, 15);
    expect(signedAngle([1, 0, 0], [0, 1, 0], [0, 0, -1])).toBeCloseTo(-Math.PI / 2, 15);
  });

  it('mixes exactly at both ends', () => {
    fc.assert(
      fc.property(point, point, (a, b) => {
        expectNear(mix(a, b, 0), a, 0);
        expectNear(mix(a, b, 1), b, 0);
      }),
    );
  });
});
