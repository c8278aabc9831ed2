import { download } from '@/app/_server/http/download';
import { handle } from '@/app/_server/http/handle';
import { route } from '@/app/_server/http/route';
import { readBuildArchive } from '@/app/_server/operations/builds/readBuildArchive';
import { readBuildArchiveEndpoint } from '../../../../../../_endpoints/builds';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readBuildArchiveEndpoint, async ({ caller, params }) => {
    const { name, key, bytes } = await readBuildArchive(caller, params);
    return download({ name, mediaType: 'application/zip', etag: key, body: new Uint8Array(bytes) });
  }),
});
