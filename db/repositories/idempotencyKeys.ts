import type { Knex } from 'knex';
import '../tables';

/** A caller's own name for one request, and the hash of what the request asked. */
export interface IdempotencyClaim {
  readonly personId: string;
  readonly key: string;
  readonly requestHash: string;
}

/** What was stored under a key before. */
export interface EarlierRequest {
  readonly requestHash: string;
  readonly answer: unknown;
}

/** Answers given to requests that may be sent again. Use within the transaction that does the work. */
export function idempotencyKeysRepository(transaction: Knex.Transaction) {
  const keyOf = ({ personId, key }: IdempotencyClaim) => ({ person_id: personId, key });

  return {
    /**
     * Takes the key, or returns the earlier request that has it. A request still under way elsewhere is waited
     * for, because the database holds the second insert until the first transaction ends.
     */
    async claim(claim: IdempotencyClaim): Promise<EarlierRequest | undefined> {
      const taken = await transaction('idempotency_keys')
        .insert({ ...keyOf(claim), request_hash: claim.requestHash, answer: null })
        .onConflict(['person_id', 'key'])
        .ignore()
        .returning('key');
      if (taken.length > 0) return undefined;
      const row = await transaction('idempotency_keys').where(keyOf(claim)).first('request_hash', 'answer');
      if (!row) throw new Error('an idempotency key vanished while it was being claimed');
      return { requestHash: row.request_hash, answer: row.answer };
    },

    /** Forgets keys older than a day, as long as nobody else is at it. */
    async forgetOld(): Promise<void> {
      await transaction.raw(
        `delete from idempotency_keys where (person_id, key) in (
           select person_id, key from idempotency_keys
           where created_at < now() - interval '1 day' limit 100 for update skip locked)`,
      );
    },

    /** Keeps the answer for the next time the same request comes. */
    async storeAnswer(claim: IdempotencyClaim, answer: unknown): Promise<void> {
      await transaction('idempotency_keys')
        .where(keyOf(claim))
        .update({ answer: JSON.stringify(answer) });
    },
  };
}
