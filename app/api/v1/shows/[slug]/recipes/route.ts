import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { idempotencyKeyOf } from '@/app/_server/http/preconditions';
import { route } from '@/app/_server/http/route';
import { createRecipe } from '@/app/_server/operations/recipes/createRecipe';
import { listRecipes } from '@/app/_server/operations/recipes/listRecipes';
import { createRecipeEndpoint, listRecipesEndpoint } from '../../../_endpoints/recipes';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(listRecipesEndpoint, async ({ caller, params, query }) =>
    json(await listRecipes(caller, { ...params, ...query })),
  ),
  POST: handle(createRecipeEndpoint, async ({ request, caller, params, body }) => {
    const idempotencyKey = idempotencyKeyOf(request.headers);
    const recipe = await createRecipe(caller, { ...params, ...body, idempotencyKey });
    return json(recipe, { status: 201, headers: { location: `/api/v1/recipes/${recipe.id}` } });
  }),
});
