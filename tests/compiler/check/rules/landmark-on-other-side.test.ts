import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'landmark-on-other-side';
const tip = (text: string): string => `landmarks:
  tip: { side: left, ${text} }
chains:
  ear: { side: both, points: [[10, 50, 0], tip], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the place and moves it to the left', () => {
    const body = tip('at: [-8, 66, 0]');
    expect(told(CODE, body)).toEqual([
      ['[-8, 66, 0]', 'The left landmark "tip" lies 8 cm on the right; left is toward +x here.'],
    ]);
    expect(fixed(CODE, body)).toBe(tip('at: [8, 66, 0]'));
  });

  it("reads which way is left from the scene's axes", () => {
    const scene = 'scene: { up: +z, forward: +x }\n';
    const turned = scene + tip('at: [66, -8, 0]').replace('[10, 50, 0]', '[50, 10, 0]');
    expect(told(CODE, turned)).toEqual([
      ['[66, -8, 0]', 'The left landmark "tip" lies 8 cm on the right; left is toward +y here.'],
    ]);
    expect(told(CODE, turned.replace('-8', '8'))).toEqual([]);
  });

  it('offers nothing where numbers are worked out or the right point is given too', () => {
    expect(fixed(CODE, tip('at: ["=-4 * 2", 66, 0]'))).toBeNull();
    expect(fixed(CODE, tip('at: [-8, 66, 0], right: [8, 66, 0]'))).toBeNull();
  });

  it('is silent about the left, and about what reaches over the middle a little', () => {
    expect(told(CODE, tip('at: [8, 66, 0]'))).toEqual([]);
    expect(told(CODE, tip('at: [-0.1, 66, 0]'))).toEqual([]);
  });

  it('is silent about centre points, which may stand anywhere', () => {
    const body = tip('at: [-8, 66, 0]').replace('side: left, at', 'at').replace('side: both, ', '');
    expect(told(CODE, body)).toEqual([]);
  });
});
