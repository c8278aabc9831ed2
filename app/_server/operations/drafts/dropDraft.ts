import { recipeDraftsRepository } from '@/db/repositories/recipeDrafts';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { Refusal } from '../../refusal';
import { toDraft } from './toDraft';

/**
 * Drops the viewer's draft, if there is one; with a revision only that one, and refused with the stored draft
 * when it is another.
 */
export async function dropDraft(
  caller: Caller,
  input: { readonly recipeId: string; readonly revision?: number | undefined },
): Promise<void> {
  const { viewer, recipe } = await findRecipe(caller, input.recipeId, 'draft.write');
  const drafts = recipeDraftsRepository(caller.database);
  const key = { personId: viewer.personId, recipeId: recipe.id };
  if ((await drafts.remove(key, input.revision)) || input.revision === undefined) return;
  const stored = await drafts.find(key);
  if (stored) throw new Refusal({ code: 'draft-changed', draft: toDraft(stored) });
}
