import type { ExpectedDraft } from '../operations/drafts/writeDraft';
import { Refusal } from '../refusal';

/** The revision an ETag of a draft names; one that names none is no draft's, and so equals none. */
function revisionOf(etag: string): number {
  const [, digits] = etag.trim().match(/^"(\d{1,15})"$/) ?? [];
  return digits === undefined ? -1 : Number(digits);
}

/** What the writer of a draft expects to find, from If-Match or If-None-Match; refused when neither says. */
export function expectedDraft(headers: Headers): ExpectedDraft {
  const match = headers.get('if-match');
  if (match !== null) return { kind: 'revision', revision: revisionOf(match) };
  if (headers.get('if-none-match')?.trim() === '*') return { kind: 'none' };
  throw new Refusal({ code: 'precondition-required' });
}

/** The revision that If-Match names, or undefined without one. */
export function expectedRevision(headers: Headers): number | undefined {
  const match = headers.get('if-match');
  return match === null ? undefined : revisionOf(match);
}

/** The Idempotency-Key, or undefined without one; refused when it is of no sensible form. */
export function idempotencyKeyOf(headers: Headers): string | undefined {
  const key = headers.get('idempotency-key') ?? undefined;
  if (key !== undefined && !/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw new Refusal({
      code: 'bad-request',
      detail: 'An Idempotency-Key has 1 to 200 visible ASCII characters.',
    });
  }
  return key;
}
