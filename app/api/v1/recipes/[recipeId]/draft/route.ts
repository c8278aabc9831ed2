import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { expectedDraft, expectedRevision } from '@/app/_server/http/preconditions';
import { route } from '@/app/_server/http/route';
import { dropDraft } from '@/app/_server/operations/drafts/dropDraft';
import { readDraft } from '@/app/_server/operations/drafts/readDraft';
import { writeDraft } from '@/app/_server/operations/drafts/writeDraft';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import { deleteDraftEndpoint, putDraftEndpoint, readDraftEndpoint } from '../../../_endpoints/drafts';

function draftJson(draft: Draft): Response {
  return json(draft, { headers: { etag: `"${draft.revision}"` } });
}

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readDraftEndpoint, async ({ caller, params }) => draftJson(await readDraft(caller, params))),
  PUT: handle(putDraftEndpoint, async ({ request, caller, params, body }) => {
    const expected = expectedDraft(request.headers);
    return draftJson(await writeDraft(caller, { ...params, ...body, expected }));
  }),
  DELETE: handle(deleteDraftEndpoint, async ({ request, caller, params }) => {
    await dropDraft(caller, { ...params, revision: expectedRevision(request.headers) });
    return new Response(null, { status: 204 });
  }),
});
