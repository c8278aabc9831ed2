import type { Knex } from 'knex';
import type { VersionStateName } from '../tables';
import type { Person } from './people';

/** An immutable state of a recipe, without its text. */
export interface RecipeVersionSummary {
  readonly number: number;
  readonly parent: number | null;
  readonly message: string;
  readonly author: Pick<Person, 'id' | 'name'>;
  readonly createdAt: Date;
  readonly contentHash: string;
  readonly compilerVersion: string;
  readonly errors: number;
  readonly warnings: number;
  readonly state: VersionStateName;
}

export interface RecipeVersion extends RecipeVersionSummary {
  readonly text: string;
}

const SUMMARY_COLUMNS = [
  'version.number',
  'version.parent',
  'version.message',
  'version.created_at',
  'version.content_hash',
  'version.compiler_version',
  'version.errors',
  'version.warnings',
  'version.state',
  'author.id as author_id',
  'author.name as author_name',
] as const;

interface SummaryRow {
  readonly number: number;
  readonly parent: number | null;
  readonly message: string;
  readonly created_at: Date;
  readonly content_hash: string;
  readonly compiler_version: string;
  readonly errors: number;
  readonly warnings: number;
  readonly state: VersionStateName;
  readonly author_id: string;
  readonly author_name: string;
}

function rowToSummary(row: SummaryRow): RecipeVersionSummary {
  return {
    number: row.number,
    parent: row.parent,
    message: row.message,
    author: { id: row.author_id, name: row.author_name },
    createdAt: row.created_at,
    contentHash: row.content_hash,
    compilerVersion: row.compiler_version,
    errors: row.errors,
    warnings: row.warnings,
    state: row.state,
  };
}

/** Versions of recipes: added and read, never altered. Callers have found the recipe within the scope before. */
export function recipeVersionsRepository(database: Knex) {
  const select = () =>
    database('recipe_versions as version').join('people as author', 'author.id', 'version.author_id');

  return {
    /** At most `limit` versions, the newest first, beginning below a number. */
    async list(request: {
      readonly recipeId: string;
      readonly below?: number;
      readonly limit: number;
    }): Promise<readonly RecipeVersionSummary[]> {
      const query = select().where('version.recipe_id', request.recipeId);
      if (request.below !== undefined) query.where('version.number', '<', request.below);
      const rows: SummaryRow[] = await query
        .orderBy('version.number', 'desc')
        .limit(request.limit)
        .select(...SUMMARY_COLUMNS);
      return rows.map(rowToSummary);
    },

    /** One version with its text. */
    async find(recipeId: string, number: number): Promise<RecipeVersion | undefined> {
      const rows: (SummaryRow & { readonly text: string })[] = await select()
        .where({ 'version.recipe_id': recipeId, 'version.number': number })
        .select(...SUMMARY_COLUMNS, 'version.text');
      const [row] = rows;
      return row && { ...rowToSummary(row), text: row.text };
    },

    /** Text of a version named as recipes name each other: by recipe name and number, within one show. */
    async findTextByName(showId: string, name: string, number: number): Promise<string | undefined> {
      const row = await database('recipe_versions')
        .join('recipes', 'recipes.id', 'recipe_versions.recipe_id')
        .where('recipes.show_id', showId)
        .where('recipes.name', name)
        .where('recipe_versions.number', number)
        .first('recipe_versions.text');
      return row?.text;
    },

    /** Adds a version. The database refuses a number that is taken or does not follow on its parent. */
    async insert(version: {
      readonly recipeId: string;
      readonly number: number;
      readonly parent: number | null;
      readonly message: string;
      readonly authorId: string;
      readonly text: string;
      readonly contentHash: string;
      readonly compilerVersion: string;
      readonly errors: number;
      readonly warnings: number;
    }): Promise<void> {
      await database('recipe_versions').insert({
        recipe_id: version.recipeId,
        number: version.number,
        parent: version.parent,
        message: version.message,
        author_id: version.authorId,
        text: version.text,
        content_hash: version.contentHash,
        compiler_version: version.compilerVersion,
        errors: version.errors,
        warnings: version.warnings,
      });
    },
  };
}
