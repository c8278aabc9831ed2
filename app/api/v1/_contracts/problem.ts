import { z } from 'zod';
import { draftSchema } from './draft';
import { findingSchema } from './finding';
import { newestVersionSchema } from './version';

/** Every way the API says no. The last part of a problem's `type` is one of these. */
export const problemCodeSchema = z.enum([
  'bad-request',
  'invalid-input',
  'invalid-cursor',
  'not-signed-in',
  'forbidden',
  'foreign-origin',
  'not-found',
  'draft-not-found',
  'method-not-allowed',
  'name-taken',
  'stale-parent',
  'idempotency-key-reused',
  'draft-changed',
  'precondition-required',
  'body-too-large',
  'unsupported-media-type',
  'recipe-has-errors',
  'internal-error',
  'not-ready',
]);
export type ProblemCode = z.infer<typeof problemCodeSchema>;

/** What was wrong with one part of the request; `path` leads to it, e.g. `["body", "title"]`. */
export const inputIssueSchema = z.object({
  path: z.array(z.union([z.string(), z.number()])),
  message: z.string(),
});
export type InputIssue = z.infer<typeof inputIssueSchema>;

/** An answer of media type application/problem+json (RFC 9457). */
export const problemSchema = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.number().int(),
    detail: z.string(),
    /** The same as the end of `type`, so that callers need not take an address apart. */
    code: problemCodeSchema,
    requestId: z.string(),
    /** With `invalid-input`. */
    issues: z.array(inputIssueSchema).optional(),
    /** With `stale-parent`: the version somebody saved meanwhile. */
    newest: newestVersionSchema.optional(),
    /** With `draft-changed`: the draft as it is stored now; null when there is none any more. */
    draft: draftSchema.nullable().optional(),
    /** With `recipe-has-errors`. */
    findings: z.array(findingSchema).optional(),
  })
  .meta({ id: 'Problem' });
export type Problem = z.infer<typeof problemSchema>;
