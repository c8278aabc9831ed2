import type { Knex } from 'knex';
import { demoAccounts, demoShows } from '@/db/demo/accounts';
import { membershipsRepository } from '@/db/repositories/memberships';
import { peopleRepository } from '@/db/repositories/people';
import { showsRepository } from '@/db/repositories/shows';
import type { Caller } from '../caller';
import { createRecipe } from '../operations/recipes/createRecipe';
import { saveVersion } from '../operations/versions/saveVersion';
import { hashPassword, PASSWORD_COST, type PasswordCost } from '../password';
import { Refusal } from '../refusal';
import { loadViewer } from '../viewer';
import { type DemoRecipe, demoRecipes } from './demoRecipes';

async function seedShows(database: Knex): Promise<ReadonlyMap<string, string>> {
  const shows = showsRepository(database);
  const ids = new Map<string, string>();
  for (const show of demoShows) {
    ids.set(show.slug, (await shows.findIdBySlug(show.slug)) ?? (await shows.insert(show)));
  }
  return ids;
}

/** Makes the accounts that are missing; returns the id of each by its e-mail address. */
async function seedAccounts(
  database: Knex,
  showIds: ReadonlyMap<string, string>,
  cost: PasswordCost,
): Promise<ReadonlyMap<string, string>> {
  const people = peopleRepository(database);
  const ids = new Map<string, string>();
  for (const { email, name, password, role, show } of demoAccounts) {
    const known = await people.findByEmail(email);
    const id =
      known?.id ?? (await people.insert({ email, name, passwordHash: await hashPassword(password, cost) }));
    ids.set(email, id);
    const showId = showIds.get(show);
    if (showId) await membershipsRepository(database).insert(id, showId, role);
  }
  return ids;
}

/** Adds the recipe with all its versions, unless the show has one of that name: then it is left as it is. */
async function seedRecipe(
  caller: Caller,
  slug: string,
  { name, title, versions }: DemoRecipe,
): Promise<void> {
  const [first, ...later] = versions;
  if (!first) return;
  try {
    const { id: recipeId } = await createRecipe(caller, { slug, name, title, ...first });
    for (const [index, version] of later.entries()) {
      await saveVersion(caller, { recipeId, parent: index + 1, ...version });
    }
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.reason.code === 'name-taken') return;
    throw thrown;
  }
}

/**
 * Fills a database with the demo: two shows, an account for each role, recipes with versions. What is there
 * already is left alone, so it may run at every start. Not for a real deployment: the passwords are known.
 */
export async function seedDemo(database: Knex, cost: PasswordCost = PASSWORD_COST): Promise<void> {
  const personIds = await seedAccounts(database, await seedShows(database), cost);
  const callerFor = async (email: string): Promise<Caller> => {
    const viewer = await loadViewer(database, personIds.get(email) ?? '');
    return { database, viewer, address: null };
  };
  const rigger = await callerFor('rigger@tidewrack.example');
  for (const recipe of demoRecipes()) await seedRecipe(rigger, 'saltmarsh_post', recipe);
  const [neighboursOwn] = demoRecipes().filter(({ name }) => name === 'eel');
  if (neighboursOwn) {
    await seedRecipe(await callerFor('neighbour@tidewrack.example'), 'night_ferry', neighboursOwn);
  }
}
