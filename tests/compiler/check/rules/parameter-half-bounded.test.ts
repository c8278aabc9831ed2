import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'parameter-half-bounded';
const stature = (text: string): string => `params:\n  stature: { ${text} }\n`;

describe(CODE, () => {
  it('points at the parameter and names the bound that is missing', () => {
    expect(told(CODE, stature('default: 9, min: 3'))).toEqual([
      ['stature', 'The parameter "stature" has min but no max.'],
    ]);
    expect(told(CODE, stature('default: 9, max: 30'))).toEqual([
      ['stature', 'The parameter "stature" has max but no min.'],
    ]);
  });

  it('is silent about both bounds and about none', () => {
    expect(told(CODE, stature('default: 9, min: 3, max: 30'))).toEqual([]);
    expect(told(CODE, stature('default: 9'))).toEqual([]);
  });
});
