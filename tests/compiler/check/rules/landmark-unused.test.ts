import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'landmark-unused';
const body = (point: string): string => `landmarks:
  base: { at: [0, 0, 0] }
  crown: { at: [0, 9, 0] }
chains:
  neck: { points: [base, ${point}], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the name and takes the landmark away', () => {
    const text = body('[0, 9, 0]');
    expect(told(CODE, text)).toEqual([['crown', 'Nothing uses the landmark "crown".']]);
    expect(fixed(CODE, text)).toBe(text.replace('  crown: { at: [0, 9, 0] }\n', ''));
  });

  it('is silent about landmarks that a point, a share between two, or an expression uses', () => {
    expect(told(CODE, body('crown'))).toEqual([]);
    expect(told(CODE, body('{ from: base, to: crown }'))).toEqual([]);
    expect(told(CODE, body('[0, "=landmarks.crown.y", 0]'))).toEqual([]);
  });
});
