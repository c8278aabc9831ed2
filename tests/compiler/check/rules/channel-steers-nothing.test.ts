import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'channel-steers-nothing';
const LOCKED = '{ locked: true }';

describe(CODE, () => {
  it('points at the control once for each group that has no effect', () => {
    expect(told(CODE, headControl('shape: ring'))).toEqual([
      ['head', 'Nothing follows "head" when it is moved.'],
      ['head', 'Nothing follows "head" when it is scaled.'],
    ]);
  });

  it('locks the group, with or without other channels', () => {
    const body = headControl(`channels: { move: ${LOCKED} }`);
    expect(fixed(CODE, body)).toBe(headControl(`channels: { scale: ${LOCKED}, move: ${LOCKED} }`));
    const bare = headControl('shape: ring').replace('kind: orient', 'kind: point');
    expect(told(CODE, bare).map(([, message]) => message)).toEqual([
      'Nothing follows "head" when it is turned.',
      'Nothing follows "head" when it is scaled.',
    ]);
    expect(fixed(CODE, bare)).toContain(`channels: { turn: ${LOCKED} }`);
  });

  it.each([
    ['two_bone', 'arm.a, arm.b, arm.c'],
    ['reach', 'arm.a, arm.b, arm.c, arm.d'],
  ])('knows that the pole of a %s is followed only where it moves, and its goal in all', (kind, joints) => {
    const body = `chains:
  arm: { points: [[0, 50, 0], [20, 50, -4], [40, 50, 0], [60, 49, 1]], names: [a, b, c, d] }
controls:
  hand: { at: arm.c }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
solvers:
  bend: { kind: ${kind}, joints: [${joints}], goal: hand, pole: pole }
`;
    expect(told(CODE, body).map(([, message]) => message)).toEqual([
      'Nothing follows "pole" when it is turned.',
      'Nothing follows "pole" when it is scaled.',
    ]);
  });

  it('is silent where a child takes everything', () => {
    const body = headControl('shape: ring').replace(
      'constraints:',
      '  hat: { at: head.top, parent: head }\nconstraints:',
    );
    expect(told(CODE, body)).toEqual([]);
  });

  it('is silent where a constraint takes everything, and about locked channels', () => {
    expect(told(CODE, headControl('shape: ring').replace('kind: orient', 'kind: parent'))).toEqual([]);
    expect(told(CODE, headControl(`channels: { move: ${LOCKED}, scale: ${LOCKED} }`))).toEqual([]);
  });
});
