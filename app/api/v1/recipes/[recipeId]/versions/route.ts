import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { idempotencyKeyOf } from '@/app/_server/http/preconditions';
import { route } from '@/app/_server/http/route';
import { listVersions } from '@/app/_server/operations/versions/listVersions';
import { saveVersion } from '@/app/_server/operations/versions/saveVersion';
import { createVersionEndpoint, listVersionsEndpoint } from '../../../_endpoints/versions';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(listVersionsEndpoint, async ({ caller, params, query }) =>
    json(await listVersions(caller, { ...params, ...query })),
  ),
  POST: handle(createVersionEndpoint, async ({ request, caller, params, body }) => {
    const idempotencyKey = idempotencyKeyOf(request.headers);
    const version = await saveVersion(caller, { ...params, ...body, idempotencyKey });
    const location = `/api/v1/recipes/${params.recipeId}/versions/${version.number}`;
    return json(version, { status: 201, headers: { location } });
  }),
});
