import type { Knex } from 'knex';
import type { RecipeDraftRow } from '../tables';

/** One person's unsaved work on a recipe. */
export interface RecipeDraft {
  readonly text: string;
  readonly basedOn: number;
  readonly updatedAt: Date;
  readonly revision: number;
}

/** Whose draft of what. */
export interface DraftKey {
  readonly personId: string;
  readonly recipeId: string;
}

function rowToDraft(row: RecipeDraftRow): RecipeDraft {
  return {
    text: row.text,
    basedOn: row.based_on,
    updatedAt: row.updated_at,
    revision: Number(row.revision),
  };
}

/** Drafts. Every write states what it expects to find, and answers undefined when it found something else. */
export function recipeDraftsRepository(database: Knex) {
  const keyOf = ({ personId, recipeId }: DraftKey) => ({ person_id: personId, recipe_id: recipeId });

  return {
    async find(key: DraftKey): Promise<RecipeDraft | undefined> {
      const row = await database('recipe_drafts').where(keyOf(key)).first();
      return row && rowToDraft(row);
    },

    /** Begins a draft, unless there is one. */
    async insert(
      key: DraftKey,
      draft: Pick<RecipeDraft, 'text' | 'basedOn'>,
    ): Promise<RecipeDraft | undefined> {
      const [row] = await database('recipe_drafts')
        .insert({ ...keyOf(key), text: draft.text, based_on: draft.basedOn })
        .onConflict(['person_id', 'recipe_id'])
        .ignore()
        .returning('*');
      return row && rowToDraft(row);
    },

    /** Replaces the draft of exactly that revision. */
    async update(
      key: DraftKey,
      revision: number,
      draft: Pick<RecipeDraft, 'text' | 'basedOn'>,
    ): Promise<RecipeDraft | undefined> {
      const [row] = await database('recipe_drafts')
        .where({ ...keyOf(key), revision: String(revision) })
        .update({
          text: draft.text,
          based_on: draft.basedOn,
          revision: database.raw("nextval('recipe_draft_revisions')"),
          updated_at: database.raw('now()'),
        })
        .returning('*');
      return row && rowToDraft(row);
    },

    /** Drops the draft, of exactly that revision when one is given; says whether there was one to drop. */
    async remove(key: DraftKey, revision?: number): Promise<boolean> {
      const query = database('recipe_drafts').where(keyOf(key));
      if (revision !== undefined) query.where({ revision: String(revision) });
      return (await query.delete()) > 0;
    },
  };
}
