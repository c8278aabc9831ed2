import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { printNumber } from '@/compiler/emit/printNumber';

describe('printNumber', () => {
  it('reads back as the same double, by the grammar of JSON', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(JSON.parse(printNumber(value))).toBe(value + 0);
      }),
    );
  });

  it.each([
    [0.1, '0.1'],
    [-0, '0'],
    [1e21, '1e+21'],
    [1e-7, '1e-7'],
    [5e-324, '5e-324'],
    [96, '96'],
  ])('%d is written %s', (value, written) => {
    expect(printNumber(value)).toBe(written);
  });

  it('has no notation for what is no finite number', () => {
    expect(() => printNumber(Number.NaN)).toThrow(/finite/);
    expect(() => printNumber(Number.POSITIVE_INFINITY)).toThrow(/finite/);
  });
});
