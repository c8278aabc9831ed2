import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'landmarks-coincide';
const points = (top: string, crown: string): string => `landmarks:
  base: { at: [0, 0, 0] }
  top: { ${top} }
  crown: { ${crown} }
chains:
  neck: { points: [base, [0, 100, 0]], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the place of the later landmark', () => {
    expect(told(CODE, points('at: [0, 60, 0]', 'at: [0, 60.001, 0]'))).toEqual([
      ['[0, 60.001, 0]', 'The landmark "crown" lies at the same place as "top".'],
    ]);
  });

  it('takes a negative zero for zero', () => {
    const body = points('at: [0, 60, 0]', 'at: ["=0 * -1.0", 60, 0]');
    expect(told(CODE, body).map(([, message]) => message)).toHaveLength(1);
  });

  it('is silent about points that lie apart, and about both sides of one landmark', () => {
    expect(told(CODE, points('at: [0, 60, 0]', 'at: [0, 60.1, 0]'))).toEqual([]);
    expect(told(CODE, points('side: left, at: [5, 60, 0]', 'at: [-5, 60, 0]'))).toEqual([]);
  });
});
