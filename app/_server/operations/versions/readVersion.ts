import type { Version } from '@/app/api/v1/_contracts/version';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { Refusal } from '../../refusal';
import { toVersion } from './toVersion';

/** One version of a recipe with its text. */
export async function readVersion(
  caller: Caller,
  { recipeId, number }: { readonly recipeId: string; readonly number: number },
): Promise<Version> {
  const { recipe } = await findRecipe(caller, recipeId, 'version.read');
  const version = await recipeVersionsRepository(caller.database).find(recipe.id, number);
  if (!version) throw new Refusal({ code: 'not-found' });
  return toVersion(version);
}
