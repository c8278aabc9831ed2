import type { Draft } from '@/app/api/v1/_contracts/draft';
import type { InputIssue } from '@/app/api/v1/_contracts/problem';
import type { NewestVersion } from '@/app/api/v1/_contracts/version';
import type { Finding } from '@/compiler/index';

/** An expected no, with all the person needs to go on. */
export type RefusalReason =
  | { readonly code: 'bad-request'; readonly detail: string }
  | { readonly code: 'invalid-input'; readonly issues: readonly InputIssue[] }
  | { readonly code: 'invalid-cursor' }
  | { readonly code: 'not-signed-in' }
  | { readonly code: 'forbidden' }
  | { readonly code: 'foreign-origin' }
  | { readonly code: 'not-found' }
  | { readonly code: 'draft-not-found' }
  | { readonly code: 'method-not-allowed'; readonly allowed: readonly string[] }
  | { readonly code: 'name-taken'; readonly name: string }
  | { readonly code: 'stale-parent'; readonly newest: NewestVersion }
  | { readonly code: 'idempotency-key-reused' }
  | { readonly code: 'draft-changed'; readonly draft: Draft | null }
  | { readonly code: 'precondition-required' }
  | { readonly code: 'body-too-large'; readonly maximumBytes: number }
  | { readonly code: 'unsupported-media-type'; readonly expected: string }
  | { readonly code: 'recipe-has-errors'; readonly findings: readonly Finding[] }
  | { readonly code: 'not-ready' };

/** Thrown by operations for what callers must expect; everything else that is thrown is a fault of ours. */
export class Refusal extends Error {
  constructor(readonly reason: RefusalReason) {
    super(reason.code);
    this.name = 'Refusal';
  }
}
