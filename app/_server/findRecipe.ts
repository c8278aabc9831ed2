import { type RecipeSummary, recipesRepository } from '@/db/repositories/recipes';
import { type Caller, demandPermission, demandViewer } from './caller';
import type { Action } from './policy';
import { Refusal } from './refusal';
import { scopeOf, type Viewer } from './viewer';

/**
 * The recipe, for a viewer who may do `action` to it. A recipe of a foreign show is refused as one that does not
 * exist, so that nobody learns what other shows hold.
 */
export async function findRecipe(
  caller: Caller,
  recipeId: string,
  action: Action,
): Promise<{ readonly viewer: Viewer; readonly recipe: RecipeSummary }> {
  const viewer = demandViewer(caller);
  const recipe = await recipesRepository(caller.database).find(recipeId, scopeOf(viewer));
  if (!recipe) throw new Refusal({ code: 'not-found' });
  demandPermission(viewer, action, recipe);
  return { viewer, recipe };
}
