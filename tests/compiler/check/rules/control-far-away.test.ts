import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'control-far-away';
// The joints of the head lie between 50 and 60 above the floor, so the skeleton is 10 long.
const at = (height: number): string => headControl().replace('at: head.base', `at: [0, ${height}, 0]`);

describe(CODE, () => {
  it('points at the place', () => {
    expect(told(CODE, at(91))).toEqual([
      ['[0, 91, 0]', '"head" stands 31 cm outside a skeleton that is 10 cm long.'],
    ]);
  });

  it('is silent up to three lengths, and within', () => {
    expect(told(CODE, at(90))).toEqual([]);
    expect(told(CODE, at(55))).toEqual([]);
  });
});
