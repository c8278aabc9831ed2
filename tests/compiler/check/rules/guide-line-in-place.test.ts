import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'guide-line-in-place';
const line = (to: string): string => `${headControl()}guide_lines:\n  leader: { from: head, to: ${to} }\n`;

describe(CODE, () => {
  it('points at the end of the line', () => {
    expect(told(CODE, line('head.base'))).toEqual([
      [
        'head.base',
        'The guide line "leader" has no length at rest: "head" and "head.base" stand at the same place.',
      ],
    ]);
  });

  it('is silent about lines that can be seen, and about a line to itself, which has a finding of its own', () => {
    expect(told(CODE, line('head.top'))).toEqual([]);
    expect(told(CODE, line('head'))).toEqual([]);
  });
});
