import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'control-not-selectable';
const withRole = (selectable: string): string =>
  `roles:
  sign: { token: sign, container: handles, selectable: ${selectable} }
${headControl('role: sign')}`;

describe(CODE, () => {
  it('points at the control', () => {
    expect(told(CODE, withRole('false'))).toEqual([
      ['head', '"head" cannot be selected, because its role "sign" is not selectable.'],
    ]);
  });

  it('is silent about roles that are selectable', () => {
    expect(told(CODE, withRole('true'))).toEqual([]);
  });
});
