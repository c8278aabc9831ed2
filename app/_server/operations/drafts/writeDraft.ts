import type { Draft, PutDraftRequest } from '@/app/api/v1/_contracts/draft';
import { recipeDraftsRepository } from '@/db/repositories/recipeDrafts';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { Refusal } from '../../refusal';
import { toDraft } from './toDraft';

/** What the writer believes is stored: nothing yet, or a draft of exactly that revision. */
export type ExpectedDraft =
  | { readonly kind: 'none' }
  | { readonly kind: 'revision'; readonly revision: number };

/**
 * Stores the viewer's unsaved work. Refused, with the stored draft, when that is not the one the writer expected:
 * another window of the same person was quicker.
 */
export async function writeDraft(
  caller: Caller,
  input: PutDraftRequest & { readonly recipeId: string; readonly expected: ExpectedDraft },
): Promise<Draft> {
  const { viewer, recipe } = await findRecipe(caller, input.recipeId, 'draft.write');
  const { text, basedOn, expected } = input;
  if (!(await recipeVersionsRepository(caller.database).find(recipe.id, basedOn))) {
    throw new Refusal({
      code: 'invalid-input',
      issues: [{ path: ['body', 'basedOn'], message: `The recipe has no version ${basedOn}.` }],
    });
  }
  const drafts = recipeDraftsRepository(caller.database);
  const key = { personId: viewer.personId, recipeId: recipe.id };
  const written =
    expected.kind === 'none'
      ? await drafts.insert(key, { text, basedOn })
      : await drafts.update(key, expected.revision, { text, basedOn });
  if (written) return toDraft(written);
  const stored = await drafts.find(key);
  throw new Refusal({ code: 'draft-changed', draft: stored ? toDraft(stored) : null });
}
