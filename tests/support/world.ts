import type { Knex } from 'knex';
import type { Caller } from '@/app/_server/caller';
import { createRecipe } from '@/app/_server/operations/recipes/createRecipe';
import { hashPassword } from '@/app/_server/password';
import { loadViewer } from '@/app/_server/viewer';
import type { Role } from '@/app/api/v1/_contracts/show';
import { membershipsRepository } from '@/db/repositories/memberships';
import { peopleRepository } from '@/db/repositories/people';
import { showsRepository } from '@/db/repositories/shows';
import { cheapPasswords } from './cheapPasswords';
import { SOUND_TEXT } from './recipeTexts';

export const ROLES: readonly Role[] = ['admin', 'reviewer', 'rigger', 'operator', 'viewer'];
export const PASSWORD = 'a password for tests';

/** Two shows, a person for each role of the first, and an admin of the second who is a stranger to the first. */
export interface World {
  readonly database: Knex;
  readonly showId: string;
  readonly slug: string;
  readonly people: Readonly<Record<Role | 'stranger', string>>;
  /** A recipe of the first show with one version. */
  readonly recipeId: string;
  callerFor(personId: string): Promise<Caller>;
}

export async function insertPerson(database: Knex, name: string): Promise<string> {
  return peopleRepository(database).insert({
    email: `${name}@example.test`,
    name,
    passwordHash: await hashPassword(PASSWORD, cheapPasswords),
  });
}

/** Fills an empty, migrated database. */
export async function createWorld(database: Knex): Promise<World> {
  const slug = 'first';
  const showId = await showsRepository(database).insert({ slug, title: 'First show' });
  const otherId = await showsRepository(database).insert({ slug: 'second', title: 'Second show' });
  const people = {
    admin: await insertPerson(database, 'admin'),
    reviewer: await insertPerson(database, 'reviewer'),
    rigger: await insertPerson(database, 'rigger'),
    operator: await insertPerson(database, 'operator'),
    viewer: await insertPerson(database, 'viewer'),
    stranger: await insertPerson(database, 'stranger'),
  };
  for (const role of ROLES) await membershipsRepository(database).insert(people[role], showId, role);
  await membershipsRepository(database).insert(people.stranger, otherId, 'admin');
  const callerFor = async (personId: string): Promise<Caller> => ({
    database,
    viewer: await loadViewer(database, personId),
    address: '192.0.2.7',
  });
  const { id: recipeId } = await createRecipe(await callerFor(people.admin), {
    slug,
    name: 'cart',
    title: 'Mail cart',
    text: SOUND_TEXT,
    message: 'First',
  });
  return { database, showId, slug, people, recipeId, callerFor };
}
