import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'hinge-opens-backward';
const STILL = '{ min: 0, max: 0 }';
const leg = (range: string, depth = 4): string => `chains:
  leg:
    side: both
    points: [[10, 50, 0], [10, 30, ${depth}], [10, 10, 0]]
    names: [hip, knee, ankle]
    limits: { knee: { rx: ${STILL}, ry: ${STILL}, rz: ${range} } }
controls:
  foot: { side: both, at: leg.left.ankle }
  pole: { side: both, pole_of: { joints: [leg.left.hip, leg.left.knee, leg.left.ankle] } }
solvers:
  bend: { side: both, kind: two_bone, joints: [leg.left.hip, leg.left.knee, leg.left.ankle], goal: foot.left, pole: pole.left }
`;

describe(CODE, () => {
  it('points at the range and turns it round', () => {
    const body = leg('{ min: -130, max: 5 }');
    expect(told(CODE, body)).toEqual([
      [
        '{ min: -130, max: 5 }',
        'rz of "leg.left.knee" folds the limb by 5 degrees at most, but opens it by 130, past straight.',
      ],
    ]);
    expect(fixed(CODE, body)).toBe(leg('{ min: -5, max: 130 }'));
    expect(told(CODE, fixed(CODE, body) ?? '')).toEqual([]);
  });

  it('knows the fold from the bend: with the knee behind, the frames turn along and so do the limits', () => {
    expect(told(CODE, leg('{ min: -5, max: 130 }', -4))).toEqual([]);
    expect(told(CODE, leg('{ min: -130, max: 5 }', -4))).toHaveLength(1);
  });

  it('is silent for a limb that opens to straight and a little past it', () => {
    // The knee is bent by 2 × atan(4 / 20) = 22.6 degrees; 15 more are allowed.
    expect(told(CODE, leg('{ min: -37, max: 5 }'))).toEqual([]);
    expect(told(CODE, leg('{ min: -38, max: 5 }'))).toHaveLength(1);
  });

  it('is silent for a range without an end', () => {
    expect(told(CODE, leg('{ min: -130 }'))).toEqual([]);
  });
});
