import { z } from 'zod';
import type { PageQuery } from '@/app/api/v1/_contracts/paging';
import type { VersionList } from '@/app/api/v1/_contracts/version';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import type { Caller } from '../../caller';
import { cutPage, decodeCursor, encodeCursor } from '../../cursor';
import { findRecipe } from '../../findRecipe';
import { toVersionListItem } from './toVersion';

const cursorPlace = z.strictObject({ below: z.number().int().min(1).max(2_147_483_647) });

/** One page of a recipe's versions, the newest first. */
export async function listVersions(
  caller: Caller,
  input: PageQuery & { readonly recipeId: string },
): Promise<VersionList> {
  const { recipe } = await findRecipe(caller, input.recipeId, 'version.read');
  const rows = await recipeVersionsRepository(caller.database).list({
    recipeId: recipe.id,
    limit: input.limit + 1,
    ...(input.cursor === undefined ? {} : decodeCursor(input.cursor, cursorPlace)),
  });
  const { items, last } = cutPage(rows, input.limit);
  return {
    items: items.map(toVersionListItem),
    nextCursor: last ? encodeCursor({ below: last.number }) : null,
  };
}
