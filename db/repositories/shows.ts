import type { Knex } from 'knex';
import '../tables';

export interface Show {
  readonly id: string;
  readonly slug: string;
  readonly title: string;
}

/** Shows. Reading always names the shows the asking person belongs to: outside of them nothing is found. */
export function showsRepository(database: Knex) {
  return {
    /** The shows of a scope in order of title. */
    async list(scope: readonly string[]): Promise<readonly Show[]> {
      return database('shows')
        .whereIn('id', scope)
        .orderByRaw('title collate "und-x-icu", id')
        .select('id', 'slug', 'title');
    },

    /** The show with that slug, if it lies in the scope. */
    async findBySlug(slug: string, scope: readonly string[]): Promise<Show | undefined> {
      return database('shows').where({ slug }).whereIn('id', scope).first('id', 'slug', 'title');
    },

    /** Id of the show with that slug, whoever asks: for setting a database up, not for people. */
    async findIdBySlug(slug: string): Promise<string | undefined> {
      const row = await database('shows').where({ slug }).first('id');
      return row?.id;
    },

    /** Adds a show and returns its id; the database refuses a slug that is taken. */
    async insert(show: Omit<Show, 'id'>): Promise<string> {
      const [row] = await database('shows').insert({ slug: show.slug, title: show.title }).returning('id');
      if (!row) throw new Error('the database returned no row for a new show');
      return row.id;
    },
  };
}
