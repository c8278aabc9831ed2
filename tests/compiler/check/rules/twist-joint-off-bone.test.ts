import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'twist-joint-off-bone';
const twistAt = (point: string): string => `chains:
  arm: { points: [[0, 50, 0], [20, 50, 0]], names: [upper, lower] }
  twist: { points: [${point}], names: [half], parent: arm.upper, orient: { like: arm.upper } }
controls:
  wrist: { at: arm.lower, align: arm.lower }
constraints:
  turn: { kind: orient, target: arm.lower, sources: { wrist: 1 } }
solvers:
  spread: { kind: twist, joints: [twist.half], bone: arm.upper, tip: arm.lower, base: root, driver: arm.lower }
`;

describe(CODE, () => {
  it('points at the joint beside the bone', () => {
    expect(told(CODE, twistAt('[10, 52, 0]'))).toEqual([
      ['twist.half', '"twist.half" stands 10 % of the bone beside the line from "arm.upper" to "arm.lower".'],
    ]);
  });

  it('places the joint between both, where it stands along the bone', () => {
    const repaired = twistAt('{ from: arm.upper, to: arm.lower, share: 0.25 }');
    expect(fixed(CODE, twistAt('[5, 52, 0]'))).toBe(repaired);
    expect(told(CODE, repaired)).toEqual([]);
  });

  it('measures past the ends too', () => {
    expect(told(CODE, twistAt('[26, 50, 0]'))[0]?.[1]).toContain('30 %');
  });

  it('is silent on the bone, and within a twentieth of it', () => {
    expect(told(CODE, twistAt('{ from: arm.upper, to: arm.lower }'))).toEqual([]);
    expect(told(CODE, twistAt('[10, 50.9, 0]'))).toEqual([]);
  });
});
