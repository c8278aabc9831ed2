import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'pole-without-guide-line';
const arm = (lines: string): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, -4], [40, 50, 0]], names: [a, b, c] }
controls:
  hand: { at: arm.c }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
${lines}`;

describe(CODE, () => {
  it('points at the pole of the solver', () => {
    expect(told(CODE, arm(''))).toEqual([['pole', 'No guide line shows what the pole "pole" steers.']]);
  });

  it('adds a line where there are others', () => {
    expect(fixed(CODE, arm(''))).toBeNull();
    const body = arm('guide_lines:\n  reach: { from: hand, to: arm.a }\n');
    expect(fixed(CODE, body)).toContain('guide_lines:\n  bend_line: { from: pole, to: arm.b }\n  reach:');
  });

  it('is silent as soon as a line begins at the pole', () => {
    expect(told(CODE, arm('guide_lines:\n  any: { from: pole, to: arm.b }\n'))).toEqual([]);
  });
});
