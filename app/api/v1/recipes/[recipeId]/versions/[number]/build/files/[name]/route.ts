import { download } from '@/app/_server/http/download';
import { handle } from '@/app/_server/http/handle';
import { route } from '@/app/_server/http/route';
import { readBuildFile } from '@/app/_server/operations/builds/readBuildFile';
import { readBuildFileEndpoint } from '../../../../../../../_endpoints/builds';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readBuildFileEndpoint, async ({ caller, params }) => {
    const { name, mediaType, sha256, text, encoding } = await readBuildFile(caller, params);
    return download({
      name,
      mediaType,
      etag: sha256,
      body: encoding === 'utf8' ? text : Buffer.from(text, encoding),
    });
  }),
});
