import { handle } from '@/app/_server/http/handle';
import { jsonWithEtag } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { readRecipe } from '@/app/_server/operations/recipes/readRecipe';
import { readRecipeEndpoint } from '../../_endpoints/recipes';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readRecipeEndpoint, async ({ request, caller, params }) =>
    jsonWithEtag(request, await readRecipe(caller, params)),
  ),
});
