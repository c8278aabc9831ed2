import type { Problem, ProblemCode } from '@/app/api/v1/_contracts/problem';
import { Refusal, type RefusalReason } from '../refusal';

/** Status and words of every problem; the detail says what to do where the reason has no more to tell. */
const PROBLEMS: Readonly<Record<ProblemCode, { status: number; title: string; detail: string }>> = {
  'bad-request': { status: 400, title: 'Request not understood', detail: 'The request could not be read.' },
  'invalid-input': {
    status: 422,
    title: 'Input not valid',
    detail: 'Some of what was sent is not as it must be; see issues.',
  },
  'invalid-cursor': {
    status: 400,
    title: 'Cursor not valid',
    detail: 'Begin again without a cursor, or keep sort and direction as they were when it was given.',
  },
  'not-signed-in': { status: 401, title: 'Not signed in', detail: 'Sign in and try again.' },
  forbidden: {
    status: 403,
    title: 'Not allowed',
    detail: 'Your role in this show does not allow this. Ask one of its administrators.',
  },
  'foreign-origin': {
    status: 403,
    title: 'Request from another site',
    detail: 'Changes are only accepted from the pages of this application.',
  },
  'not-found': {
    status: 404,
    title: 'Not found',
    detail: 'There is nothing here, or nothing that you may see.',
  },
  'draft-not-found': { status: 404, title: 'No draft', detail: 'You have no draft of this recipe.' },
  'method-not-allowed': {
    status: 405,
    title: 'Method not allowed',
    detail: 'Use one of the methods the Allow header lists.',
  },
  'name-taken': {
    status: 409,
    title: 'Name taken',
    detail: 'The show has a recipe of that name. Choose another one.',
  },
  'stale-parent': {
    status: 409,
    title: 'A newer version exists',
    detail:
      'Somebody saved a version after the one this text was made from. Compare both, then save on top of the newest.',
  },
  'idempotency-key-reused': {
    status: 422,
    title: 'Idempotency key used before',
    detail: 'The same Idempotency-Key came with a different request. Use a new key for each new request.',
  },
  'draft-changed': {
    status: 412,
    title: 'Draft changed elsewhere',
    detail: 'Another window stored this draft meanwhile; draft holds what is stored now.',
  },
  'precondition-required': {
    status: 428,
    title: 'Precondition required',
    detail: 'Send If-Match with the ETag of the draft, or If-None-Match: * when there is none yet.',
  },
  'body-too-large': { status: 413, title: 'Body too large', detail: 'Send less.' },
  'unsupported-media-type': {
    status: 415,
    title: 'Media type not supported',
    detail: 'Send application/json.',
  },
  'recipe-has-errors': {
    status: 422,
    title: 'The recipe has errors',
    detail: 'A recipe is only built when it has no errors; see findings.',
  },
  'internal-error': {
    status: 500,
    title: 'Something went wrong here',
    detail: 'The fault is ours and has been noted under the request id.',
  },
  'not-ready': {
    status: 503,
    title: 'Not ready',
    detail: 'The database does not answer or lacks a migration. Try again soon.',
  },
};

/** What a reason adds to the words of its code. */
function extrasOf(reason: RefusalReason): Partial<Problem> {
  switch (reason.code) {
    case 'bad-request':
      return { detail: reason.detail };
    case 'invalid-input':
      return { issues: [...reason.issues] };
    case 'name-taken':
      return { detail: `The show has a recipe named "${reason.name}". Choose another name.` };
    case 'stale-parent':
      return { newest: reason.newest };
    case 'draft-changed':
      return { draft: reason.draft };
    case 'body-too-large':
      return { detail: `The body may have at most ${reason.maximumBytes} bytes.` };
    case 'unsupported-media-type':
      return { detail: `Send ${reason.expected}.` };
    case 'recipe-has-errors':
      return { findings: reason.findings.map(toPlainFinding) };
    default:
      return {};
  }
}

function toPlainFinding(
  finding: Extract<RefusalReason, { code: 'recipe-has-errors' }>['findings'][number],
): NonNullable<Problem['findings']>[number] {
  const { fix, related, ...rest } = finding;
  return {
    ...rest,
    related: [...related],
    ...(fix ? { fix: { ...fix, edits: [...fix.edits] } } : {}),
  };
}

function headersOf(reason: RefusalReason | undefined): Record<string, string> {
  if (reason?.code === 'method-not-allowed') return { allow: reason.allowed.join(', ') };
  if (reason?.code === 'draft-changed' && reason.draft) return { etag: `"${reason.draft.revision}"` };
  return {};
}

/**
 * The answer (RFC 9457) to anything that was thrown: an expected refusal in its own words, everything else as one
 * and the same internal error, without a word about its cause.
 */
export function problemResponse(thrown: unknown, requestId: string): Response {
  const reason = thrown instanceof Refusal ? thrown.reason : undefined;
  const code = reason?.code ?? 'internal-error';
  const { status, title, detail } = PROBLEMS[code];
  const problem: Problem = {
    type: `urn:pintle:problem:${code}`,
    title,
    status,
    detail,
    code,
    requestId,
    ...(reason ? extrasOf(reason) : {}),
  };
  return new Response(JSON.stringify(problem), {
    status,
    headers: {
      'content-type': 'application/problem+json',
      'cache-control': 'no-store',
      'x-request-id': requestId,
      ...headersOf(reason),
    },
  });
}

/** The HTTP status of a problem code. */
export function problemStatus(code: ProblemCode): number {
  return PROBLEMS[code].status;
}

/** The title of a problem code. */
export function problemTitle(code: ProblemCode): string {
  return PROBLEMS[code].title;
}
