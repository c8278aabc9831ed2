import { NextRequest } from 'next/server';
import { beforeAll, describe, expect, it } from 'vitest';
import { problemSchema } from '@/app/api/v1/_contracts/problem';
import { proxy } from '@/proxy';
import { ORIGIN, sessionCookie } from '../support/api';

beforeAll(() => {
  process.env.DATABASE_URL = 'postgres://nobody@127.0.0.1:1/nothing';
  process.env.NEXTAUTH_SECRET = 'a secret for tests';
  process.env.NEXTAUTH_URL = ORIGIN;
});

async function send(path: string, headers: Record<string, string> = {}): Promise<Response> {
  return proxy(new NextRequest(`${ORIGIN}${path}`, { headers }));
}

const signedIn = async () => ({ cookie: await sessionCookie(crypto.randomUUID()) });

function nonceOf(response: Response): string | undefined {
  return response.headers.get('content-security-policy')?.match(/'nonce-([^']+)'/)?.[1];
}

describe('the proxy', () => {
  it('sends people without a session to sign in and back to where they wanted to go', async () => {
    const response = await send('/recipes/1?from=1&to=2');
    expect(response.status).toBe(307);
    const target = new URL(response.headers.get('location') ?? '');
    expect([target.origin, target.pathname]).toEqual([ORIGIN, '/sign-in']);
    expect(target.searchParams.get('callbackUrl')).toBe('/recipes/1?from=1&to=2');
  });

  it('answers API calls without a session with a problem, known addresses and unknown ones', async () => {
    for (const path of ['/api/v1/me', '/api/v1/nothing', '/api/v1/health/../me']) {
      const response = await send(path);
      expect(response.status).toBe(401);
      expect(problemSchema.parse(await response.json()).code).toBe('not-signed-in');
    }
  });

  it('takes no forged cookie', async () => {
    const cookie = await sessionCookie(crypto.randomUUID(), 'another secret');
    expect((await send('/shows', { cookie })).status).toBe(307);
    expect((await send('/shows', { cookie: 'next-auth.session-token=x.y.z' })).status).toBe(307);
  });

  it('lets everybody to what is public, and the signed-in to the rest', async () => {
    for (const path of [
      '/sign-in',
      '/api/auth/csrf',
      '/api/v1/health',
      '/api/v1/ready',
      '/api/v1/openapi.json',
    ]) {
      expect((await send(path)).headers.get('x-middleware-next')).toBe('1');
    }
    for (const path of ['/', '/shows', '/api/v1/me']) {
      expect((await send(path, await signedIn())).headers.get('x-middleware-next')).toBe('1');
    }
  });

  it('gives each answer a policy with a nonce of its own, and hands the same to the page', async () => {
    const [one, two] = [await send('/sign-in'), await send('/sign-in')];
    expect(nonceOf(one)).toMatch(/^[A-Za-z0-9+/]{22}==$/);
    expect(nonceOf(two)).not.toBe(nonceOf(one));
    expect(one.headers.get('x-middleware-request-x-nonce')).toBe(nonceOf(one));
    const policy = one.headers.get('content-security-policy') ?? '';
    expect(one.headers.get('x-middleware-request-content-security-policy')).toBe(policy);
    expect(policy).not.toContain('unsafe-eval');
    expect(policy.match(/script-src[^;]*/)?.[0]).not.toContain('unsafe-inline');
  });
});
