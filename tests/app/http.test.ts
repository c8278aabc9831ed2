import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { MAXIMUM_BODY_BYTES } from '@/app/_server/http/readJsonBody';
import { type ProblemCode, problemSchema } from '@/app/api/v1/_contracts/problem';
import { MAXIMUM_RECIPE_LENGTH } from '@/app/api/v1/_contracts/recipeText';
import { readMeEndpoint } from '@/app/api/v1/_endpoints/people';
import {
  createRecipeEndpoint,
  listRecipesEndpoint,
  readRecipeEndpoint,
} from '@/app/api/v1/_endpoints/recipes';
import { createVersionEndpoint } from '@/app/api/v1/_endpoints/versions';
import { type ApiRequest, callApi, makeRequest, ORIGIN, startApplication } from '../support/api';
import type { TestDatabase } from '../support/testDatabase';
import { createWorld, type World } from '../support/world';

let test: TestDatabase;
let world: World;

beforeAll(async () => {
  test = await startApplication();
  world = await createWorld(test.database);
});

afterAll(async () => {
  await test.drop();
});

const sound = { parent: 1, message: 'Next', text: 'x' };

function save(request: ApiRequest): Promise<Response> {
  return callApi(createVersionEndpoint, {
    params: { recipeId: world.recipeId },
    as: world.people.rigger,
    ...request,
  });
}

async function expectProblem(response: Response, status: number, code: ProblemCode) {
  const problem = problemSchema.parse(await response.json());
  expect([response.status, problem.status, problem.code]).toEqual([status, status, code]);
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  expect(problem.requestId).toBe(response.headers.get('x-request-id'));
  return problem;
}

async function countVersions(): Promise<number> {
  const [row] = await test.database('recipe_versions').count({ total: '*' });
  return Number(row?.total);
}

describe('a request body', () => {
  it.each<[string, string]>([
    ['cut off', '{"parent":1,'],
    ['empty', ''],
    ['no JSON', 'parent=1'],
  ])('that is %s is refused', async (_, rawBody) => {
    await expectProblem(
      await save({ rawBody, headers: { 'content-type': 'application/json' } }),
      400,
      'bad-request',
    );
  });

  it('in broken UTF-8 is refused, not stored with replacement characters', async () => {
    const before = await countVersions();
    const [head, tail] = JSON.stringify({ ...sound, text: 'x|x' }).split('|');
    const rawBody = new Blob([head ?? '', new Uint8Array([0xc3, 0x28]), tail ?? '']);
    await expectProblem(await save({ rawBody: await rawBody.arrayBuffer() }), 400, 'bad-request');
    expect(await countVersions()).toBe(before);
  });

  it.each([['text/plain'], ['application/x-www-form-urlencoded'], ['multipart/form-data; boundary=x']])(
    'of type %s is refused',
    async (type) => {
      await expectProblem(
        await save({ rawBody: JSON.stringify(sound), headers: { 'content-type': type } }),
        415,
        'unsupported-media-type',
      );
    },
  );

  it('that is too large is refused by its stated length, and by its true one when it is sent in pieces', async () => {
    const large = `{"text":"${'x'.repeat(MAXIMUM_BODY_BYTES)}"}`;
    await expectProblem(await save({ rawBody: large }), 413, 'body-too-large');
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 65536;
        controller.enqueue(new Uint8Array(65536).fill(0x20));
      },
    });
    await expectProblem(await save({ rawBody: endless }), 413, 'body-too-large');
    expect(sent).toBeLessThan(MAXIMUM_BODY_BYTES + 1024 * 1024);
  });

  it.each<[string, unknown, (string | number)[]]>([
    ['with a wrong type', { ...sound, parent: '1' }, ['body', 'parent']],
    ['without a message', { ...sound, message: '  ' }, ['body', 'message']],
    ['with a line break in its message', { ...sound, message: 'a\nb' }, ['body', 'message']],
    ['with NUL in its text', { ...sound, text: 'a\0b' }, ['body', 'text']],
    ['with half a surrogate pair in its text', { ...sound, text: 'a\ud83d' }, ['body', 'text']],
    ['with too long a text', { ...sound, text: 'x'.repeat(MAXIMUM_RECIPE_LENGTH + 1) }, ['body', 'text']],
    ['that is a list', [], ['body']],
  ])('%s is refused, saying where', async (_, body, path) => {
    const { issues } = await expectProblem(await save({ body }), 422, 'invalid-input');
    expect(issues?.map((issue) => issue.path)).toContainEqual(path);
  });

  it('with keys nobody asked for is refused, also those that every object inherits', async () => {
    const rawBody = `{"parent":1,"message":"m","text":"x","__proto__":{"parent":1},"extra":1}`;
    await expectProblem(await save({ rawBody }), 422, 'invalid-input');
  });

  it('may be as large as the largest recipe, of characters of three bytes', async () => {
    const response = await save({ body: { ...sound, text: '\u20ac'.repeat(MAXIMUM_RECIPE_LENGTH) } });
    expect(response.status).toBe(201);
  });
});

