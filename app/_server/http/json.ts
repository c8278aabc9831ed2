import { sha256Hex } from '@/compiler/index';

/** What an answer may add to its JSON. */
export interface JsonOptions {
  readonly status?: number;
  readonly headers?: Readonly<Record<string, string>>;
}

/** An answer in JSON that no cache keeps. */
export function json(value: unknown, { status = 200, headers = {} }: JsonOptions = {}): Response {
  return new Response(JSON.stringify(value), {
    status,
    headers: { 'content-type': 'application/json', 'cache-control': 'no-store', ...headers },
  });
}

/** JSON with an ETag made from its content; 304 without a body when the caller has just that already. */
export function jsonWithEtag(request: Request, value: unknown): Response {
  const etag = `"${sha256Hex(JSON.stringify(value)).slice(0, 32)}"`;
  const headers = { etag, 'cache-control': 'private, no-cache' };
  const known = request.headers
    .get('if-none-match')
    ?.split(',')
    .map((tag) => tag.trim().replace(/^W\//, ''));
  return known?.includes(etag) ? new Response(null, { status: 304, headers }) : json(value, { headers });
}
