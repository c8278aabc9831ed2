import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'solver-crosses-sides';
const withHandles = (goal: string, pole: string): string => `chains:
  spine: { points: [[0, 40, 0]] }
  arm:
    side: both
    points: [[10, 50, 0], [30, 50, -4], [50, 50, 0]]
    names: [a, b, c]
    parent: spine.01
controls:
  hand: { side: both, at: [50, 50, 0] }
  pole: { side: both, pole_of: { joints: [arm.left.a, arm.left.b, arm.left.c] } }
  both_hands: { at: [0, 50, 40] }
solvers:
  bend.left: { kind: two_bone, joints: [arm.left.a, arm.left.b, arm.left.c], goal: ${goal}, pole: ${pole} }
`;

describe(CODE, () => {
  it('points at the handle on the other side and names its twin', () => {
    const body = withHandles('hand.left', 'pole.right');
    expect(told(CODE, body)).toEqual([
      [
        'pole.right',
        'The solver "bend.left" names "arm.left.a" and "pole.right", which are on opposite sides.',
      ],
    ]);
    expect(fixed(CODE, body)).toBe(withHandles('hand.left', 'pole.left'));
  });

  it('is silent for one side and for handles in the centre', () => {
    expect(told(CODE, withHandles('hand.left', 'pole.left'))).toEqual([]);
    expect(told(CODE, withHandles('both_hands', 'pole.left'))).toEqual([]);
  });
});
