import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'landmark-off-middle';
const top = (text: string): string => `landmarks:
  top: { ${text} }
chains:
  neck: { points: [[0, 0, 0], top], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the number across and writes 0', () => {
    const body = top('at: [0.2, 100, 0]');
    expect(told(CODE, body)).toEqual([['0.2', 'The landmark "top" lies 0.2 cm beside the middle.']]);
    expect(fixed(CODE, body)).toBe(top('at: [0, 100, 0]'));
  });

  it('is silent in the middle, on a side, and where a point lies aside on purpose', () => {
    expect(told(CODE, top('at: [0, 100, 3]'))).toEqual([]);
    expect(told(CODE, top('side: left, at: [0.2, 100, 0]'))).toEqual([]);
    expect(told(CODE, top('at: [0.6, 100, 0]'))).toEqual([]);
  });
});
