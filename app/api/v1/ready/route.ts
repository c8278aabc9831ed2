import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { checkReadiness } from '@/app/_server/operations/service/checkReadiness';
import { readReadinessEndpoint } from '../_endpoints/service';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readReadinessEndpoint, async ({ caller }) => {
    await checkReadiness(caller);
    return json({ status: 'ready' });
  }),
});
