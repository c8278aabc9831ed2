import type { Recipe } from '@/app/api/v1/_contracts/recipe';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { strongestRole } from '../../policy';
import { Refusal } from '../../refusal';
import { toLatest } from './toLatest';

/** One recipe with its show and newest version. */
export async function readRecipe(
  caller: Caller,
  { recipeId }: { readonly recipeId: string },
): Promise<Recipe> {
  const { viewer, recipe } = await findRecipe(caller, recipeId, 'recipe.read');
  const role = strongestRole(viewer, recipe.showId);
  if (!role) throw new Refusal({ code: 'not-found' });
  return {
    id: recipe.id,
    show: recipe.show,
    name: recipe.name,
    title: recipe.title,
    role,
    latest: toLatest(recipe),
  };
}
