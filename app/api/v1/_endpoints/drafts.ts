import { draftSchema, putDraftRequestSchema } from '../_contracts/draft';
import { recipePathSchema } from '../_contracts/recipe';
import { defineEndpoint } from './Endpoint';

const etag = { ETag: 'The revision in double quotes.' };

export const readDraftEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/draft',
  operationId: 'readDraft',
  summary: 'Your draft of a recipe',
  tag: 'drafts',
  access: 'signed-in',
  params: recipePathSchema,
  answers: { 200: { description: 'The draft.', schema: draftSchema, headers: etag } },
  problems: ['not-found', 'forbidden', 'draft-not-found'],
});

export const putDraftEndpoint = defineEndpoint({
  method: 'put',
  path: '/recipes/{recipeId}/draft',
  operationId: 'putDraft',
  summary: 'Store your draft of a recipe',
  tag: 'drafts',
  access: 'signed-in',
  params: recipePathSchema,
  body: putDraftRequestSchema,
  headers: {
    'If-Match': 'ETag of the draft this one replaces.',
    'If-None-Match': '`*`, for the first draft.',
  },
  answers: { 200: { description: 'The draft as stored.', schema: draftSchema, headers: etag } },
  problems: ['not-found', 'forbidden', 'invalid-input', 'draft-changed', 'precondition-required'],
});

export const deleteDraftEndpoint = defineEndpoint({
  method: 'delete',
  path: '/recipes/{recipeId}/draft',
  operationId: 'deleteDraft',
  summary: 'Drop your draft of a recipe',
  tag: 'drafts',
  access: 'signed-in',
  params: recipePathSchema,
  headers: { 'If-Match': 'ETag of the draft to drop; without it, whichever is stored.' },
  answers: { 204: { description: 'There is no draft any more.' } },
  problems: ['not-found', 'forbidden', 'draft-changed'],
});
