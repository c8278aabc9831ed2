import type { Draft } from '@/app/api/v1/_contracts/draft';
import { recipeDraftsRepository } from '@/db/repositories/recipeDrafts';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { can } from '../../policy';
import { toDraft } from './toDraft';

/**
 * The viewer's own draft of a recipe, or null when there is none: also for people who may read the recipe but
 * not work on it.
 */
export async function findDraft(
  caller: Caller,
  { recipeId }: { readonly recipeId: string },
): Promise<Draft | null> {
  const { viewer, recipe } = await findRecipe(caller, recipeId, 'recipe.read');
  if (!can(viewer, 'draft.read', recipe)) return null;
  const draft = await recipeDraftsRepository(caller.database).find({
    personId: viewer.personId,
    recipeId: recipe.id,
  });
  return draft ? toDraft(draft) : null;
}
