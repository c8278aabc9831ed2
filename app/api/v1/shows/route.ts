import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { listShows } from '@/app/_server/operations/shows/listShows';
import { listShowsEndpoint } from '../_endpoints/shows';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(listShowsEndpoint, async ({ caller }) => json(await listShows(caller))),
});
