import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'landmark-left-in-middle';
const tip = (text: string): string => `landmarks:
  tip: { ${text} }
chains:
  ear: { side: both, points: [[10, 50, 0], tip], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the place and makes it a centre point', () => {
    const body = tip('side: left, at: [0, 66, 0]');
    expect(told(CODE, body)).toEqual([
      ['[0, 66, 0]', 'The left landmark "tip" lies in the middle, where its mirror image is the same point.'],
    ]);
    expect(fixed(CODE, body)).toBe(tip('side: centre, at: [0, 66, 0]'));
  });

  it('is silent about points beside the middle, centre points, and where the right point is another', () => {
    expect(told(CODE, tip('side: left, at: [0.01, 66, 0]'))).toEqual([]);
    expect(told(CODE, tip('at: [0, 66, 0]'))).toEqual([]);
    expect(told(CODE, tip('side: left, at: [0, 66, 0], right: [-3, 66, 0]'))).toEqual([]);
  });
});
