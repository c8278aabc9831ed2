import { handle } from '@/app/_server/http/handle';
import { json } from '@/app/_server/http/json';
import { route } from '@/app/_server/http/route';
import { readBuild } from '@/app/_server/operations/builds/readBuild';
import { readBuildEndpoint } from '../../../../../_endpoints/builds';

export const { GET, POST, PUT, PATCH, DELETE, OPTIONS } = route({
  GET: handle(readBuildEndpoint, async ({ caller, params }) => json(await readBuild(caller, params))),
});
