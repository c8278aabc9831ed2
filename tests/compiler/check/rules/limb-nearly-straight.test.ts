import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'limb-nearly-straight';
const limb = (depth: number | string, bend = ''): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, ${depth}], [40, 50, 0]], names: [a, b, c] }
controls:
  hand: { at: arm.c }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c]${bend} } }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
`;

describe(CODE, () => {
  it('points at the middle point', () => {
    // 2 × atan(0.3 / 20) = 1.7187 degrees.
    expect(told(CODE, limb(-0.3))).toEqual([
      ['[20, 50, -0.3]', '"arm.b" is bent by 1.7 degrees, too little to say surely which way "bend" folds.'],
    ]);
  });

  it('points at the name of the middle landmark in a part', () => {
    const part = `  arm: { kind: limb, points: [shoulder, elbow, wrist] }
landmarks:
  shoulder: { at: [0, 50, 0] }
  elbow: { at: [20, 50, -0.1] }
  wrist: { at: [40, 50, 0] }
`;
    expect(told(CODE, part).map(([text]) => text)).toEqual(['elbow']);
  });

  it('is silent from 2 degrees on', () => {
    expect(told(CODE, limb(-0.35))).toEqual([]);
  });

  it('is silent where the written bend says the same, and not where it says the contrary', () => {
    expect(told(CODE, limb(-0.3, ', bend: [0, 0, -1]'))).toEqual([]);
    expect(told(CODE, limb(-0.3, ', bend: [0, 0.5, -1]'))).toEqual([]);
    expect(told(CODE, limb(-0.3, ', bend: [0, 0, 1]'))).toHaveLength(1);
  });

  it('is silent for a straight limb that says which way it bends', () => {
    expect(told(CODE, limb(0, ', bend: [0, 0, -1]'))).toEqual([]);
  });
});
