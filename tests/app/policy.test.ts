import { describe, expect, it } from 'vitest';
import { type Action, can, strongestRole } from '@/app/_server/policy';
import type { Viewer } from '@/app/_server/viewer';
import type { Role } from '@/app/api/v1/_contracts/show';

function viewerWith(...roles: Role[]): Viewer {
  return { personId: 'p', name: 'P', email: 'p@example.test', rolesByShow: new Map([['here', roles]]) };
}

const here = { showId: 'here' };
const reading: readonly Action[] = ['show.read', 'recipe.read', 'version.read', 'build.read'];
const writing: readonly Action[] = ['recipe.create', 'draft.read', 'draft.write', 'version.save'];

describe('the policy', () => {
  it.each<[Role, boolean]>([
    ['admin', true],
    ['reviewer', true],
    ['rigger', true],
    ['operator', false],
    ['viewer', false],
  ])('lets a %s read, and write: %s', (role, mayWrite) => {
    for (const action of reading) expect(can(viewerWith(role), action, here)).toBe(true);
    for (const action of writing) expect(can(viewerWith(role), action, here)).toBe(mayWrite);
  });

  it('fails closed: nobody, no role, another show, an unknown action, an inherited name', () => {
    for (const action of [...reading, ...writing]) {
      expect(can(null, action, here)).toBe(false);
      expect(can(viewerWith(), action, here)).toBe(false);
      expect(can(viewerWith('admin'), action, { showId: 'elsewhere' })).toBe(false);
    }
    for (const unknown of ['recipe.destroy', 'constructor', 'toString', '']) {
      expect(can(viewerWith('admin'), unknown as Action, here)).toBe(false);
    }
  });

  it('adds roles up', () => {
    expect(can(viewerWith('viewer', 'rigger'), 'version.save', here)).toBe(true);
    expect(strongestRole(viewerWith('viewer', 'rigger'), 'here')).toBe('rigger');
    expect(strongestRole(viewerWith('rigger'), 'elsewhere')).toBeUndefined();
  });
});
