import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'expression-reads-nothing';
const top = (height: string): string => `params:
  stature: { default: 60 }
landmarks:
  base: { at: [0, 0, 0] }
chains:
  neck: { points: [base, [0, ${height}, 0]], names: [a, b] }
`;

describe(CODE, () => {
  it('points at the expression and writes its value', () => {
    expect(told(CODE, top('"=50 + 10"'))).toEqual([
      ['"=50 + 10"', 'The expression "=50 + 10" is always 60.'],
    ]);
    expect(fixed(CODE, top('"=50 + 10"'))).toBe(top('60'));
  });

  it('rounds away what binary fractions add', () => {
    expect(fixed(CODE, top('"=0.1 + 0.2"'))).toBe(top('0.3'));
  });

  it('sees expressions in landmarks', () => {
    const body = top('50').replace('[0, 0, 0]', '[0, "=min(2, 3)", 0]');
    expect(told(CODE, body).map(([text]) => text)).toEqual(['"=min(2, 3)"']);
  });

  it('is silent about what reads parameters or landmarks, and about prose', () => {
    expect(told(CODE, top('"=params.stature"'))).toEqual([]);
    expect(told(CODE, top('"=50 + landmarks.base.y"'))).toEqual([]);
    expect(told(CODE, `title: "=2 + 2"\n${top('50')}`)).toEqual([]);
  });
});
