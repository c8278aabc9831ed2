import { type NextRequest, NextResponse } from 'next/server';
import { sessionPerson } from './app/_server/auth/sessionPerson';
import { isDevelopment, readEnvironment } from './app/_server/env';
import { contentSecurityPolicy } from './app/_server/http/contentSecurityPolicy';
import { problemResponse } from './app/_server/http/problems';
import { requestIdOf } from './app/_server/http/requestId';
import { Refusal } from './app/_server/refusal';

/** Addresses that need no session; everything else does. */
const PUBLIC = [/^\/sign-in$/, /^\/api\/auth\//, /^\/api\/v1\/(health|ready|openapi\.json)$/];

/** Under the application's own origin where that is stated: Next writes every loopback address as `localhost`. */
function signInAddress({ nextUrl }: NextRequest): URL {
  const address = new URL('/sign-in', readEnvironment().origin ?? nextUrl.origin);
  address.searchParams.set('callbackUrl', `${nextUrl.pathname}${nextUrl.search}`);
  return address;
}

/**
 * Comes before every page and API call: sends those without a session to sign in (pages) or tells them so (API),
 * and sets the Content-Security-Policy with a nonce of this one answer. What a signed-in person may do is not
 * decided here but beside the data.
 */
export async function proxy(request: NextRequest): Promise<Response> {
  const { pathname } = request.nextUrl;
  const isPublic = PUBLIC.some((pattern) => pattern.test(pathname));
  if (!isPublic && (await sessionPerson(request)) === null) {
    return pathname.startsWith('/api/')
      ? problemResponse(new Refusal({ code: 'not-signed-in' }), requestIdOf(request))
      : NextResponse.redirect(signInAddress(request));
  }

  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64');
  const policy = contentSecurityPolicy(nonce, { allowEval: isDevelopment() });
  const headers = new Headers(request.headers);
  // Next reads the nonce for its own scripts from the request's policy.
  headers.set('content-security-policy', policy);
  headers.set('x-nonce', nonce);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
}

export const config = {
  // Not for what the build made and the few files at the root: they are the same for everybody.
  matcher: ['/((?!_next/static/|_next/image|[^/]+\\.(?:ico|svg|png|txt|webmanifest)$).*)'],
};
