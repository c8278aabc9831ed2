import { z } from 'zod';
import type { RecipeList, RecipeListQuery } from '@/app/api/v1/_contracts/recipe';
import { type RecipeListRequest, type RecipeSummary, recipesRepository } from '@/db/repositories/recipes';
import type { Caller } from '../../caller';
import { cutPage, decodeCursor, encodeCursor } from '../../cursor';
import { findShow } from '../../findShow';
import { toLatest } from './toLatest';

function cursorPlace({ sort, direction }: RecipeListQuery) {
  const value = sort === 'changed' ? z.iso.datetime({ precision: 3 }) : z.string().max(200);
  return z.strictObject({
    sort: z.literal(sort),
    direction: z.literal(direction),
    value,
    id: z.uuid(),
  });
}

function sortValue(recipe: RecipeSummary, sort: RecipeListQuery['sort']): string {
  return sort === 'changed' ? recipe.changedAt.toISOString() : recipe[sort];
}

/** One page of a show's recipes, searched and sorted. */
export async function listRecipes(
  caller: Caller,
  input: RecipeListQuery & { readonly slug: string },
): Promise<RecipeList> {
  const { show } = await findShow(caller, input.slug, 'recipe.read');
  const { search, sort, direction, limit } = input;
  const request: RecipeListRequest = {
    showId: show.id,
    search,
    sort,
    direction,
    limit: limit + 1,
    ...(input.cursor === undefined ? {} : { after: decodeCursor(input.cursor, cursorPlace(input)) }),
  };
  const recipes = recipesRepository(caller.database);
  const [rows, total] = await Promise.all([recipes.list(request), recipes.count(request)]);
  const { items, last } = cutPage(rows, limit);
  return {
    items: items.map((recipe) => ({
      id: recipe.id,
      name: recipe.name,
      title: recipe.title,
      latest: toLatest(recipe),
    })),
    nextCursor: last ? encodeCursor({ sort, direction, value: sortValue(last, sort), id: last.id }) : null,
    total,
  };
}
