import { NEWEST_MIGRATION } from '@/db/newestMigration';
import type { Caller } from '../../caller';
import { log } from '../../log';
import { Refusal } from '../../refusal';

/** Refuses as not ready when the database does not answer or lacks the newest migration. */
export async function checkReadiness({ database }: Caller): Promise<void> {
  let isMigrated = false;
  try {
    const { rows } = await database.raw<{ rows: unknown[] }>('select 1 from knex_migrations where name = ?', [
      NEWEST_MIGRATION,
    ]);
    isMigrated = rows.length > 0;
  } catch (cause) {
    log('error', 'readiness.failed', { cause: cause instanceof Error ? cause.message : String(cause) });
  }
  if (!isMigrated) throw new Refusal({ code: 'not-ready' });
}
