import { showListSchema } from '../_contracts/show';
import { defineEndpoint } from './Endpoint';

export const listShowsEndpoint = defineEndpoint({
  method: 'get',
  path: '/shows',
  operationId: 'listShows',
  summary: 'The shows you belong to, in order of title',
  tag: 'shows',
  access: 'signed-in',
  answers: { 200: { description: 'The shows.', schema: showListSchema } },
  problems: [],
});
