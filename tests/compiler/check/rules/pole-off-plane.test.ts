import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'pole-off-plane';
const limb = (pole: string, depth = -4): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, ${depth}], [40, 50, 0]], names: [a, b, c] }
controls:
  hand: { at: arm.c }
  pole: { ${pole} }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
`;

describe(CODE, () => {
  it('points at the place and lets pole_of choose it at the same distance', () => {
    const body = limb('at: [20, 70, -20]');
    expect(told(CODE, body)).toEqual([
      ['[20, 70, -20]', '"pole" stands 45 degrees beside the plane in which "bend" is bent.'],
    ]);
    // √(20² + 20²) = 28.28 of a length of 2 × √(20² + 4²) = 40.79.
    const repaired = limb('pole_of: { joints: [arm.a, arm.b, arm.c], distance: 0.69 }');
    expect(fixed(CODE, body)).toBe(repaired);
    expect(told(CODE, repaired)).toEqual([]);
  });

  it('tells a pole on the far side', () => {
    expect(told(CODE, limb('at: [20, 50, 40]'))[0]?.[1]).toContain('180 degrees');
  });

  it('is silent within 15 degrees, and along the limb', () => {
    // tan 14° = 0.2493.
    expect(told(CODE, limb('at: [20, 59.97, -40]'))).toEqual([]);
    expect(told(CODE, limb('at: [35, 50, -40]'))).toEqual([]);
  });

  it('leaves a limb that is all but straight to its own finding', () => {
    expect(told(CODE, limb('at: [20, 90, 0]', -0.2))).toEqual([]);
  });
});