describe('an address', () => {
  it.each([['not-a-uuid'], ["' or 1=1 --"], ['..'], ['00000000-0000-0000-0000-00000000000g']])(
    'with the id %s is not found',
    async (recipeId) => {
      await expectProblem(
        await callApi(readRecipeEndpoint, { params: { recipeId }, as: world.people.viewer }),
        404,
        'not-found',
      );
    },
  );

  it.each<[Record<string, string>, string]>([
    [{ limit: '0' }, 'limit'],
    [{ limit: '101' }, 'limit'],
    [{ limit: 'many' }, 'limit'],
    [{ sort: 'text' }, 'sort'],
    [{ direction: 'up' }, 'direction'],
    [{ cursor: '../..' }, 'cursor'],
  ])('with the query %o is refused, saying where', async (query, name) => {
    const response = await callApi(listRecipesEndpoint, {
      params: { slug: world.slug },
      query,
      as: world.people.viewer,
    });
    const { issues } = await expectProblem(response, 422, 'invalid-input');
    expect(issues?.[0]?.path).toEqual(['query', name]);
  });

  it('that no route has is a problem too', async () => {
    const { GET } = await import('@/app/api/[...rest]/route');
    const request = await makeRequest('GET', `${ORIGIN}/api/v2/nothing`, {});
    await expectProblem(await GET(request, { params: Promise.resolve({}) }), 404, 'not-found');
  });
});

describe('a page of another site', () => {
  it.each<[Record<string, string>]>([
    [{ 'sec-fetch-site': 'cross-site' }],
    [{ 'sec-fetch-site': 'same-site' }],
    [{ origin: 'https://elsewhere.example' }],
    [{ origin: 'null' }],
    [{ origin: 'http://127.0.0.1:3001', host: '127.0.0.1:3000' }],
  ])('cannot change anything (%o)', async (headers) => {
    const before = await countVersions();
    await expectProblem(await save({ body: sound, headers }), 403, 'foreign-origin');
    expect(await countVersions()).toBe(before);
  });

  it('is told apart from our own pages and from callers that are no browser', async () => {
    const own = { 'sec-fetch-site': 'same-origin', origin: ORIGIN };
    const [newest] = await test.database('recipes').where({ id: world.recipeId }).select('latest_number');
    const parent = newest?.latest_number ?? 0;
    expect((await save({ body: { ...sound, parent }, headers: own })).status).toBe(201);
    expect((await save({ body: { ...sound, parent: parent + 1 } })).status).toBe(201);
  });
});

describe('an answer', () => {
  it('to an unchanged ETag is 304 without a body', async () => {
    const request = { params: { recipeId: world.recipeId }, as: world.people.viewer };
    const first = await callApi(readRecipeEndpoint, request);
    const etag = first.headers.get('etag') ?? '';
    const again = await callApi(readRecipeEndpoint, {
      ...request,
      headers: { 'if-none-match': `"x", W/${etag}` },
    });
    expect([again.status, await again.text()]).toEqual([304, '']);
    const other = await callApi(readRecipeEndpoint, { ...request, headers: { 'if-none-match': '"x"' } });
    expect(other.status).toBe(200);
  });

  it('names the new thing’s address', async () => {
    const response = await callApi(createRecipeEndpoint, {
      params: { slug: world.slug },
      as: world.people.rigger,
      body: { name: 'fresh', title: ' Fresh ', text: '', message: 'First' },
    });
    const recipe = await response.json();
    expect(recipe.title).toBe('Fresh');
    expect(response.headers.get('location')).toBe(`/api/v1/recipes/${recipe.id}`);
  });

  it('carries the request id it was given, unless that could break a line of the log', async () => {
    const as = world.people.viewer;
    const given = await callApi(readMeEndpoint, { as, headers: { 'x-request-id': 'abc-12345' } });
    expect(given.headers.get('x-request-id')).toBe('abc-12345');
    const hostile = await callApi(readMeEndpoint, { as, headers: { 'x-request-id': '{"a":1}; x' } });
    expect(hostile.headers.get('x-request-id')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('to a fault of ours says nothing about its cause, which stands in the log under the request id', async () => {
    const stderr = vi.spyOn(process.stderr, 'write').mockReturnValue(true);
    // Nothing a caller sends makes the server fail, so the fault is made behind its back.
    await test.database.raw('alter table people rename to people_elsewhere');
    try {
      const response = await callApi(readMeEndpoint, { as: world.people.viewer });
      const problem = await expectProblem(response, 500, 'internal-error');
      expect(JSON.stringify(problem)).not.toMatch(/people|select|\.ts|at /i);
      const logged = JSON.parse(String(stderr.mock.calls[0]?.[0]));
      expect(logged).toMatchObject({ event: 'request.failed', requestId: problem.requestId });
      expect(logged.cause).toContain('relation "people" does not exist');
    } finally {
      await test.database.raw('alter table people_elsewhere rename to people');
      stderr.mockRestore();
    }
  });
});
