import { NextRequest } from 'next/server';
import { encode } from 'next-auth/jwt';
import { applicationDatabase } from '@/app/_server/database';
import type { RouteHandler } from '@/app/_server/http/handle';
import type { Endpoint } from '@/app/api/v1/_endpoints/Endpoint';
import { createTestDatabase, type TestDatabase } from './testDatabase';

export const ORIGIN = 'http://127.0.0.1:3000';
const SECRET = 'a secret for tests';

/** Points this process's application at a database of its own; its log only speaks of faults. */
export async function startApplication(): Promise<TestDatabase> {
  const test = await createTestDatabase();
  process.env.DATABASE_URL = test.url;
  process.env.NEXTAUTH_SECRET = SECRET;
  process.env.NEXTAUTH_URL = ORIGIN;
  process.env.LOG_LEVEL = 'error';
  return {
    ...test,
    async drop() {
      await applicationDatabase().destroy();
      await test.drop();
    },
  };
}

/** The cookie that signing in would have set for a person. */
export async function sessionCookie(personId: string, secret: string = SECRET): Promise<string> {
  return `next-auth.session-token=${await encode({ token: { sub: personId }, secret })}`;
}

/** What to send to an endpoint. */
export interface ApiRequest {
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: Readonly<Record<string, string>>;
  /** Sent as JSON. */
  readonly body?: unknown;
  /** Sent as it is, in place of `body`. */
  readonly rawBody?: BodyInit;
  readonly headers?: Readonly<Record<string, string>>;
  /** Id of the person who is signed in. */
  readonly as?: string;
}

type RouteModule = Readonly<Record<string, RouteHandler | undefined>>;

/** The module that Next routes an endpoint's address to. */
export async function importRoute(path: string): Promise<RouteModule> {
  const file = path.replaceAll('{', '[').replaceAll('}', ']');
  const address = new URL(`../../app/api/v1${file}/route.ts`, import.meta.url);
  return import(/* @vite-ignore */ address.href);
}

/** The request as Next hands it to a route. */
export async function makeRequest(
  method: string,
  address: string,
  { query = {}, body, rawBody, headers = {}, as }: ApiRequest,
): Promise<NextRequest> {
  const payload = rawBody ?? (body === undefined ? undefined : JSON.stringify(body));
  return new NextRequest(`${address}?${new URLSearchParams(query)}`, {
    method,
    headers: {
      ...(payload === undefined ? {} : { 'content-type': 'application/json' }),
      ...(as === undefined ? {} : { cookie: await sessionCookie(as) }),
      ...headers,
    },
    ...(payload === undefined ? {} : { body: payload, duplex: 'half' as const }),
  });
}

/** Calls the real route handler of an endpoint and returns its answer. */
export async function callApi(
  endpoint: Pick<Endpoint, 'method' | 'path'>,
  request: ApiRequest = {},
): Promise<Response> {
  const { params = {} } = request;
  const method = endpoint.method.toUpperCase();
  const handler = (await importRoute(endpoint.path))[method];
  if (!handler) throw new Error(`${endpoint.path} exports no ${method}`);
  const path = endpoint.path.replaceAll(/\{(\w+)\}/g, (_, name: string) => params[name] ?? '');
  const sent = await makeRequest(method, `${ORIGIN}/api/v1${path}`, request);
  return handler(sent, { params: Promise.resolve(params) });
}
