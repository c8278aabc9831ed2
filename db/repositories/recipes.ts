import type { Knex } from 'knex';
import type { Person } from './people';

/** The newest version of a recipe in short. */
export interface LatestVersion {
  readonly number: number;
  readonly author: Pick<Person, 'id' | 'name'>;
  readonly createdAt: Date;
  readonly message: string;
  readonly errors: number;
  readonly warnings: number;
}

export interface RecipeSummary {
  readonly id: string;
  readonly showId: string;
  readonly show: { readonly slug: string; readonly title: string };
  readonly name: string;
  readonly title: string;
  readonly changedAt: Date;
  readonly latest: LatestVersion | null;
}

/** Columns of a recipe with its show and newest version, in the one shape every reader gets. */
function selectSummaries(database: Knex) {
  return database('recipes')
    .join('shows', 'shows.id', 'recipes.show_id')
    .leftJoin('recipe_versions as latest', (join) => {
      join.on('latest.recipe_id', 'recipes.id').andOn('latest.number', 'recipes.latest_number');
    })
    .leftJoin('people as author', 'author.id', 'latest.author_id')
    .select(
      'recipes.id',
      'recipes.show_id',
      'recipes.name',
      'recipes.title',
      'recipes.changed_at',
      'shows.slug as show_slug',
      'shows.title as show_title',
      'latest.number as latest_number',
      'latest.created_at as latest_created_at',
      'latest.message as latest_message',
      'latest.errors as latest_errors',
      'latest.warnings as latest_warnings',
      'author.id as author_id',
      'author.name as author_name',
    );
}

interface SummaryRow {
  readonly id: string;
  readonly show_id: string;
  readonly name: string;
  readonly title: string;
  readonly changed_at: Date;
  readonly show_slug: string;
  readonly show_title: string;
  readonly latest_number: number | null;
  readonly latest_created_at: Date;
  readonly latest_message: string;
  readonly latest_errors: number;
  readonly latest_warnings: number;
  readonly author_id: string;
  readonly author_name: string;
}

function rowToSummary(row: SummaryRow): RecipeSummary {
  const latest: LatestVersion | null =
    row.latest_number === null
      ? null
      : {
          number: row.latest_number,
          author: { id: row.author_id, name: row.author_name },
          createdAt: row.latest_created_at,
          message: row.latest_message,
          errors: row.latest_errors,
          warnings: row.latest_warnings,
        };
  return {
    id: row.id,
    showId: row.show_id,
    show: { slug: row.show_slug, title: row.show_title },
    name: row.name,
    title: row.title,
    changedAt: row.changed_at,
    latest,
  };
}

export type RecipeSort = 'name' | 'title' | 'changed';

/** What each order compares by; the same expressions as the indexes of `index_recipe_lists`. */
const SORT_EXPRESSIONS: Readonly<Record<RecipeSort, string>> = {
  name: 'recipes.name collate "C"',
  title: 'recipes.title collate "und-x-icu"',
  changed: 'recipes.changed_at',
};

export interface RecipeListRequest {
  readonly showId: string;
  /** Found anywhere in name or title, without regard to case; empty finds all. */
  readonly search: string;
  readonly sort: RecipeSort;
  readonly direction: 'asc' | 'desc';
  /** The last row of the page before. */
  readonly after?: { readonly value: string; readonly id: string };
  readonly limit: number;
}

/** Recipes. Readers by id name the shows the asking person belongs to: outside of them nothing is found. */
export function recipesRepository(database: Knex) {
  const matching = (query: Knex.QueryBuilder, { showId, search }: RecipeListRequest): void => {
    query.where('recipes.show_id', showId);
    if (search === '') return;
    const pattern = `%${search.replaceAll(/[\\%_]/g, '\\$&')}%`;
    query.whereRaw("(recipes.name || ' ' || recipes.title) ilike ?", [pattern]);
  };

  return {
    /** At most `limit` recipes in the wanted order, beginning after a given row. */
    async list(request: RecipeListRequest): Promise<readonly RecipeSummary[]> {
      const { sort, direction, after, limit } = request;
      const by = SORT_EXPRESSIONS[sort];
      const query = selectSummaries(database).limit(limit);
      matching(query, request);
      if (after) {
        const value = sort === 'changed' ? '?::timestamptz(3)' : '?::text';
        query.whereRaw(`(${by}, recipes.id) ${direction === 'asc' ? '>' : '<'} (${value}, ?::uuid)`, [
          after.value,
          after.id,
        ]);
      }
      const rows: SummaryRow[] = await query.orderByRaw(`${by} ${direction}, recipes.id ${direction}`);
      return rows.map(rowToSummary);
    },

    /** How many recipes the search finds on all pages together. */
    async count(request: RecipeListRequest): Promise<number> {
      const query = database('recipes').count({ total: '*' });
      matching(query, request);
      const [row] = await query;
      return Number(row?.total ?? 0);
    },

    /** The recipe, if its show lies in the scope. */
    async find(id: string, scope: readonly string[]): Promise<RecipeSummary | undefined> {
      const row: SummaryRow | undefined = await selectSummaries(database)
        .where('recipes.id', id)
        .whereIn('recipes.show_id', scope)
        .first();
      return row && rowToSummary(row);
    },

    /** Adds a recipe without versions and returns its id, or undefined when the show has one of that name. */
    async insert(recipe: {
      readonly showId: string;
      readonly name: string;
      readonly title: string;
      readonly createdBy: string;
    }): Promise<string | undefined> {
      const [row] = await database('recipes')
        .insert({
          show_id: recipe.showId,
          name: recipe.name,
          title: recipe.title,
          created_by: recipe.createdBy,
        })
        .onConflict(['show_id', 'name'])
        .ignore()
        .returning('id');
      return row?.id;
    },

    /**
     * Locks the recipe until the transaction ends and returns the number of its newest version. Whoever saves
     * goes through here, so two saves of one recipe follow each other.
     */
    async lockNewest(id: string): Promise<number | null> {
      const row = await database('recipes').where({ id }).forUpdate().first('latest_number');
      if (!row) throw new Error('a recipe vanished between finding and locking it');
      return row.latest_number;
    },

    /** Makes a version the newest; the recipe counts as changed at this moment. */
    async setNewest(id: string, number: number): Promise<void> {
      await database('recipes')
        .where({ id })
        .update({ latest_number: number, changed_at: database.raw('now()') });
    },
  };
}
