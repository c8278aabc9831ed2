import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { readMe } from '@/app/_server/operations/people/readMe';
import { readMeEndpoint } from '../_endpoints/people';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readMeEndpoint, async ({ caller }) => json(await readMe(caller))),
});
