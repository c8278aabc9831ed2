import { download } from '@/app/_server/http/download';
import { handle } from '@/app/_server/http/handle';
import { route } from '@/app/_server/http/route';
import { readConformanceKit } from '@/app/_server/operations/service/readConformanceKit';
import { readConformanceKitEndpoint } from '../_endpoints/service';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readConformanceKitEndpoint, async () => {
    const { bytes, hash } = readConformanceKit();
    return download({
      name: 'slipway-conformance-kit.zip',
      mediaType: 'application/zip',
      etag: hash,
      body: bytes,
    });
  }),
});
