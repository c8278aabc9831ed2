import 'server-only';
import { headers } from 'next/headers';
import { notFound, redirect } from 'next/navigation';
import { NextRequest } from 'next/server';
import type { Caller } from './caller';
import { callerOf } from './http/callerOf';
import { Refusal } from './refusal';

/** Who looks at the page; null as viewer when nobody is signed in. */
export async function pageCaller(): Promise<Caller> {
  // The address is of no matter: only cookies and headers are read.
  return callerOf(new NextRequest('http://localhost/', { headers: await headers() }));
}

/**
 * Loads what a page shows through an operation. Sends people who are not signed in to the sign-in page, and
 * answers what they may not see as a page that does not exist.
 */
export async function loadForPage<Result>(load: (caller: Caller) => Promise<Result>): Promise<Result> {
  try {
    return await load(await pageCaller());
  } catch (thrown) {
    const code = thrown instanceof Refusal ? thrown.reason.code : undefined;
    if (code === 'not-signed-in') redirect('/sign-in');
    if (code === 'not-found' || code === 'forbidden') notFound();
    throw thrown;
  }
}
