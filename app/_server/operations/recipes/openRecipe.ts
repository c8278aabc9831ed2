import type { Draft } from '@/app/api/v1/_contracts/draft';
import type { Recipe } from '@/app/api/v1/_contracts/recipe';
import type { Version } from '@/app/api/v1/_contracts/version';
import type { SourceText } from '@/compiler/index';
import type { Caller } from '../../caller';
import { gatherCompileInputs } from '../../compileVersion';
import { findRecipe } from '../../findRecipe';
import { can } from '../../policy';
import { Refusal } from '../../refusal';
import { findDraft } from '../drafts/findDraft';
import { readVersion } from '../versions/readVersion';
import { readRecipe } from './readRecipe';

/** Everything the editor shows when it opens. */
export interface OpenedRecipe {
  readonly recipe: Recipe;
  /** The version the work goes on from: that of the draft, else the newest. */
  readonly version: Version;
  readonly draft: Draft | null;
  /** Versions that the text extends, by `name@number`. */
  readonly bases: Readonly<Record<string, SourceText>>;
  /** False for people who may only look, and for a version that is not the newest. */
  readonly isEditable: boolean;
}

/** Opens a recipe at the viewer's draft, or at its newest version; or, to look at only, at a given older version. */
export async function openRecipe(
  caller: Caller,
  input: { readonly recipeId: string; readonly number?: number | undefined },
): Promise<OpenedRecipe> {
  const { viewer, recipe: subject } = await findRecipe(caller, input.recipeId, 'recipe.read');
  const recipe = await readRecipe(caller, input);
  if (!recipe.latest) throw new Refusal({ code: 'not-found' });
  const newest = recipe.latest.number;
  const isOlder = input.number !== undefined && input.number !== newest;
  const draft = isOlder ? null : await findDraft(caller, input);
  const number = isOlder ? (input.number ?? newest) : (draft?.basedOn ?? newest);
  const version = await readVersion(caller, { recipeId: input.recipeId, number });
  const { bases } = await gatherCompileInputs(caller.database, {
    showId: subject.showId,
    name: recipe.name,
    text: draft?.text ?? version.text,
  });
  const isEditable = !isOlder && can(viewer, 'version.save', subject);
  return { recipe, version, draft, bases, isEditable };
}
