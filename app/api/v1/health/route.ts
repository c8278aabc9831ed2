import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { readHealthEndpoint } from '../_endpoints/service';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readHealthEndpoint, () => json({ status: 'ok' })),
});
