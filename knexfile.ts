import { fileURLToPath } from 'node:url';
import type { Knex } from 'knex';
import { connectionConfig } from './db/client';

function here(path: string): string {
  return fileURLToPath(new URL(path, import.meta.url));
}

/** Knex's settings with migrations, for a PostgreSQL at `url`. Needs tsx: migrations are TypeScript. */
export function migrationConfig(url: string): Knex.Config {
  return {
    ...connectionConfig(url),
    migrations: { directory: here('./db/migrations'), extension: 'ts', loadExtensions: ['.ts'] },
  };
}

/** For Knex's command line: `tsx node_modules/knex/bin/cli.js migrate:latest`. */
export default migrationConfig(process.env.DATABASE_URL ?? '');
