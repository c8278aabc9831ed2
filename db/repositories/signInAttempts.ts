import type { Knex } from 'knex';
import '../tables';

/** Failed tries of the last minutes, the one just noted included. */
export interface RecentFailures {
  readonly byEmailAndAddress: number;
  readonly byEmail: number;
  readonly byAddress: number;
}

/** Tries to sign in. */
export function signInAttemptsRepository(database: Knex) {
  return {
    /**
     * Notes a try as failed, before its password is even looked at, and counts the recent failures with it. A lock
     * on the address lets parallel tries be counted one after the other, so that a burst cannot slip through.
     */
    async note(
      attempt: { readonly email: string; readonly address: string | null },
      windowMinutes: number,
    ): Promise<{ readonly id: string; readonly failures: RecentFailures }> {
      return database.transaction(async (transaction) => {
        const email = attempt.email.toLowerCase();
        await transaction.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [email]);
        const [row] = await transaction('sign_in_attempts')
          .insert({ email, address: attempt.address })
          .returning('id');
        if (!row) throw new Error('the database returned no row for a sign-in attempt');
        const counted = await transaction.raw<{ rows: [RecentFailures] }>(
          `select
             cast(count(*) filter (where email = :email and address is not distinct from cast(:address as inet)) as int)
               as "byEmailAndAddress",
             cast(count(*) filter (where email = :email) as int) as "byEmail",
             cast(count(*) filter (where address = cast(:address as inet)) as int) as "byAddress"
           from sign_in_attempts
           where not cleared and at > now() - make_interval(mins => :windowMinutes)
             and (email = :email or address = cast(:address as inet))`,
          { email, address: attempt.address, windowMinutes },
        );
        return { id: row.id, failures: counted.rows[0] };
      });
    },

    /** The try was right after all; the person's earlier failures from that address no longer count. */
    async markSucceeded(id: string): Promise<void> {
      await database.raw(
        `update sign_in_attempts as earlier set cleared = true
         from sign_in_attempts as this
         where this.id = ? and earlier.email = this.email
           and earlier.address is not distinct from this.address and not earlier.cleared`,
        [id],
      );
    },

    /** Forgets tries older than a day, as long as nobody else is at it. */
    async forgetOld(): Promise<void> {
      await database.raw(
        `delete from sign_in_attempts where id in (
           select id from sign_in_attempts
           where at < now() - interval '1 day' limit 1000 for update skip locked)`,
      );
    },
  };
}
