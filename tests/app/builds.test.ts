import { createHash } from 'node:crypto';
import { unzipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildSchema } from '@/app/api/v1/_contracts/build';
import { problemSchema } from '@/app/api/v1/_contracts/problem';
import {
  readBuildArchiveEndpoint,
  readBuildEndpoint,
  readBuildFileEndpoint,
} from '@/app/api/v1/_endpoints/builds';
import { createVersionEndpoint } from '@/app/api/v1/_endpoints/versions';
import { buildFiles, compile } from '@/compiler/index';
import { callApi, startApplication } from '../support/api';
import { BROKEN_TEXT, SOUND_TEXT } from '../support/recipeTexts';
import type { TestDatabase } from '../support/testDatabase';
import { createWorld, type World } from '../support/world';

let test: TestDatabase;
let world: World;

beforeAll(async () => {
  test = await startApplication();
  world = await createWorld(test.database);
  const saved = await callApi(createVersionEndpoint, {
    params: { recipeId: world.recipeId },
    as: world.people.rigger,
    body: { parent: 1, message: 'Broken', text: BROKEN_TEXT },
  });
  expect(saved.status).toBe(201);
});

afterAll(async () => {
  await test.drop();
});

const version = (number: number) => ({
  params: { recipeId: world.recipeId, number: String(number) },
  as: world.people.viewer,
});

const hashOf = (content: Uint8Array): string => createHash('sha256').update(content).digest('hex');

describe('a build', () => {
  it('holds exactly the files the compiler makes of that version', async () => {
    const compilation = compile({ recipe: { name: 'cart.recipe.yaml', text: SOUND_TEXT }, version: 1 });
    const expected = await buildFiles(compilation);
    const build = buildSchema.parse(await (await callApi(readBuildEndpoint, version(1))).json());
    expect(build.files.map(({ name, sha256 }) => [name, sha256])).toEqual(
      expected.map(({ name, sha256 }) => [name, sha256]),
    );
    expect(build.character).toBe('mail_cart');
    for (const file of expected) {
      const response = await callApi(readBuildFileEndpoint, {
        ...version(1),
        params: { ...version(1).params, name: file.name },
      });
      expect(response.headers.get('content-type')).toBe(file.mediaType);
      expect(response.headers.get('content-disposition')).toContain(`attachment; filename="${file.name}"`);
      expect(response.headers.get('etag')).toBe(`"${file.sha256}"`);
      expect(hashOf(new Uint8Array(await response.arrayBuffer()))).toBe(file.sha256);
    }
  });

  it('is made once, however many ask for it at the same time', async () => {
    await test.database('builds').delete();
    const answers = await Promise.all(
      Array.from({ length: 6 }, () => callApi(readBuildEndpoint, version(1))),
    );
    const keys = await Promise.all(answers.map(async (answer) => (await answer.json()).key));
    expect(new Set(keys).size).toBe(1);
    expect(await test.database('builds').count({ total: '*' })).toEqual([{ total: '1' }]);
  });

  it('comes as one archive, the same bytes each time', async () => {
    const first = await callApi(readBuildArchiveEndpoint, version(1));
    expect(first.headers.get('content-type')).toBe('application/zip');
    expect(first.headers.get('content-disposition')).toContain('filename="cart@1.zip"');
    const bytes = new Uint8Array(await first.arrayBuffer());
    const again = await callApi(readBuildArchiveEndpoint, version(1));
    expect(new Uint8Array(await again.arrayBuffer())).toEqual(bytes);
    const entries = Object.entries(unzipSync(bytes));
    const build = buildSchema.parse(await (await callApi(readBuildEndpoint, version(1))).json());
    expect(entries.map(([name, content]) => [name, hashOf(content)])).toEqual(
      build.files.map(({ name, sha256 }) => [name, sha256]),
    );
  });

  it('of a recipe with errors is refused with its findings, and nothing is kept', async () => {
    const before = await test.database('builds').count({ total: '*' });
    for (const endpoint of [readBuildEndpoint, readBuildArchiveEndpoint]) {
      const response = await callApi(endpoint, version(2));
      expect(response.status).toBe(422);
      const problem = problemSchema.parse(await response.json());
      expect(problem.code).toBe('recipe-has-errors');
      expect(problem.findings?.[0]?.span.source).toBe('cart.recipe.yaml');
    }
    expect(await test.database('builds').count({ total: '*' })).toEqual(before);
  });

  it.each([['nothing.txt'], ['../cart.slip'], ['__proto__']])('has no file %s', async (name) => {
    const response = await callApi(readBuildFileEndpoint, {
      ...version(1),
      params: { ...version(1).params, name },
    });
    expect(response.status).toBe(404);
  });

  it.each([['0'], ['3'], ['-1'], ['1e3'], ['x']])('of version %s is not found', async (number) => {
    const response = await callApi(readBuildEndpoint, {
      params: { recipeId: world.recipeId, number },
      as: world.people.viewer,
    });
    expect(response.status).toBe(404);
  });
});
