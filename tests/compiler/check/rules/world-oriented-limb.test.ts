import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'world-oriented-limb';
const withOrient = (orient: string, solvers = true): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, -4], [40, 50, 0]], names: [a, b, c]${orient} }
controls:
  hand: { at: arm.c }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
${solvers ? 'solvers:\n  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }\n' : ''}`;

describe(CODE, () => {
  it('points at the rule of the chain and changes it', () => {
    const body = withOrient(', orient: { rule: world }');
    expect(told(CODE, body)).toEqual([
      ['world', 'The solver "bend" folds "arm", whose joints are turned like the world.'],
    ]);
    expect(fixed(CODE, body)).toBe(withOrient(', orient: { rule: chain }'));
  });

  it('is silent for joints along the chain and where no solver folds them', () => {
    expect(told(CODE, withOrient(''))).toEqual([]);
    expect(told(CODE, withOrient(', orient: { toward: [0, 1, 0] }'))).toEqual([]);
    expect(told(CODE, withOrient(', orient: { rule: world }', false))).toEqual([]);
  });
});
