import type { PasswordCost } from '@/app/_server/password';

/** Hashing that takes no time; the cost stands in each hash, so checking it works as with the real one. */
export const cheapPasswords: PasswordCost = { logN: 4, r: 1, p: 1 };
