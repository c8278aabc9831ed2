import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'joints-fewer-than-points';
const withJoints = (joints: string): string =>
  `chains:\n  tail: { points: [[0, 10, 0], [0, 12, -10], [0, 8, -20], [0, 12, -30]]${joints} }\n`;

describe(CODE, () => {
  it('points at the count and raises it to the number of points', () => {
    const body = withJoints(', joints: 3');
    expect(told(CODE, body)).toEqual([
      ['3', '"tail" has 4 points but only 3 joints, so its bones cut across the curve.'],
    ]);
    expect(fixed(CODE, body)).toBe(withJoints(', joints: 4'));
  });

  it('points into a part that asks for too few', () => {
    const part = '  tail: { kind: strand, points: [[0, 10, 0], [0, 12, -10], [0, 8, -20]], joints: 2 }\n';
    expect(told(CODE, part).map(([text]) => text)).toEqual(['2']);
  });

  it('does not edit a number that other chains repeat by its anchor', () => {
    expect(told(CODE, withJoints(', joints: &few 3'))).toHaveLength(1);
    expect(fixed(CODE, withJoints(', joints: &few 3'))).toBeNull();
  });

  it('is silent with one joint a point or more, and where each point is a joint', () => {
    expect(told(CODE, withJoints(', joints: 4'))).toEqual([]);
    expect(told(CODE, withJoints(', joints: 9'))).toEqual([]);
    expect(told(CODE, withJoints(''))).toEqual([]);
  });
});
