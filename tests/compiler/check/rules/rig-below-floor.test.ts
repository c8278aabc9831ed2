import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'rig-below-floor';
const neck = (points: string, scene = ''): string => `${scene}chains:\n  neck: { points: ${points} }\n`;

describe(CODE, () => {
  it('points at the up axis', () => {
    expect(told(CODE, neck('[[0, 30, 50], [0, 30, 60]]', 'scene: { up: -y }\n'))).toEqual([
      ['-y', 'All 2 joints lie beneath the floor; the highest, "neck.01", at -30 cm.'],
    ]);
  });

  it('points at the recipe where no axis is written', () => {
    expect(told(CODE, neck('[[0, -30, 5], [0, -40, 5]]')).map(([text]) => text)).toEqual(['demo']);
  });

  it('is silent as soon as one joint stands on the floor or above', () => {
    expect(told(CODE, neck('[[0, 0, 5], [0, -40, 5]]'))).toEqual([]);
    expect(told(CODE, neck('[[0, -30, 5], [0, -40, 5]]', 'scene: { up: +z }\n'))).toEqual([]);
  });

  it('is silent for a single joint', () => {
    expect(told(CODE, neck('[[0, -1, 5]]'))).toEqual([]);
  });
});
