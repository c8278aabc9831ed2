import type { Knex } from 'knex';
import type { RoleName } from '../tables';
import type { Person } from './people';

export interface Membership {
  readonly showId: string;
  readonly role: RoleName;
}

/** Who may do what in which show. */
export function membershipsRepository(database: Knex) {
  return {
    /** A person with all memberships, read in one go; undefined when the account is gone. */
    async findMember(
      personId: string,
    ): Promise<{ person: Person; memberships: readonly Membership[] } | undefined> {
      const rows = await database('people')
        .leftJoin('memberships', 'memberships.person_id', 'people.id')
        .where('people.id', personId)
        .select('people.id', 'people.email', 'people.name', 'memberships.show_id', 'memberships.role');
      const [first] = rows;
      if (!first) return undefined;
      const memberships: Membership[] = [];
      for (const { show_id: showId, role } of rows) {
        if (showId !== null) memberships.push({ showId, role });
      }
      return { person: { id: first.id, email: first.email, name: first.name }, memberships };
    },

    /** Gives a person a role in a show; giving it twice changes nothing. */
    async insert(personId: string, showId: string, role: RoleName): Promise<void> {
      await database('memberships')
        .insert({ person_id: personId, show_id: showId, role })
        .onConflict(['person_id', 'show_id', 'role'])
        .ignore();
    },
  };
}
