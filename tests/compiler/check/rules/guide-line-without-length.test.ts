import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'guide-line-without-length';
const line = (to: string): string => `${headControl()}guide_lines:\n  leader: { from: head, to: ${to} }\n`;

describe(CODE, () => {
  it('points at the end of the line', () => {
    expect(told(CODE, line('head'))).toEqual([
      ['head', 'The guide line "leader" leads from "head" to itself.'],
    ]);
  });

  it('is silent about lines to anything else', () => {
    expect(told(CODE, line('head.top'))).toEqual([]);
  });
});
