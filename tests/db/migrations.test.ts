import { readdirSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { seedDemo } from '@/app/_server/demo/seedDemo';
import { migrationSource } from '@/db/migrationSource';
import { NEWEST_MIGRATION } from '@/db/newestMigration';
import { cheapPasswords } from '../support/cheapPasswords';
import { createEmptyDatabase, type TestDatabase } from '../support/testDatabase';

let test: TestDatabase;

beforeEach(async () => {
  test = await createEmptyDatabase();
});

afterEach(async () => {
  await test.drop();
});

/** Everything that lies in the database beside Knex's own history. */
async function listThings(): Promise<readonly string[]> {
  const { rows } = await test.database.raw<{ rows: { name: string }[] }>(`
    select relname as name from pg_class where relnamespace = 'public'::regnamespace
      and relname not like 'knex%'
    union all
    select proname from pg_proc where pronamespace = 'public'::regnamespace
    union all
    select extname from pg_extension where extname <> 'plpgsql'`);
  return rows.map(({ name }) => name);
}

describe('migrations', () => {
  it('go up on an empty database, down to nothing, and up again', async () => {
    await test.database.migrate.latest({ migrationSource });
    const things = await listThings();
    expect(things).toContain('recipe_versions');
    await test.database.migrate.rollback({ migrationSource }, true);
    expect(await listThings()).toEqual([]);
    await test.database.migrate.latest({ migrationSource });
    expect((await listThings()).toSorted()).toEqual(things.toSorted());
  });

  it('go down and up on a database that holds the demo', async () => {
    await test.database.migrate.latest({ migrationSource });
    await seedDemo(test.database, cheapPasswords);
    await test.database.migrate.rollback({ migrationSource }, true);
    expect(await listThings()).toEqual([]);
    await test.database.migrate.latest({ migrationSource });
    await seedDemo(test.database, cheapPasswords);
    expect(await test.database('recipes').count({ total: '*' })).not.toEqual([{ total: '0' }]);
  });

  it('each undo what they did, one at a time', async () => {
    const migrations = await migrationSource.getMigrations([]);
    const before: (readonly string[])[] = [];
    for (const _ of migrations) {
      before.push((await listThings()).toSorted());
      await test.database.migrate.up({ migrationSource });
    }
    for (const expected of before.toReversed()) {
      await test.database.migrate.down({ migrationSource });
      expect((await listThings()).toSorted()).toEqual(expected);
    }
  });

  it('are named in the readiness check', () => {
    const files = readdirSync(new URL('../../db/migrations', import.meta.url));
    expect(files.toSorted().at(-1)).toBe(NEWEST_MIGRATION);
  });
});
