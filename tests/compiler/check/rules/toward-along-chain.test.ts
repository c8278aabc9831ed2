import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'toward-along-chain';
const flag = (orient: string): string =>
  `chains:\n  flag: { points: [[0, 10, 0], [20, 10, 0]], orient: { ${orient} } }\n`;

describe(CODE, () => {
  it('points at the direction, whichever way along the bone it leads', () => {
    expect(told(CODE, flag('toward: [1, 0.05, 0]'))).toEqual([
      [
        '[1, 0.05, 0]',
        'toward of "flag" lies within 3 degrees of its first bone and cannot turn its up axis.',
      ],
    ]);
    expect(told(CODE, flag('toward: [-1, 0, 0.05]'))).toHaveLength(1);
  });

  it('leaves the direction out', () => {
    expect(fixed(CODE, flag('up: +z, toward: [1, 0, 0]'))).toBe(flag('up: +z'));
  });

  it('is silent from 5 degrees on', () => {
    expect(told(CODE, flag('toward: [1, 0.09, 0]'))).toEqual([]);
    expect(told(CODE, flag('toward: [0, 1, 0]'))).toEqual([]);
  });

  it('is silent where the direction is not used', () => {
    expect(told(CODE, flag('rule: world, toward: [1, 0, 0]'))).toEqual([]);
  });
});
