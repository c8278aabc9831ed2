import { handle } from '@/app/_server/http/handle';
import { jsonWithEtag } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { readVersion } from '@/app/_server/operations/versions/readVersion';
import { readVersionEndpoint } from '../../../../_endpoints/versions';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readVersionEndpoint, async ({ request, caller, params }) =>
    jsonWithEtag(request, await readVersion(caller, params)),
  ),
});
