import { Refusal } from '../refusal';

const SAFE_METHODS = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses a change that a page of another site asked a signed-in browser for. Browsers state where a request
 * comes from and no page can make them lie; callers that are no browser carry no foreign cookies and state
 * nothing.
 */
export function demandOwnOrigin(request: Request, ownOrigin: string | null): void {
  if (SAFE_METHODS.includes(request.method)) return;
  const refusal = new Refusal({ code: 'foreign-origin' });
  const site = request.headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin' && site !== 'none') throw refusal;
  const origin = request.headers.get('origin');
  if (origin === null || origin === ownOrigin) return;
  const host = request.headers.get('host') ?? new URL(request.url).host;
  if (!URL.canParse(origin) || new URL(origin).host !== host) throw refusal;
}
