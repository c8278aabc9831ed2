import { seedDemo } from '../app/_server/demo/seedDemo';
import { createDatabase } from '../db/client';
import { migrationSource } from '../db/migrationSource';

/**
 * Brings the database at DATABASE_URL to the newest schema; with `--demo` also fills in what is missing of the
 * demo. Safe to run at every start.
 */
const database = createDatabase(process.env.DATABASE_URL ?? '');
try {
  await database.migrate.latest({ migrationSource });
  if (process.argv.includes('--demo')) await seedDemo(database);
} finally {
  await database.destroy();
}
