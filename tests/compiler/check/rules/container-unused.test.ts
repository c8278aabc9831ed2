import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'container-unused';

describe(CODE, () => {
  it('points at the container and takes it away', () => {
    const body = 'containers:\n  faces: { parent: handles }\n  brows: { parent: faces }\n';
    expect(told(CODE, body)).toEqual([['brows', 'No role and no container lies in the container "brows".']]);
    expect(fixed(CODE, body)).toBe('containers:\n  faces: { parent: handles }\n');
  });

  it('is silent where a role lies in it, and about containers of the house', () => {
    const roles = 'roles:\n  face: { token: face, container: faces }\n';
    expect(told(CODE, `containers:\n  faces: { parent: handles }\n${roles}`)).toEqual([]);
    expect(told(CODE, 'containers:\n  shapes: { shown: true }\n')).toEqual([]);
  });
});
