import { recipePathSchema } from '../_contracts/recipe';
import {
  createVersionRequestSchema,
  versionListItemSchema,
  versionListQuerySchema,
  versionListSchema,
  versionPathSchema,
  versionSchema,
} from '../_contracts/version';
import { defineEndpoint } from './Endpoint';

export const listVersionsEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/versions',
  operationId: 'listVersions',
  summary: 'Versions of a recipe, the newest first, in pages',
  tag: 'versions',
  access: 'signed-in',
  params: recipePathSchema,
  query: versionListQuerySchema,
  answers: { 200: { description: 'One page.', schema: versionListSchema } },
  problems: ['not-found', 'invalid-input', 'invalid-cursor'],
});

export const createVersionEndpoint = defineEndpoint({
  method: 'post',
  path: '/recipes/{recipeId}/versions',
  operationId: 'createVersion',
  summary: 'Save a text as the next version; drops your draft',
  tag: 'versions',
  access: 'signed-in',
  params: recipePathSchema,
  body: createVersionRequestSchema,
  headers: { 'Idempotency-Key': 'Your own name for this request; sent again, it is answered as before.' },
  answers: {
    201: {
      description: 'The version, without its text.',
      schema: versionListItemSchema,
      headers: { Location: 'Address of the version.' },
    },
  },
  problems: ['not-found', 'forbidden', 'invalid-input', 'stale-parent', 'idempotency-key-reused'],
});

export const readVersionEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/versions/{number}',
  operationId: 'readVersion',
  summary: 'One version with its text',
  tag: 'versions',
  access: 'signed-in',
  params: versionPathSchema,
  headers: { 'If-None-Match': 'ETag of the answer you have.' },
  answers: {
    200: {
      description: 'The version.',
      schema: versionSchema,
      headers: { ETag: 'Changes with the answer.' },
    },
    304: { description: 'You have this answer already.' },
  },
  problems: ['not-found'],
});
