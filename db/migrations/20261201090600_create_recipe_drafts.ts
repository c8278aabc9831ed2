import type { Knex } from 'knex';

/**
 * Unsaved work, one draft per person and recipe. Revisions come from one sequence for all drafts: a draft that
 * was dropped and begun anew never shows a revision that an old browser tab still holds.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw('create sequence recipe_draft_revisions as bigint');
  await knex.raw(`
    create table recipe_drafts (
      person_id uuid not null references people,
      recipe_id uuid not null references recipes,
      based_on integer not null,
      text text not null,
      revision bigint not null default nextval('recipe_draft_revisions'),
      updated_at timestamptz(3) not null default now(),
      primary key (person_id, recipe_id),
      foreign key (recipe_id, based_on) references recipe_versions (recipe_id, number)
    )`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table recipe_drafts');
  await knex.raw('drop sequence recipe_draft_revisions');
}
