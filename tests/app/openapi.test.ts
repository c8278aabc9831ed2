import { readdirSync } from 'node:fs';
import Ajv2020 from 'ajv/dist/2020.js';
import addFormats from 'ajv-formats';
import { NextRequest } from 'next/server';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { endpoints } from '@/app/api/v1/_endpoints/all';
import { describeApi } from '@/app/api/v1/_endpoints/describe';
import { createVersionEndpoint } from '@/app/api/v1/_endpoints/versions';
import { callApi, importRoute, startApplication } from '../support/api';
import { BROKEN_TEXT, SOUND_TEXT } from '../support/recipeTexts';
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

const description = JSON.parse(JSON.stringify(describeApi('0')));

/** Checks JSON against the description's schema for one answer, as an outside caller's generated code would. */
function validatorFor(path: string, method: string, status: number) {
  const ajv = new Ajv2020({ strict: false, allErrors: true });
  addFormats(ajv);
  ajv.addSchema({ $id: 'api', ...description });
  const steps = ['paths', path, method, 'responses', String(status), 'content'];
  const content = steps.reduce((place, step) => place[step], description);
  const [mediaType] = Object.keys(content);
  const pointer = [...steps, mediaType ?? '', 'schema'].map((step) =>
    step.replaceAll('~', '~0').replaceAll('/', '~1'),
  );
  return ajv.compile({ $ref: `api#/${pointer.map(encodeURIComponent).join('/')}` });
}

async function expectDescribed(
  endpoint: { path: string; method: string },
  response: Response,
): Promise<void> {
  const validate = validatorFor(endpoint.path, endpoint.method, response.status);
  const value = await response.json();
  expect(validate(value) ? [] : validate.errors).toEqual([]);
}

describe('the OpenAPI description', () => {
  it('speaks of every endpoint, once, and of nothing else', () => {
    const described = Object.entries<Record<string, { operationId: string }>>(description.paths).flatMap(
      ([path, methods]) =>
        Object.entries(methods).map(([method, { operationId }]) => `${operationId} ${method} ${path}`),
    );
    const wanted = endpoints.map(({ operationId, method, path }) => `${operationId} ${method} ${path}`);
    expect(described.toSorted()).toEqual(wanted.toSorted());
    expect(new Set(endpoints.map(({ operationId }) => operationId)).size).toBe(endpoints.length);
  });

  it('names every path parameter an address has', () => {
    for (const { path, params } of endpoints) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
      expect(Object.keys(params?.shape ?? {}).toSorted()).toEqual(inPath.toSorted());
    }
  });

  it('fits the route files: each has exactly the methods described, and refuses the others', async () => {
    const root = new URL('../../app/api/v1/', import.meta.url);
    const files = readdirSync(root, { recursive: true, encoding: 'utf8' });
    const paths = files
      .filter((file) => file.endsWith('/route.ts'))
      .map((file) => `/${file.slice(0, -'/route.ts'.length).replaceAll('[', '{').replaceAll(']', '}')}`);
    expect(paths.toSorted()).toEqual([...new Set(endpoints.map(({ path }) => path))].toSorted());
    for (const path of paths) {
      const module = await importRoute(path);
      const described = endpoints.filter((endpoint) => endpoint.path === path);
      const methods = described.map(({ method }) => method.toUpperCase());
      for (const method of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'].filter((it) => !methods.includes(it))) {
        const response = await module[method]?.(new NextRequest('http://a/'), {
          params: Promise.resolve({}),
        });
        expect(response?.status).toBe(405);
        const allowed = response?.headers.get('allow')?.split(', ') ?? [];
        expect(allowed.toSorted()).toEqual(methods.toSorted());
      }
      const options = await module.OPTIONS?.(new NextRequest('http://a/', { method: 'OPTIONS' }), {
        params: Promise.resolve({}),
      });
      expect(options?.headers.get('allow')?.split(', ').toSorted()).toEqual(methods.toSorted());
    }
  });

  it('is true of real answers, good and bad', async () => {
    const as = world.people.rigger;
    const recipe = { recipeId: world.recipeId };
    const known: Record<string, string> = { ...recipe, slug: world.slug, number: '1' };
    for (const endpoint of endpoints) {
      if (endpoint.method !== 'get' || !endpoint.answers[200]?.schema) continue;
      const names = Object.keys(endpoint.params?.shape ?? {});
      const params = Object.fromEntries(names.map((name) => [name, known[name] ?? '']));
      const response = await callApi(endpoint, { params, as });
      expect([endpoint.operationId, response.status]).toEqual([
        endpoint.operationId,
        endpoint.operationId === 'readDraft' ? 404 : 200,
      ]);
      await expectDescribed(endpoint, response);
    }
    const save = (parent: number, text: string) =>
      callApi(createVersionEndpoint, { params: recipe, as, body: { parent, message: 'Next', text } });
    await expectDescribed(createVersionEndpoint, await save(1, BROKEN_TEXT));
    await expectDescribed(createVersionEndpoint, await save(1, SOUND_TEXT));
    const build = endpoints.find(({ operationId }) => operationId === 'readBuild');
    if (!build) throw new Error('there is no build endpoint');
    const refused = await callApi(build, { params: { ...recipe, number: '2' }, as });
    expect(refused.status).toBe(422);
    await expectDescribed(build, refused);
  });
});
