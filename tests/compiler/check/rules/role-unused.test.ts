import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'role-unused';
const ROLES =
  'roles:\n  face: { token: face, container: handles }\n  brow: { token: brow, container: handles }\n';

describe(CODE, () => {
  it('points at the role and takes it away', () => {
    const body = ROLES + headControl('role: face');
    expect(told(CODE, body)).toEqual([['brow', 'Nothing has the role "brow".']]);
    expect(fixed(CODE, body)).toBe(body.replace(/ {2}brow: .*\n/, ''));
  });

  it('is silent about roles of the house that the recipe adjusts', () => {
    expect(told(CODE, 'roles:\n  geometry: { selectable: true }\n')).toEqual([]);
  });
});
