import { randomBytes, type ScryptOptions, scrypt, timingSafeEqual } from 'node:crypto';

/** Cost of one scrypt (RFC 7914): 2^logN blocks of r × 128 bytes, p times over. */
export interface PasswordCost {
  readonly logN: number;
  readonly r: number;
  readonly p: number;
}

/** 32 MiB and about a quarter of a second on one core; one of the settings OWASP's password sheet names (from memory). */
export const PASSWORD_COST: PasswordCost = { logN: 15, r: 8, p: 3 };

const KEY_BYTES = 32;
const SALT_BYTES = 16;

function derive(password: string, salt: Buffer, { logN, r, p }: PasswordCost): Promise<Buffer> {
  const options: ScryptOptions = { N: 2 ** logN, r, p, maxmem: 256 * 2 ** logN * r };
  return new Promise((resolve, reject) => {
    scrypt(password.normalize('NFC'), salt, KEY_BYTES, options, (error, key) =>
      error ? reject(error) : resolve(key),
    );
  });
}

function format({ logN, r, p }: PasswordCost, salt: Buffer, key: Buffer): string {
  return `$scrypt$ln=${logN},r=${r},p=${p}$${salt.toString('base64url')}$${key.toString('base64url')}`;
}

/**
 * A hash of the usual cost that no password fits: checked when an address is unknown, so that this takes as long
 * as a wrong password.
 */
export const DECOY_HASH = format(PASSWORD_COST, Buffer.alloc(SALT_BYTES), Buffer.alloc(KEY_BYTES));

/** Hashes a password under a fresh salt; salt and cost stand in the hash, so that the cost can rise later. */
export async function hashPassword(password: string, cost: PasswordCost = PASSWORD_COST): Promise<string> {
  const salt = randomBytes(SALT_BYTES);
  const key = await derive(password, salt, cost);
  return format(cost, salt, key);
}

/** Whether the password is the one that was hashed; false for a hash in no form of ours. */
export async function verifyPassword(password: string, hash: string): Promise<boolean> {
  const parts = hash.match(/^\$scrypt\$ln=(\d{1,2}),r=(\d{1,2}),p=(\d{1,2})\$([\w-]+)\$([\w-]+)$/);
  const [, logN, r, p, salt, key] = parts ?? [];
  if (!logN || !r || !p || !salt || !key) return false;
  const cost = { logN: Number(logN), r: Number(r), p: Number(p) };
  const expected = Buffer.from(key, 'base64url');
  const derived = await derive(password, Buffer.from(salt, 'base64url'), cost);
  return expected.length === derived.length && timingSafeEqual(expected, derived);
}
