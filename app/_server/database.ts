import type { Knex } from 'knex';
import { createDatabase } from '@/db/client';
import { readEnvironment } from './env';

/**
 * Kept on the global object, not in the module: Next bundles routes and pages apart, so that a module may be
 * there more than once in one process, while the pool of connections must not.
 */
const POOL = Symbol.for('pintle.database');
const holder = globalThis as typeof globalThis & { [POOL]?: Knex };

/** The application's pool of connections, opened at the first call. */
export function applicationDatabase(): Knex {
  holder[POOL] ??= createDatabase(readEnvironment().databaseUrl);
  return holder[POOL];
}
