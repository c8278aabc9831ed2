import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { type SignInError, signInRequestSchema } from '@/app/api/v1/_contracts/signIn';
import { applicationDatabase } from '../database';
import { readEnvironment } from '../env';
import { remoteAddress } from '../http/remoteAddress';
import { signIn } from '../operations/people/signIn';

/** A working day: people sign in again each morning. */
const SESSION_SECONDS = 12 * 60 * 60;

const TOO_MANY: SignInError = 'TooManyAttempts';

/** How people sign in: address and password, a signed cookie that says who, and nothing about what they may do. */
export function authOptions(): NextAuthOptions {
  return {
    secret: readEnvironment().authSecret,
    session: { strategy: 'jwt', maxAge: SESSION_SECONDS },
    pages: { signIn: '/sign-in', signOut: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        name: 'Pintle',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(credentials, request) {
          const read = signInRequestSchema.safeParse({
            email: credentials?.email,
            password: credentials?.password,
          });
          if (!read.success) return null;
          const address = remoteAddress(new Headers(request.headers));
          const result = await signIn(applicationDatabase(), { ...read.data, address });
          if (result.kind === 'too-many-attempts') throw new Error(TOO_MANY);
          return result.kind === 'signed-in' ? result.person : null;
        },
      }),
    ],
    callbacks: {
      session({ session, token }) {
        return { ...session, user: { ...session.user, id: token.sub ?? '' } };
      },
    },
  };
}
