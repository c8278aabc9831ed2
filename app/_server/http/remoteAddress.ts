import { isIP } from 'node:net';

/**
 * The address the request came from, or null. The last entry is the one that the nearest server wrote itself; the
 * ones before it are what the sender claims.
 */
export function remoteAddress(headers: Headers): string | null {
  const last = headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() ?? '';
  return isIP(last) ? last : null;
}
