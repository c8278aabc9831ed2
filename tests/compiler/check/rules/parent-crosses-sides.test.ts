import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'parent-crosses-sides';
const withParent = (parent: string): string => `chains:
  arm: { side: both, points: [[10, 50, 0], [30, 50, 0]], parent: spine.01 }
  spine: { points: [[0, 40, 0]] }
  hand.left: { points: [[32, 50, 0], [40, 50, 0]], parent: ${parent} }
`;

describe(CODE, () => {
  it('points at the parent on the other side and writes the one on this side', () => {
    const body = withParent('arm.right.02');
    expect(told(CODE, body)).toEqual([
      ['arm.right.02', '"hand.left" hangs on "arm.right.02", which is on the other side.'],
    ]);
    expect(fixed(CODE, body)).toBe(withParent('arm.left.02'));
  });

  it('tells controls too, each at its own place', () => {
    const body = `chains:
  leg: { side: both, points: [[10, 50, 0], [10, 5, 0]] }
controls:
  foot.left: { at: [10, 5, 0], parent: leg.right.02 }
  foot.right: { at: [-10, 5, 0], parent: leg.left.02 }
`;
    expect(told(CODE, body).map(([text]) => text)).toEqual(['leg.right.02', 'leg.left.02']);
  });

  it('is silent for the same side and the centre', () => {
    expect(told(CODE, withParent('arm.left.02'))).toEqual([]);
    expect(told(CODE, withParent('spine.01'))).toEqual([]);
    expect(told(CODE, withParent('root'))).toEqual([]);
  });
});
