import { randomBytes } from 'node:crypto';
import type { Knex } from 'knex';
import { inject } from 'vitest';
import { createDatabase } from '@/db/client';
import { migrationSource } from '@/db/migrationSource';

/** A database of one test file. */
export interface TestDatabase {
  readonly url: string;
  readonly database: Knex;
  /** Closes the connections and deletes the database. */
  drop(): Promise<void>;
}

/** Makes a database without tables. */
export async function createEmptyDatabase(): Promise<TestDatabase> {
  const name = `test_${randomBytes(6).toString('hex')}`;
  const server = createDatabase(inject('databaseUrl'));
  await server.raw('create database ??', [name]);
  const url = inject('databaseUrl').replace(/[^/]*$/, name);
  const database = createDatabase(url);
  return {
    url,
    database,
    async drop() {
      await database.destroy();
      await server.raw('drop database ?? with (force)', [name]);
      await server.destroy();
    },
  };
}

/** Makes a database with every migration. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const made = await createEmptyDatabase();
  await made.database.migrate.latest({ migrationSource });
  return made;
}
