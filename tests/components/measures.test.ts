import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lengthWords } from '@/components/editor/ThingsPane';
import { paperSpacing } from '@/components/viewport/Ground';

describe('lines of the graph paper', () => {
  it.each([
    [16, 1],
    [160, 10],
    [32, 2],
    [80, 5],
    [128, 10],
    [1.6, 0.1],
    [96, 5],
    [23, 1],
    [25, 2],
  ])('at a size of %d lie %d apart', (size, spacing) => expect(paperSpacing(size)).toBeCloseTo(spacing, 12));

  it('lie 1, 2 or 5 times a power of ten apart, eleven to twenty-eight across the rig', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e6, noNaN: true }), (size) => {
        const spacing = paperSpacing(size);
        const digit = Number(spacing.toExponential(6).charAt(0));
        expect([1, 2, 5]).toContain(digit);
        expect(size / spacing).toBeGreaterThan(11);
        expect(size / spacing).toBeLessThanOrEqual(28);
      }),
    );
  });
});

describe('lengths in words', () => {
  it.each([
    [0, '0.000'],
    [-0, '0.000'],
    [-0.0001, '0.000'],
    [1.5, '1.500'],
    [-2.25, '−2.250'],
    [1234.56789, '1234.568'],
    [0.0005, '0.001'],
  ])('%d reads %s', (value, words) => expect(lengthWords(value)).toBe(words));

  it('are never further off than half of the last digit', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e5, max: 1e5, noNaN: true }), (value) => {
        const read = Number(lengthWords(value).replace('−', '-'));
        expect(Math.abs(read - value)).toBeLessThanOrEqual(0.0005 + 1e-9);
      }),
    );
  });
});
