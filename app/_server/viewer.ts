import type { Knex } from 'knex';
import { membershipsRepository } from '@/db/repositories/memberships';
import type { RoleName } from '@/db/tables';

/** Who is asking, with all roles in all shows, as the database has them at this moment. */
export interface Viewer {
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly rolesByShow: ReadonlyMap<string, readonly RoleName[]>;
}

/** The person behind a session with their present roles, or null when the account is gone. */
export async function loadViewer(database: Knex, personId: string): Promise<Viewer | null> {
  const member = await membershipsRepository(database).findMember(personId);
  if (!member) return null;
  const rolesByShow = new Map<string, RoleName[]>();
  for (const { showId, role } of member.memberships) {
    const roles = rolesByShow.get(showId);
    if (roles) roles.push(role);
    else rolesByShow.set(showId, [role]);
  }
  const { name, email } = member.person;
  return { personId, name, email, rolesByShow };
}

/** Ids of the shows the viewer belongs to; nothing outside of them is ever loaded for them. */
export function scopeOf(viewer: Viewer): readonly string[] {
  return [...viewer.rolesByShow.keys()];
}
