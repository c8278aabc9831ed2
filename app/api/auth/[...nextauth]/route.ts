import type { NextRequest } from 'next/server';
import NextAuth from 'next-auth';
import { authOptions } from '@/app/_server/auth/authOptions';

interface Context {
  readonly params: Promise<{ nextauth: string[] }>;
}

/** Sign-in, sign-out and session of next-auth; its settings are read at each request, not while building. */
function handler(request: NextRequest, context: Context): Promise<Response> {
  return NextAuth(request, context, authOptions());
}

export { handler as GET, handler as POST };
