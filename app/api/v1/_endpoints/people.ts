import { meSchema } from '../_contracts/me';
import { defineEndpoint } from './Endpoint';

export const readMeEndpoint = defineEndpoint({
  method: 'get',
  path: '/me',
  operationId: 'readMe',
  summary: 'Who is signed in',
  tag: 'people',
  access: 'signed-in',
  answers: { 200: { description: 'The person.', schema: meSchema } },
  problems: [],
});
