import type { Knex } from 'knex';
import { sha256Hex } from '@/compiler/index';
import { idempotencyKeysRepository } from '@/db/repositories/idempotencyKeys';
import { Refusal } from './refusal';

/** What identifies a request that may come twice. */
export interface IdempotentRequest {
  readonly personId: string;
  /** The caller's Idempotency-Key; without one the work is simply done. */
  readonly key: string | undefined;
  /** All that the request asks for; the same key with something else is refused. */
  readonly asked: unknown;
}

/**
 * Does the work once per key: within the transaction that does it the answer is kept, and the same request sent
 * again is given that answer. Nothing is kept of work that is refused.
 */
export async function idempotent<Answer>(
  transaction: Knex.Transaction,
  { personId, key, asked }: IdempotentRequest,
  isAnswer: (stored: unknown) => stored is Answer,
  work: () => Promise<Answer>,
): Promise<Answer> {
  if (key === undefined) return work();
  const keys = idempotencyKeysRepository(transaction);
  const claim = { personId, key, requestHash: sha256Hex(JSON.stringify(asked)) };
  await keys.forgetOld();
  const earlier = await keys.claim(claim);
  if (!earlier) {
    const answer = await work();
    await keys.storeAnswer(claim, answer);
    return answer;
  }
  if (earlier.requestHash !== claim.requestHash || !isAnswer(earlier.answer)) {
    throw new Refusal({ code: 'idempotency-key-reused' });
  }
  return earlier.answer;
}
