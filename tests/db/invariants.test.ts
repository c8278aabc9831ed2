import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readBuild } from '@/app/_server/operations/builds/readBuild';
import { sha256Hex } from '@/compiler/index';
import { createTestDatabase, type TestDatabase } from '../support/testDatabase';
import { createWorld, type World } from '../support/world';

let test: TestDatabase;
let world: World;

beforeAll(async () => {
  test = await createTestDatabase();
  world = await createWorld(test.database);
  await readBuild(await world.callerFor(world.people.viewer), { recipeId: world.recipeId, number: 1 });
});

afterAll(async () => {
  await test.drop();
});

/** A version row that the database would take, with some columns changed. */
function versionRow(changes: Record<string, unknown>): Record<string, unknown> {
  return {
    recipe_id: world.recipeId,
    number: 2,
    parent: 1,
    message: 'Second',
    author_id: world.people.rigger,
    text: 'x',
    content_hash: sha256Hex('x'),
    compiler_version: '0',
    errors: 0,
    warnings: 0,
    ...changes,
  };
}

/** Tries an insert and takes it back, whatever comes of it. */
async function tryInsert(row: Record<string, unknown>): Promise<void> {
  const transaction = await test.database.transaction();
  try {
    // Named by a plain string, so that rows the types forbid can be tried.
    const table: string = 'recipe_versions';
    await transaction(table).insert(row);
  } finally {
    await transaction.rollback();
  }
}

describe('the database itself', () => {
  it.each([
    ["update recipe_versions set message = 'other'"],
    ['delete from recipe_versions'],
    ['truncate recipe_versions cascade'],
    ["update audit_log set action = 'other.thing'"],
    ['delete from audit_log'],
    ['truncate audit_log'],
    ["update builds set character = 'other'"],
    ["update build_files set name = 'other'"],
  ])('refuses "%s", also from its owner', async (statement) => {
    await expect(test.database.raw(statement)).rejects.toMatchObject({ code: '23001' });
  });

  it('takes a version that follows on the newest', async () => {
    await expect(tryInsert(versionRow({}))).resolves.toBeUndefined();
  });

  it.each<[string, Record<string, unknown>]>([
    ['whose number is taken', { number: 1, parent: null }],
    ['that skips a number', { number: 3, parent: 1 }],
    ['without a parent', { parent: null }],
    ['that is its own parent', { parent: 2 }],
    ['whose hash is not that of its text', { content_hash: sha256Hex('y') }],
    ['without a message', { message: '' }],
    ['with a negative count', { errors: -1 }],
    ['in an unknown state', { state: 'finished' }],
  ])('refuses a version %s', async (_, changes) => {
    await expect(tryInsert(versionRow(changes))).rejects.toMatchObject({ code: /^23/ });
  });

  it('refuses a newest version that does not exist', async () => {
    await expect(
      test.database.raw('update recipes set latest_number = 7 where id = ?', [world.recipeId]),
    ).rejects.toMatchObject({ code: '23503' });
  });

  it('takes an e-mail address once, in whichever case', async () => {
    await expect(
      test.database('people').insert({ email: 'RIGGER@example.TEST', name: 'Other', password_hash: '' }),
    ).rejects.toMatchObject({ code: '23505' });
  });

  it('refuses a build file whose hash or size is not that of its text', async () => {
    const build = await test.database('builds').first('key');
    const file = {
      build_key: build?.key ?? '',
      position: 99,
      name: 'a',
      media_type: 'text/plain',
      text: 'ä',
      encoding: 'utf8' as const,
      bytes: 2,
      sha256: sha256Hex('ä'),
    };
    await expect(test.database('build_files').insert({ ...file, bytes: 1 })).rejects.toMatchObject({
      code: '23514',
    });
    await expect(
      test.database('build_files').insert({ ...file, sha256: sha256Hex('a') }),
    ).rejects.toMatchObject({ code: '23514' });
    // Of a binary file size and hash are those of its bytes, not of the base64 they are kept in.
    const binary = { ...file, encoding: 'base64' as const, text: '//79', bytes: 4 };
    await expect(test.database('build_files').insert(binary)).rejects.toMatchObject({ code: '23514' });
    await expect(test.database('build_files').insert({ ...file, name: '../a' })).rejects.toMatchObject({
      code: '23514',
    });
  });
});
