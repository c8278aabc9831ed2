import { vi } from 'vitest';

/** One request that the page made. */
export interface SeenRequest {
  readonly method: string;
  readonly path: string;
  readonly headers: Headers;
  readonly body: string;
}

/** Answers in the server's place, by method and path; what it does not know cannot be reached. */
export function standInServer(answers: Readonly<Record<string, (request: SeenRequest) => Response>>) {
  const seen: SeenRequest[] = [];
  vi.stubGlobal('fetch', async (input: string | URL | Request, init: RequestInit = {}) => {
    const { pathname } = new URL(String(input instanceof Request ? input.url : input), 'http://localhost');
    const request: SeenRequest = {
      method: (init.method ?? 'GET').toUpperCase(),
      path: pathname,
      headers: new Headers(init.headers),
      body: String(init.body ?? ''),
    };
    seen.push(request);
    const answer = answers[`${request.method} ${pathname}`];
    if (!answer) throw new TypeError('fetch failed');
    return answer(request);
  });
  return seen;
}

export function json(value: unknown, status = 200, mediaType = 'application/json'): Response {
  return new Response(JSON.stringify(value), { status, headers: { 'content-type': mediaType } });
}
