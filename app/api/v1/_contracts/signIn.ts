import { z } from 'zod';

/** What the sign-in page sends. */
export const signInRequestSchema = z.strictObject({
  email: z.string().trim().min(3).max(254),
  password: z.string().min(1).max(1024),
});
export type SignInRequest = z.infer<typeof signInRequestSchema>;

/**
 * The `error` that next-auth's `signIn('credentials', { redirect: false })` answers with: a wrong address or
 * password, or too many tries lately (wait a quarter of an hour).
 */
export const signInErrorSchema = z.enum(['CredentialsSignin', 'TooManyAttempts']);
export type SignInError = z.infer<typeof signInErrorSchema>;
