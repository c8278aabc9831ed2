import { fileURLToPath } from 'node:url';
import type { Knex } from 'knex';
import { connectionConfig } from './db/client';

/**
 * For Knex's command line, run through tsx: `tsx node_modules/knex/bin/cli.js migrate:make name`. Programs use
 * `db/migrationSource.ts`, which lists the same files under the same names.
 */
const config: Knex.Config = {
  ...connectionConfig(process.env.DATABASE_URL ?? ''),
  migrations: {
    directory: fileURLToPath(new URL('./db/migrations', import.meta.url)),
    extension: 'ts',
    loadExtensions: ['.ts'],
  },
};

export default config;
