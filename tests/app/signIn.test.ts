import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { signIn } from '@/app/_server/operations/people/signIn';
import { hashPassword, PASSWORD_COST, verifyPassword } from '@/app/_server/password';
import { cheapPasswords } from '../support/cheapPasswords';
import { createTestDatabase, type TestDatabase } from '../support/testDatabase';
import { insertPerson, PASSWORD } from '../support/world';

let test: TestDatabase;
let personId: string;

beforeAll(async () => {
  test = await createTestDatabase();
  personId = await insertPerson(test.database, 'person');
});

afterAll(async () => {
  await test.drop();
});

beforeEach(async () => {
  await test.database('sign_in_attempts').delete();
});

async function attempt(
  password: string,
  { email = 'person@example.test', address = '192.0.2.1' as string | null } = {},
) {
  return (await signIn(test.database, { email, password, address })).kind;
}

async function failTimes(times: number, address: string | null = '192.0.2.1') {
  for (let count = 0; count < times; count += 1) expect(await attempt('wrong', { address })).toBe('refused');
}

describe('signing in', () => {
  it('takes the right password, the address in any case, and notes it in the audit log', async () => {
    const result = await signIn(test.database, {
      email: 'PERSON@Example.Test',
      password: PASSWORD,
      address: '192.0.2.1',
    });
    expect(result).toEqual({
      kind: 'signed-in',
      person: { id: personId, email: 'person@example.test', name: 'person' },
    });
    const entry = await test.database('audit_log').orderBy('id', 'desc').first();
    expect(entry).toMatchObject({ action: 'person.signin', person_id: personId, address: '192.0.2.1' });
  });

  it('refuses a wrong password and an unknown address alike', async () => {
    expect(await attempt('wrong')).toBe('refused');
    expect(await attempt(PASSWORD, { email: 'nobody@example.test' })).toBe('refused');
    expect(await attempt(PASSWORD, { email: "' or true --@example.test" })).toBe('refused');
  });

  it('refuses even the right password after ten wrong ones from one place, but not from another', async () => {
    await failTimes(10);
    expect(await attempt(PASSWORD)).toBe('too-many-attempts');
    expect(await attempt(PASSWORD, { address: '198.51.100.2' })).toBe('signed-in');
    expect(await attempt(PASSWORD)).toBe('too-many-attempts');
  });

  it('counts from anew after a success', async () => {
    await failTimes(9);
    expect(await attempt(PASSWORD)).toBe('signed-in');
    await failTimes(10);
    expect(await attempt(PASSWORD)).toBe('too-many-attempts');
  });

  it('stops guessing from ever new places, and counts a place that is not known as one', async () => {
    for (let place = 0; place < 5; place += 1) await failTimes(10, `198.51.100.${place}`);
    expect(await attempt(PASSWORD, { address: '203.0.113.9' })).toBe('too-many-attempts');
    await test.database('sign_in_attempts').delete();
    await failTimes(10, null);
    expect(await attempt(PASSWORD, { address: null })).toBe('too-many-attempts');
  });

  it('lets no burst of parallel tries through', async () => {
    const kinds = await Promise.all(Array.from({ length: 40 }, () => attempt('wrong')));
    expect(kinds.filter((kind) => kind === 'refused')).toHaveLength(10);
    expect(kinds.filter((kind) => kind === 'too-many-attempts')).toHaveLength(30);
  });

  it('forgives after the window, and forgets after a day', async () => {
    await failTimes(10);
    await test.database.raw("update sign_in_attempts set at = at - interval '16 minutes'");
    expect(await attempt(PASSWORD)).toBe('signed-in');
    await test.database.raw("update sign_in_attempts set at = at - interval '2 days'");
    await attempt('wrong');
    expect(await test.database('sign_in_attempts').count({ total: '*' })).toEqual([{ total: '1' }]);
  });
});

describe('a password hash', () => {
  it('fits its password alone, is salted, and states its own cost', async () => {
    const hash = await hashPassword(PASSWORD, cheapPasswords);
    expect(await verifyPassword(PASSWORD, hash)).toBe(true);
    expect(await verifyPassword(`${PASSWORD} `, hash)).toBe(false);
    expect(await hashPassword(PASSWORD, cheapPasswords)).not.toBe(hash);
    expect(hash).toMatch(/^\$scrypt\$ln=4,r=1,p=1\$/);
    const costly = await hashPassword(PASSWORD);
    expect(costly).toContain(`$ln=${PASSWORD_COST.logN},r=${PASSWORD_COST.r},p=${PASSWORD_COST.p}$`);
    expect(await verifyPassword(PASSWORD, costly)).toBe(true);
  });

  it('reads a password the same however its accents were typed', async () => {
    const hash = await hashPassword('caf\u00e9', cheapPasswords);
    expect(await verifyPassword('cafe\u0301', hash)).toBe(true);
  });

  it.each([
    [''],
    ['$scrypt$'],
    ['plain'],
    ['$scrypt$ln=4,r=1,p=1$salt$'],
    ['$scrypt$ln=99,r=99,p=99$c2FsdA$a2V5'],
  ])('in the form "%s" fits nothing', async (hash) => {
    await expect(verifyPassword('', hash).catch(() => false)).resolves.toBe(false);
  });
});
