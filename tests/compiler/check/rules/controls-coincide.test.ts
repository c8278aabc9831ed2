import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'controls-coincide';
const pair = (first: string, second: string): string => `chains:
  head: { points: [[0, 50, 0], [0, 60, 0]], names: [base, top] }
controls:
  head: { at: head.base${first} }
  tilt: { at: head.base${second} }
constraints:
  turn: { kind: orient, target: head.base, sources: { head: 1, tilt: 1 } }
`;

describe(CODE, () => {
  it('points at the later of the two and draws it larger', () => {
    expect(told(CODE, pair('', ''))).toEqual([['tilt', '"tilt" is drawn exactly over "head".']]);
    expect(fixed(CODE, pair('', ''))).toContain('tilt: { size: 1.25, at: head.base }');
  });

  it('is silent about another shape, another size and another place', () => {
    expect(told(CODE, pair('', ', shape: pin'))).toEqual([]);
    expect(told(CODE, pair('', ', size: 1.2'))).toEqual([]);
    expect(told(CODE, pair('', '').replace('tilt: { at: head.base', 'tilt: { at: head.top'))).toEqual([]);
  });
});
