import { describe, expect, it } from 'vitest';
import { polePosition } from '@/compiler/solve/polePosition';

describe('the pole of three points', () => {
  it('stands off the bend, in the plane, at the given share of the length', () => {
    // Isosceles: bones of 5, apex at height 3 over the middle of the base; foot of the perpendicular at (4, 0, 0).
    expect(polePosition([0, 0, 0], [4, 3, 0], [8, 0, 0], 1, null)).toEqual([4, 10, 0]);
    expect(polePosition([0, 0, 0], [4, 3, 0], [8, 0, 0], 0.5, null)).toEqual([4, 5, 0]);
  });

  it('takes the foot of the perpendicular, not the middle of the line', () => {
    const pole = polePosition([0, 0, 0], [3, 4, 0], [9, 0, 0], 1, null);
    expect(pole).not.toBeTypeOf('string');
    expect(pole[0]).toBeCloseTo(3, 12);
  });

  it('follows the hint when the limb is straight', () => {
    expect(polePosition([0, 0, 0], [0, -2, 0], [0, -4, 0], 1, [0, 0, -1])).toEqual([0, -2, -4]);
  });

  it('uses only the sideways part of the hint', () => {
    expect(polePosition([0, 0, 0], [0, -2, 0], [0, -4, 0], 1, [0, 5, 1])).toEqual([0, -2, 4]);
  });

  it('says why it cannot decide', () => {
    expect(polePosition([0, 0, 0], [0, -2, 0], [0, -4, 0], 1, null)).toBe('straight');
    expect(polePosition([0, 0, 0], [0, -2, 0], [0, -4, 0], 1, [0, 3, 0])).toBe('bend-along-limb');
  });

  it('decides by the bone when the limb is folded back onto itself', () => {
    expect(polePosition([0, 0, 0], [0, -2, 0], [0, 0, 0], 1, [1, 0, 0])).toEqual([4, -2, 0]);
  });
});
