import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'control-hidden';
const withRole = (shown: string, container: string): string =>
  `containers:
  attic: { parent: carry, shown: false }
roles:
  quiet: { token: quiet, container: ${container}, shown: ${shown} }
${headControl('role: quiet')}`;

describe(CODE, () => {
  it('points at the control and says whether its role hides it', () => {
    expect(told(CODE, withRole('false', 'handles'))).toEqual([
      ['head', '"head" is not shown: the role "quiet" is hidden.'],
    ]);
  });

  it('says whether its container hides it', () => {
    expect(told(CODE, withRole('true', 'attic'))).toEqual([
      ['head', '"head" is not shown: the container "attic" is hidden.'],
    ]);
  });

  it('is silent about what is shown', () => {
    expect(told(CODE, withRole('true', 'handles'))).toEqual([]);
  });
});
