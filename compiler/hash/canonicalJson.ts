import canonicalize from 'canonicalize';
import { invariant } from '../findings/invariant';

/**
 * The canonical JSON text of a plain value (RFC 8785): keys sorted, numbers shortest, no spaces. The value must be
 * JSON: anything else (undefined at the top, NaN, infinities) is a bug of the caller and throws.
 */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value);
  invariant(text !== undefined, 'canonicalJson was given a value that JSON cannot hold');
  return text;
}
