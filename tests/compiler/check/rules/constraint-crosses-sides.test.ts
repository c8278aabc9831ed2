import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'constraint-crosses-sides';
const withSources = (sources: string): string => `chains:
  spine: { points: [[0, 40, 0]] }
  arm: { side: both, points: [[10, 50, 0], [30, 50, 0]], parent: spine.01 }
controls:
  hand: { side: both, at: [30, 50, 0] }
  head: { at: [0, 60, 0] }
constraints:
  turn: { kind: orient, target: arm.left.01, sources: { ${sources} } }
`;

describe(CODE, () => {
  it('points at the source on the other side and names its twin', () => {
    const body = withSources('hand.right: 1');
    expect(told(CODE, body)).toEqual([
      ['hand.right', '"arm.left.01" follows "hand.right" alone, which is on the other side.'],
    ]);
    expect(fixed(CODE, body)).toBe(withSources('hand.left: 1'));
  });

  it('is silent for the same side, the centre, and both sides together', () => {
    expect(told(CODE, withSources('hand.left: 1'))).toEqual([]);
    expect(told(CODE, withSources('head: 1'))).toEqual([]);
    expect(told(CODE, withSources('hand.left: 1, hand.right: 1'))).toEqual([]);
  });

  it('offers no twin that does not exist', () => {
    const body = withSources('horn.right: 1').replace('head:', 'horn.right: { at: [-5, 60, 0] }\n  head:');
    expect(told(CODE, body)).toHaveLength(1);
    expect(fixed(CODE, body)).toBeNull();
  });
});
