import { z } from 'zod';
import type { CreateRecipeRequest, Recipe } from '@/app/api/v1/_contracts/recipe';
import { auditLogRepository } from '@/db/repositories/auditLog';
import { recipesRepository } from '@/db/repositories/recipes';
import type { Caller } from '../../caller';
import { compileVersion } from '../../compileVersion';
import { findShow } from '../../findShow';
import { idempotent } from '../../idempotent';
import { Refusal } from '../../refusal';
import { insertVersion } from '../versions/insertVersion';
import { readRecipe } from './readRecipe';

const storedAnswer = z.object({ recipeId: z.uuid() });

function isStoredAnswer(value: unknown): value is z.infer<typeof storedAnswer> {
  return storedAnswer.safeParse(value).success;
}

/**
 * Adds a recipe with its first version, both or neither. Refuses a name the show has already. The text may have
 * errors: a start is worth keeping too.
 */
export async function createRecipe(
  caller: Caller,
  input: CreateRecipeRequest & { readonly slug: string; readonly idempotencyKey?: string | undefined },
): Promise<Recipe> {
  const { viewer, show } = await findShow(caller, input.slug, 'recipe.create');
  const { idempotencyKey, name, title, text, message } = input;
  const compilation = await compileVersion(caller.database, { showId: show.id, name, text });

  const { recipeId } = await caller.database.transaction((transaction) =>
    idempotent(
      transaction,
      {
        personId: viewer.personId,
        key: idempotencyKey,
        asked: ['recipe.create', show.id, name, title, text, message],
      },
      isStoredAnswer,
      async () => {
        const id = await recipesRepository(transaction).insert({
          showId: show.id,
          name,
          title,
          createdBy: viewer.personId,
        });
        if (id === undefined) throw new Refusal({ code: 'name-taken', name });
        await insertVersion(transaction, {
          recipeId: id,
          parent: null,
          message,
          text,
          compilation,
          authorId: viewer.personId,
        });
        await auditLogRepository(transaction).append({
          personId: viewer.personId,
          action: 'recipe.create',
          subjectType: 'recipe',
          subjectId: id,
          showId: show.id,
          address: caller.address,
          details: { name },
        });
        return { recipeId: id };
      },
    ),
  );
  return readRecipe(caller, { recipeId });
}
