import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { problemSchema } from '@/app/api/v1/_contracts/problem';
import { deleteDraftEndpoint, putDraftEndpoint, readDraftEndpoint } from '@/app/api/v1/_endpoints/drafts';
import { createVersionEndpoint } from '@/app/api/v1/_endpoints/versions';
import { callApi, startApplication } from '../support/api';
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

beforeEach(async () => {
  await test.database('recipe_drafts').delete();
});

function put(text: string, headers: Record<string, string>, basedOn = 1): Promise<Response> {
  return callApi(putDraftEndpoint, {
    params: { recipeId: world.recipeId },
    as: world.people.rigger,
    body: { text, basedOn },
    headers,
  });
}

const request = () => ({ params: { recipeId: world.recipeId }, as: world.people.rigger });
const first = { 'if-none-match': '*' };

async function tagOf(response: Response): Promise<string> {
  expect(response.status).toBe(200);
  return response.headers.get('etag') ?? '';
}

describe('a draft', () => {
  it('is stored, read with its ETag, replaced by it, and dropped', async () => {
    const one = await tagOf(await put('one', first));
    const two = await tagOf(await put('two', { 'if-match': one }));
    expect(two).not.toBe(one);
    const read = await callApi(readDraftEndpoint, request());
    expect(await tagOf(read)).toBe(two);
    expect(await read.json()).toMatchObject({ text: 'two', basedOn: 1 });
    expect((await callApi(deleteDraftEndpoint, { ...request(), headers: { 'if-match': two } })).status).toBe(
      204,
    );
    const gone = await callApi(readDraftEndpoint, request());
    expect(gone.status).toBe(404);
    expect(problemSchema.parse(await gone.json()).code).toBe('draft-not-found');
  });

  it.each([[{ 'if-match': '"999999999"' }], [{ 'if-match': 'W/"1"' }], [{ 'if-match': 'x' }], [first]])(
    'is not replaced by a writer who expects %o, and is shown to them',
    async (headers) => {
      const tag = await tagOf(await put('stored', first));
      const response = await put('other', headers);
      expect(response.status).toBe(412);
      expect(response.headers.get('etag')).toBe(tag);
      const problem = problemSchema.parse(await response.json());
      expect(problem).toMatchObject({ code: 'draft-changed', draft: { text: 'stored' } });
    },
  );

  it('says so when the one expected is gone', async () => {
    const response = await put('late', { 'if-match': '"1"' });
    expect(response.status).toBe(412);
    expect(problemSchema.parse(await response.json()).draft).toBeNull();
  });

  it('is not written without a word about what is expected', async () => {
    expect((await put('x', {})).status).toBe(428);
  });

  it('cannot be based on a version that does not exist', async () => {
    const response = await put('x', first, 7);
    expect(response.status).toBe(422);
    expect(problemSchema.parse(await response.json()).issues?.[0]?.path).toEqual(['body', 'basedOn']);
  });

  it('never shows an old revision again: a window from before a save cannot overwrite what came after', async () => {
    const old = await tagOf(await put('before', first));
    const saved = await callApi(createVersionEndpoint, {
      ...request(),
      body: { parent: 1, message: 'Next', text: 'before' },
    });
    expect(saved.status).toBe(201);
    await tagOf(await put('after', first, 2));
    expect((await put('from the old window', { 'if-match': old })).status).toBe(412);
    expect(await (await callApi(readDraftEndpoint, request())).json()).toMatchObject({ text: 'after' });
  });

  it('goes to one of many writers who expect the same', async () => {
    const tag = await tagOf(await put('start', first));
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, index) => put(`writer ${index}`, { 'if-match': tag })),
    );
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    expect(answers.filter(({ status }) => status === 412)).toHaveLength(11);
  });

  it('belongs to one person: nobody else reads, replaces or drops it', async () => {
    await put('mine', first);
    const other = { ...request(), as: world.people.reviewer };
    expect((await callApi(readDraftEndpoint, other)).status).toBe(404);
    expect((await callApi(deleteDraftEndpoint, other)).status).toBe(204);
    expect((await callApi(readDraftEndpoint, request())).status).toBe(200);
  });

  it('is not dropped by a window that expects another', async () => {
    const tag = await tagOf(await put('mine', first));
    const refused = await callApi(deleteDraftEndpoint, { ...request(), headers: { 'if-match': '"1"' } });
    expect(refused.status).toBe(412);
    expect(await tagOf(await callApi(readDraftEndpoint, request()))).toBe(tag);
  });
});
