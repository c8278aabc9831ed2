import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'pole-too-near';
const limb = (pole: string): string => `chains:
  arm: { points: [[0, 50, 0], [15, 50, -8], [30, 50, 0]], names: [a, b, c] }
controls:
  hand: { at: arm.c }
  pole: { ${pole} }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
`;
const poleOf = (distance: string): string =>
  `pole_of: { joints: [arm.a, arm.b, arm.c], distance: ${distance} }`;

describe(CODE, () => {
  it('points at the distance and puts the pole at one length', () => {
    const body = limb(poleOf('0.2'));
    expect(told(CODE, body)).toEqual([
      ['0.2', '"pole" stands 0.2 of the length of "bend" from its line, which the folding limb overtakes.'],
    ]);
    expect(fixed(CODE, body)).toBe(limb(poleOf('1')));
  });

  it('points at the place of a pole that stands by itself', () => {
    // The bones of 17 cm make a length of 34 cm.
    const body = limb('at: [15, 50, -8.5]');
    expect(told(CODE, body)).toEqual([
      [
        '[15, 50, -8.5]',
        '"pole" stands 0.25 of the length of "bend" from its line, which the folding limb overtakes.',
      ],
    ]);
    expect(fixed(CODE, body)).toBeNull();
  });

  it('points into a part', () => {
    const part =
      '  arm: { kind: limb, points: [[0, 50, 0], [15, 50, -8], [30, 50, 0]], pole: { distance: 0.1 } }\n';
    expect(told(CODE, part).map(([text]) => text)).toEqual(['0.1']);
    expect(fixed(CODE, part)).toContain('pole: { distance: 1 }');
  });

  it('is silent from 0.3 on', () => {
    expect(told(CODE, limb(poleOf('0.31')))).toEqual([]);
    expect(told(CODE, limb('at: [15, 50, -40]'))).toEqual([]);
  });
});
