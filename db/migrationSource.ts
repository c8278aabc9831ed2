import { readdir } from 'node:fs/promises';
import type { Knex } from 'knex';

const FOLDER = new URL('./migrations/', import.meta.url);

function isMigration(module: unknown): module is Knex.Migration {
  return typeof module === 'object' && module !== null && 'up' in module && 'down' in module;
}

/**
 * The migrations of `db/migrations` in order, under the names that Knex's own command line writes into the
 * history. Imports them itself, so that it works wherever TypeScript can be imported: tsx and the tests alike.
 */
export const migrationSource: Knex.MigrationSource<string> = {
  async getMigrations() {
    return (await readdir(FOLDER)).filter((name) => name.endsWith('.ts')).sort();
  },
  getMigrationName(name) {
    return name;
  },
  async getMigration(name) {
    const migration: unknown = await import(/* @vite-ignore */ new URL(name, FOLDER).href);
    if (!isMigration(migration)) throw new Error(`${name} exports no up and down`);
    return migration;
  },
};
