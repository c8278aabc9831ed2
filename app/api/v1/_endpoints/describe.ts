import { OpenAPIRegistry, OpenApiGeneratorV31, type ResponseConfig } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { problemStatus, problemTitle } from '@/app/_server/http/problems';
import { type ProblemCode, problemSchema } from '../_contracts/problem';
import { endpoints } from './all';
import type { Answer, Endpoint } from './Endpoint';

/** Headers as a schema, which is the form the generator takes them in. */
function headerSchema(headers: Readonly<Record<string, string>>): z.ZodObject {
  return z.object(
    Object.fromEntries(
      Object.entries(headers).map(([name, description]) => [
        name,
        z.string().optional().meta({ description }),
      ]),
    ),
  );
}

function describeAnswer({ description, schema, mediaType, headers }: Answer): ResponseConfig {
  const file = { type: 'string' as const, format: 'binary' };
  const content = schema
    ? { 'application/json': { schema } }
    : mediaType
      ? { [mediaType]: { schema: file } }
      : undefined;
  return {
    description,
    ...(content ? { content } : {}),
    ...(headers ? { headers: headerSchema(headers) } : {}),
  };
}

/** Problems an endpoint can answer with, those included that follow from its form. */
function problemsOf(endpoint: Endpoint): readonly ProblemCode[] {
  const general: ProblemCode[] = ['internal-error'];
  if (endpoint.access === 'signed-in') general.push('not-signed-in');
  if (endpoint.method !== 'get') general.push('foreign-origin');
  if (endpoint.body) general.push('bad-request', 'unsupported-media-type', 'body-too-large');
  return [...endpoint.problems, ...general];
}

function describeProblems(endpoint: Endpoint): Record<number, ResponseConfig> {
  const titles = new Map<number, string[]>();
  for (const code of problemsOf(endpoint)) {
    const status = problemStatus(code);
    titles.set(status, [...(titles.get(status) ?? []), `${problemTitle(code)} (\`${code}\`)`]);
  }
  const sorted = [...titles].sort(([left], [right]) => left - right);
  return Object.fromEntries(
    sorted.map(([status, words]) => [
      status,
      { description: words.join('; '), content: { 'application/problem+json': { schema: problemSchema } } },
    ]),
  );
}

/** The OpenAPI 3.1 description of the API, made from the very schemas that requests are read by. */
export function describeApi(version: string) {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: 'next-auth.session-token',
    description: 'The cookie that signing in sets; `__Secure-next-auth.session-token` over HTTPS.',
  });
  for (const endpoint of endpoints) {
    registry.registerPath({
      method: endpoint.method,
      path: endpoint.path,
      operationId: endpoint.operationId,
      summary: endpoint.summary,
      tags: [endpoint.tag],
      security: endpoint.access === 'public' ? [] : [{ session: [] }],
      request: {
        ...(endpoint.params ? { params: endpoint.params } : {}),
        ...(endpoint.query ? { query: endpoint.query } : {}),
        ...(endpoint.headers ? { headers: headerSchema(endpoint.headers) } : {}),
        ...(endpoint.body
          ? { body: { required: true, content: { 'application/json': { schema: endpoint.body } } } }
          : {}),
      },
      responses: {
        ...Object.fromEntries(
          Object.entries(endpoint.answers).map(([status, answer]) => [status, describeAnswer(answer)]),
        ),
        ...describeProblems(endpoint),
      },
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: {
      title: 'Pintle',
      version,
      description:
        'Rig recipes, their versions and builds. Problems follow RFC 9457; lists are paged by cursor.',
    },
    servers: [{ url: '/api/v1' }],
  });
}
