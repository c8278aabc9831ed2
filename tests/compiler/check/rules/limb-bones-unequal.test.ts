import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'limb-bones-unequal';
const limb = (elbow: string, end = '[40, 50, 0]'): string => `chains:
  arm: { points: [[0, 50, 0], ${elbow}, ${end}], names: [a, b, c] }
controls:
  hand: { at: arm.c }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
`;

describe(CODE, () => {
  it('points at the solver and says what its end cannot reach', () => {
    // Hand-worked: 3-4-5 triangles give bones of 50 and 10.
    expect(told(CODE, limb('[40, 50, 30]', '[48, 50, 24]'))).toEqual([
      ['bend', 'The bones of "bend" measure 50 and 10 cm: its end cannot come nearer to "arm.a" than 40.'],
    ]);
  });

  it('is silent up to three times', () => {
    expect(told(CODE, limb('[30, 50, 0]', '[30, 40, 0]'))).toEqual([]);
    expect(told(CODE, limb('[10, 50, 0]', '[10, 20, 0]'))).toEqual([]);
  });
});
