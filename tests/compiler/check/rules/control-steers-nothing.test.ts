import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'control-steers-nothing';
const withHat = (lines: string): string =>
  headControl(lines).replace('constraints:', '  hat: { at: head.top, parent: head }\nconstraints:');

describe(CODE, () => {
  it('points at the control that nothing follows', () => {
    expect(told(CODE, withHat('shape: pin'))).toEqual([['hat', 'Nothing follows the control "hat".']]);
  });

  it('is silent about what a constraint follows, and about what can carry another control', () => {
    expect(told(CODE, headControl('shape: pin'))).toEqual([]);
    const carried = withHat('shape: pin').replace(
      'hat: { at: head.top, parent: head }',
      'hat: { at: head.top }',
    );
    expect(told(CODE, carried.replace('shape: pin', 'spaces: [root, hat]'))).toEqual([]);
  });
});
