import type { Draft } from '@/app/api/v1/_contracts/draft';
import { recipeDraftsRepository } from '@/db/repositories/recipeDrafts';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { Refusal } from '../../refusal';
import { toDraft } from './toDraft';

/** The viewer's own draft of a recipe; refused when there is none. */
export async function readDraft(caller: Caller, { recipeId }: { readonly recipeId: string }): Promise<Draft> {
  const { viewer, recipe } = await findRecipe(caller, recipeId, 'draft.read');
  const key = { personId: viewer.personId, recipeId: recipe.id };
  const draft = await recipeDraftsRepository(caller.database).find(key);
  if (!draft) throw new Refusal({ code: 'draft-not-found' });
  return toDraft(draft);
}
