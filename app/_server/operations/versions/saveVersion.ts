import type { Knex } from 'knex';
import { z } from 'zod';
import type { CreateVersionRequest, NewestVersion, VersionListItem } from '@/app/api/v1/_contracts/version';
import { auditLogRepository } from '@/db/repositories/auditLog';
import { recipeDraftsRepository } from '@/db/repositories/recipeDrafts';
import { recipesRepository } from '@/db/repositories/recipes';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import type { Caller } from '../../caller';
import { compileVersion } from '../../compileVersion';
import { findRecipe } from '../../findRecipe';
import { idempotent } from '../../idempotent';
import { Refusal } from '../../refusal';
import { insertVersion } from './insertVersion';
import { toVersionListItem } from './toVersion';

const storedAnswer = z.object({ number: z.number().int() });

function isStoredAnswer(value: unknown): value is z.infer<typeof storedAnswer> {
  return storedAnswer.safeParse(value).success;
}

async function readNewest(
  transaction: Knex.Transaction,
  recipeId: string,
  number: number,
): Promise<NewestVersion> {
  const newest = await recipeVersionsRepository(transaction).find(recipeId, number);
  if (!newest) throw new Error('the newest version of a recipe is missing');
  return { number, text: newest.text, author: newest.author, createdAt: newest.createdAt.toISOString() };
}

/**
 * Saves a text as the next version and drops the person's draft, both or neither. Refused when the version it
 * was made from is not the newest any more; the refusal carries what somebody saved meanwhile.
 */
export async function saveVersion(
  caller: Caller,
  input: CreateVersionRequest & { readonly recipeId: string; readonly idempotencyKey?: string | undefined },
): Promise<VersionListItem> {
  const { viewer, recipe } = await findRecipe(caller, input.recipeId, 'version.save');
  const { parent, message, text, idempotencyKey } = input;
  const { personId } = viewer;
  // Before the transaction: nobody should wait for a lock while a rig compiles.
  const compilation = await compileVersion(caller.database, { ...recipe, text });

  const { number } = await caller.database.transaction((transaction) =>
    idempotent(
      transaction,
      { personId, key: idempotencyKey, asked: ['version.save', recipe.id, parent, message, text] },
      isStoredAnswer,
      async () => {
        const newest = await recipesRepository(transaction).lockNewest(recipe.id);
        if (newest !== null && newest !== parent) {
          throw new Refusal({
            code: 'stale-parent',
            newest: await readNewest(transaction, recipe.id, newest),
          });
        }
        const saved = await insertVersion(transaction, {
          recipeId: recipe.id,
          parent: newest,
          message,
          text,
          compilation,
          authorId: personId,
        });
        await recipeDraftsRepository(transaction).remove({ personId, recipeId: recipe.id });
        await auditLogRepository(transaction).append({
          personId,
          action: 'version.save',
          subjectType: 'recipe',
          subjectId: recipe.id,
          showId: recipe.showId,
          address: caller.address,
          details: { number: saved },
        });
        return { number: saved };
      },
    ),
  );
  const version = await recipeVersionsRepository(caller.database).find(recipe.id, number);
  if (!version) throw new Error('a version that was just saved is missing');
  return toVersionListItem(version);
}
