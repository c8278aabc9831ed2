import type { Knex } from 'knex';

/**
 * One index behind each way to sort a show's recipes, and one for the search. Titles sort as people expect
 * (ICU's root collation: `a` beside `A`), names and ids bytewise, whatever the cluster's own locale is.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw('create extension if not exists pg_trgm');
  await knex.raw('create index recipes_by_name on recipes (show_id, name collate "C", id)');
  await knex.raw('create index recipes_by_title on recipes (show_id, title collate "und-x-icu", id)');
  await knex.raw('create index recipes_by_change on recipes (show_id, changed_at, id)');
  await knex.raw(`create index recipes_by_search on recipes using gin ((name || ' ' || title) gin_trgm_ops)`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop index recipes_by_search');
  await knex.raw('drop index recipes_by_change');
  await knex.raw('drop index recipes_by_title');
  await knex.raw('drop index recipes_by_name');
  await knex.raw('drop extension pg_trgm');
}
