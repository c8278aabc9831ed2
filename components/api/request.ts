import type { Problem } from '@/app/api/v1/_contracts/problem';
import { ApiProblem } from './ApiProblem';

export interface RequestOptions {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'DELETE';
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
  readonly signal?: AbortSignal;
  /** Whether the request goes on when its page is left; only for small bodies. */
  readonly keepalive?: boolean;
}

/**
 * Asks the API (a path below /api/v1) and gives the JSON of its answer. A refusal throws an `ApiProblem`; a server
 * that cannot be reached throws what `fetch` throws.
 */
export async function requestJson<Answer>(path: string, options: RequestOptions = {}): Promise<Answer> {
  const { method = 'GET', body, headers = {}, signal, keepalive = false } = options;
  const response = await fetch(`/api/v1${path}`, {
    method,
    keepalive,
    headers: { ...headers, ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal ? { signal } : {}),
  });
  if (!response.ok) throw new ApiProblem((await response.json()) as Problem);
  return (response.status === 204 ? undefined : await response.json()) as Answer;
}
