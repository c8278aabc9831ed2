import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'landmarks-nearly-mirrored';
const withRight = (right: string): string => `landmarks:
  base: { side: left, at: [8, 0, 0]${right} }
  tip: { side: left, at: [8, 100, 0] }
chains:
  ear: { side: both, points: [base, tip] }
`;

describe(CODE, () => {
  it('points at the right point and writes the mirror image', () => {
    const body = withRight(', right: [-8, 0, 0.5]');
    expect(told(CODE, body)).toEqual([
      ['[-8, 0, 0.5]', 'The right point of "base" lies 0.5 cm beside the mirror image of the left.'],
    ]);
    expect(fixed(CODE, body)).toBe(withRight(', right: [-8, 0, 0]'));
  });

  it('is silent without a right point, and for the mirror image itself', () => {
    expect(told(CODE, withRight(''))).toEqual([]);
    expect(told(CODE, withRight(', right: [-8, 0, 0]'))).toEqual([]);
  });

  it('is silent where the model is plainly meant to differ', () => {
    // The rig measures 100 cm; differences from 1 cm on are meant.
    expect(told(CODE, withRight(', right: [-8, 0, 1.1]'))).toEqual([]);
  });
});
