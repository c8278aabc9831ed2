import {
  createRecipeRequestSchema,
  recipeListQuerySchema,
  recipeListSchema,
  recipePathSchema,
  recipeSchema,
} from '../_contracts/recipe';
import { showPathSchema } from '../_contracts/show';
import { defineEndpoint } from './Endpoint';

export const listRecipesEndpoint = defineEndpoint({
  method: 'get',
  path: '/shows/{slug}/recipes',
  operationId: 'listRecipes',
  summary: 'Recipes of a show: searched in name and title, sorted, in pages',
  tag: 'recipes',
  access: 'signed-in',
  params: showPathSchema,
  query: recipeListQuerySchema,
  answers: { 200: { description: 'One page.', schema: recipeListSchema } },
  problems: ['not-found', 'invalid-input', 'invalid-cursor'],
});

export const createRecipeEndpoint = defineEndpoint({
  method: 'post',
  path: '/shows/{slug}/recipes',
  operationId: 'createRecipe',
  summary: 'Add a recipe with its first version',
  tag: 'recipes',
  access: 'signed-in',
  params: showPathSchema,
  body: createRecipeRequestSchema,
  headers: { 'Idempotency-Key': 'Your own name for this request; sent again, it is answered as before.' },
  answers: {
    201: {
      description: 'The recipe as it is now.',
      schema: recipeSchema,
      headers: { Location: 'Address of the recipe.' },
    },
  },
  problems: ['not-found', 'forbidden', 'invalid-input', 'name-taken', 'idempotency-key-reused'],
});

export const readRecipeEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}',
  operationId: 'readRecipe',
  summary: 'One recipe with its show and newest version',
  tag: 'recipes',
  access: 'signed-in',
  params: recipePathSchema,
  headers: { 'If-None-Match': 'ETag of the answer you have.' },
  answers: {
    200: {
      description: 'The recipe.',
      schema: recipeSchema,
      headers: { ETag: 'Changes with the answer.' },
    },
    304: { description: 'You have this answer already.' },
  },
  problems: ['not-found'],
});
