import type { RoleName } from '@/db/tables';
import type { Viewer } from './viewer';

/** Everything a person can ask to do. */
export type Action =
  | 'show.read'
  | 'recipe.read'
  | 'recipe.create'
  | 'draft.read'
  | 'draft.write'
  | 'version.read'
  | 'version.save'
  | 'build.read';

/** What an action is done to; everything lies in a show. */
export interface Subject {
  readonly showId: string;
}

const EVERY_ROLE: readonly RoleName[] = ['admin', 'reviewer', 'rigger', 'operator', 'viewer'];
const AUTHORS: readonly RoleName[] = ['admin', 'reviewer', 'rigger'];

/** Who may do what. An action that is not listed is allowed to nobody. */
const ALLOWED: Readonly<Record<Action, readonly RoleName[]>> = {
  'show.read': EVERY_ROLE,
  'recipe.read': EVERY_ROLE,
  'recipe.create': AUTHORS,
  'draft.read': AUTHORS,
  'draft.write': AUTHORS,
  'version.read': EVERY_ROLE,
  'version.save': AUTHORS,
  'build.read': EVERY_ROLE,
};

/**
 * Whether the viewer may do that to the subject: true only when one of their roles in the subject's own show
 * allows it. Nobody, no role, a foreign show and an unknown action all give false.
 */
export function can(viewer: Viewer | null, action: Action, subject: Subject): boolean {
  const roles = viewer?.rolesByShow.get(subject.showId) ?? [];
  const allowed = Object.hasOwn(ALLOWED, action) ? ALLOWED[action] : [];
  return roles.some((role) => allowed.includes(role));
}

/** The strongest of the viewer's roles in a show, which is what pages show and adapt to. */
export function strongestRole(viewer: Viewer, showId: string): RoleName | undefined {
  const roles = viewer.rolesByShow.get(showId) ?? [];
  return EVERY_ROLE.find((role) => roles.includes(role));
}
