import { invariant } from '../findings/invariant';

/** The shortest decimal text that reads back as the same double (ECMAScript Number::toString); −0 prints as 0. */
export function printNumber(value: number): string {
  invariant(Number.isFinite(value), 'only finite numbers are emitted');
  return value === 0 ? '0' : String(value);
}
