import type { Knex } from 'knex';
import '../tables';

export interface AuditEntry {
  readonly personId: string | null;
  /** What was done, noun first: `version.save`. */
  readonly action: string;
  readonly subjectType: string;
  readonly subjectId: string | null;
  readonly showId: string | null;
  /** The network address it came from, if known. */
  readonly address: string | null;
  readonly details?: Readonly<Record<string, string | number>>;
}

/** Who did what from where; only ever added to. */
export function auditLogRepository(database: Knex) {
  return {
    async append(entry: AuditEntry): Promise<void> {
      await database('audit_log').insert({
        person_id: entry.personId,
        action: entry.action,
        subject_type: entry.subjectType,
        subject_id: entry.subjectId,
        show_id: entry.showId,
        address: entry.address,
        details: JSON.stringify(entry.details ?? {}),
      });
    },
  };
}
