import { handle } from '@/app/_server/http/handle';
import { jsonWithEtag } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { COMPILER_VERSION } from '@/compiler/index';
import { describeApi } from '../_endpoints/describe';
import { readOpenApiEndpoint } from '../_endpoints/service';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readOpenApiEndpoint, ({ request }) => jsonWithEtag(request, describeApi(COMPILER_VERSION))),
});
