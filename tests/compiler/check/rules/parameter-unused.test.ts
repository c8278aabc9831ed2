import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'parameter-unused';
const body = (height: string): string =>
  `params:\n  stature: { default: 96 }\n  ear: { default: 9 }\nlandmarks:\n  crown: { at: [0, ${height}, 0] }\n`;

describe(CODE, () => {
  it('points at the name and takes the parameter away', () => {
    const text = body('"=params.stature"');
    expect(told(CODE, text)).toEqual([['ear', 'No expression reads the parameter "ear".']]);
    expect(fixed(CODE, text)).toBe(text.replace('  ear: { default: 9 }\n', ''));
  });

  it('is silent where every parameter is read, spaces or none', () => {
    expect(told(CODE, body('"=params . stature + params.ear"'))).toEqual([]);
  });
});
