import type { Knex } from 'knex';
import { auditLogRepository } from '@/db/repositories/auditLog';
import { type Person, peopleRepository } from '@/db/repositories/people';
import { type RecentFailures, signInAttemptsRepository } from '@/db/repositories/signInAttempts';
import { DECOY_HASH, verifyPassword } from '../../password';

/** Tries are counted over this many minutes. */
const WINDOW_MINUTES = 15;

/**
 * Wrong tries allowed within the window. From one place for one account: enough for anyone's typing errors. From
 * anywhere for one account: stops guessing from many places, and is wide enough that nobody locks a colleague out
 * by accident. From one place for any account: a whole studio may sit behind one address.
 */
const MOST_FAILURES: RecentFailures = { byEmailAndAddress: 10, byEmail: 50, byAddress: 200 };

/** How a try to sign in ended. */
export type SignInResult =
  | { readonly kind: 'signed-in'; readonly person: Person }
  | { readonly kind: 'refused' }
  | { readonly kind: 'too-many-attempts' };

/**
 * Checks an address and password. A wrong password and an unknown address are told apart neither by the answer
 * nor by its time; too many wrong tries are refused unchecked, also when the password would have been right.
 */
export async function signIn(
  database: Knex,
  attempt: { readonly email: string; readonly password: string; readonly address: string | null },
): Promise<SignInResult> {
  const attempts = signInAttemptsRepository(database);
  await attempts.forgetOld();
  const { id, failures } = await attempts.note(attempt, WINDOW_MINUTES);
  if (
    failures.byEmailAndAddress > MOST_FAILURES.byEmailAndAddress ||
    failures.byEmail > MOST_FAILURES.byEmail ||
    failures.byAddress > MOST_FAILURES.byAddress
  ) {
    return { kind: 'too-many-attempts' };
  }
  const found = await peopleRepository(database).findByEmail(attempt.email);
  const fits = await verifyPassword(attempt.password, found?.passwordHash ?? DECOY_HASH);
  if (!found || !fits) return { kind: 'refused' };
  await attempts.markSucceeded(id);
  await auditLogRepository(database).append({
    personId: found.id,
    action: 'person.signin',
    subjectType: 'person',
    subjectId: found.id,
    showId: null,
    address: attempt.address,
  });
  return { kind: 'signed-in', person: { id: found.id, email: found.email, name: found.name } };
}
