import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'chain-never-bends';
const TAIL =
  '  ear: { kind: strand, points: [[0, 30, 0], [0, 40, 0]], joints: 3 }\nchains:\n  tail: { points: [[0, 10, 0], [0, 10, -10], [0, 10, -20]] }\n';
const CONTROL = 'controls:\n  tail: { at: tail.02, attributes: { wag: { min: -1, max: 1 } } }\n';

describe(CODE, () => {
  it('points at the chain', () => {
    expect(told(CODE, TAIL)).toEqual([['tail', 'Nothing turns any joint of "tail".']]);
  });

  it('is silent once a constraint, a driver or a part turns a joint', () => {
    const constraint = 'constraints:\n  turn: { kind: orient, target: tail.02, sources: { tail: 1 } }\n';
    expect(told(CODE, TAIL + CONTROL + constraint)).toEqual([]);
    const driver =
      'drivers:\n  wag: { input: tail.wag, target: tail.02, channel: ry, keys: [[-1, -20], [1, 20]] }\n';
    expect(told(CODE, TAIL + CONTROL + driver)).toEqual([]);
    expect(told(CODE, '  tail: { kind: strand, points: [[0, 10, 0], [0, 10, -20]], joints: 4 }\n')).toEqual(
      [],
    );
  });

  it('is silent for a bare skeleton, in which nothing turns anything', () => {
    expect(told(CODE, TAIL.replace(/.*\n/, ''))).toEqual([]);
  });

  it('is silent for a single bone, which may be rigid', () => {
    expect(told(CODE, 'chains:\n  beak: { points: [[0, 10, 0], [0, 10, 5]] }\n')).toEqual([]);
  });
});
