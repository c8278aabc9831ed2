import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'constraint-overwritten';
const limb = (solver: string, constraint: string): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, -4], [40, 50, 0]], names: [a, b, c] }
controls:
  elbow: { at: arm.b, align: arm.b }
  hand: { at: arm.c, attributes: { reach: { default: 1, min: 0, max: 1 } } }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole${solver} }
constraints:
  turn: { ${constraint} }
`;
const ORIENT = 'kind: orient, target: arm.b, sources: { elbow: 1 }';

describe(CODE, () => {
  it('points at the constraint and names the solver', () => {
    expect(told(CODE, limb('', ORIENT))).toEqual([
      ['turn', '"turn" turns "arm.b", but the solver "bend" turns it anew at all times.'],
    ]);
  });

  it('removes the constraint alone', () => {
    const other = '  aim: { kind: orient, target: arm.c, sources: { hand: 1 } }\n';
    const body = limb('', ORIENT) + other;
    expect(fixed(CODE, body)).toBe(body.replace(/ {2}turn: .*\n/, ''));
  });

  it('is silent where the blend may let the constraint show', () => {
    expect(told(CODE, limb(', blend: hand.reach', ORIENT))).toEqual([]);
    expect(told(CODE, limb(', blend: 0.5', ORIENT))).toEqual([]);
  });

  it('is silent for the end joint and for what only places a joint', () => {
    expect(told(CODE, limb('', 'kind: orient, target: arm.c, sources: { hand: 1 }'))).toEqual([]);
    expect(told(CODE, limb('', 'kind: point, target: arm.a, sources: { root: 1 }'))).toEqual([]);
  });
});
