import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'chain-crosses-middle';
const arm = (side: string, end: string, more = ''): string =>
  `${more}chains:\n  arm: { side: ${side}, points: [[10, 50, 0], ${end}] }\n`;

describe(CODE, () => {
  it('points at the point across the middle', () => {
    expect(told(CODE, arm('left', '[-8, 50, 4]'))).toEqual([
      ['[-8, 50, 4]', '"arm.left.02" stands across the middle, on the side where it does not belong.'],
    ]);
  });

  it('mirrors the point to its own side', () => {
    expect(fixed(CODE, arm('both', '[-8, 50, 4]'))).toBe(arm('both', '[8, 50, 4]'));
  });

  it('tells both mirrored copies in one finding', () => {
    expect(told(CODE, arm('both', '[-8, 50, 4]'))).toHaveLength(1);
  });

  it('follows the axes of the scene', () => {
    // Up z and forward −y keep +x on the left; up y and forward −z put −x there.
    expect(told(CODE, arm('left', '[20, 50, 4]', 'scene: { up: +z }\n'))).toEqual([]);
    expect(told(CODE, arm('left', '[20, 50, 4]', 'scene: { forward: -z }\n')).map(([text]) => text)).toEqual([
      '[10, 50, 0]',
    ]);
  });

  it('is silent in the centre, at the middle plane and for fingers that just touch', () => {
    expect(told(CODE, arm('centre', '[-8, 50, 4]'))).toEqual([]);
    expect(told(CODE, arm('left', '[0, 50, 4]'))).toEqual([]);
    expect(told(CODE, arm('left', '[-0.1, 50, 4]'))).toEqual([]);
    expect(told(CODE, arm('left', '[-0.4, 50, 4]'))).toHaveLength(1);
  });

  it('leaves a sided landmark on the wrong side to its own finding', () => {
    const landmarks = 'landmarks:\n  paw: { side: left, at: [-8, 50, 4] }\n';
    expect(told(CODE, arm('both', 'paw', landmarks))).toEqual([]);
  });

  it('tells a right point of its own that lies on the left', () => {
    const landmarks = 'landmarks:\n  paw: { side: left, at: [8, 50, 4], right: [8, 50, 4] }\n';
    expect(told(CODE, arm('both', 'paw', landmarks)).map(([text]) => text)).toEqual(['paw']);
  });
});
