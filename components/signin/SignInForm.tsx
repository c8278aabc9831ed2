'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { getProviders, signIn } from 'next-auth/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { type SignInRequest, signInRequestSchema } from '@/app/api/v1/_contracts/signIn';

const REFUSALS: Readonly<Record<string, string>> = {
  CredentialsSignin: 'E-mail or password is not right. Check both, then try again.',
  TooManyAttempts: 'Too many tries. Wait a quarter of an hour, then try again.',
};

/** Asks who you are. What was typed stays when it is refused. */
export function SignInForm({ callbackUrl }: { readonly callbackUrl: string }) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const form = useForm<SignInRequest>({ resolver: zodResolver(signInRequestSchema) });
  const { errors, isSubmitting } = form.formState;

  const submit = form.handleSubmit(async (values) => {
    setRefusal(null);
    // Asked first, because signIn itself leaves the page, and what was typed, when it cannot learn the providers.
    const isReachable = (await getProviders()) !== null;
    const answer = isReachable
      ? await signIn('credentials', { ...values, redirect: false }).catch(() => undefined)
      : undefined;
    if (!answer) {
      setRefusal('The server cannot be reached. Try again in a moment.');
    } else if (answer.error) {
      setRefusal(REFUSALS[answer.error] ?? 'Signing in did not work. Try again.');
    } else {
      // A full load: every page is made anew for the person who is signed in now.
      window.location.assign(callbackUrl);
    }
  });

  return (
    <form className="mt-4 grid gap-4" onSubmit={submit} noValidate>
      <label className="grid gap-1">
        E-mail
        <input
          className="plain-input"
          type="email"
          autoComplete="username"
          aria-invalid={errors.email !== undefined}
          {...form.register('email')}
        />
        {errors.email && <span className="field-error">Write your e-mail address.</span>}
      </label>
      <label className="grid gap-1">
        Password
        <input
          className="plain-input"
          type="password"
          autoComplete="current-password"
          aria-invalid={errors.password !== undefined}
          {...form.register('password')}
        />
        {errors.password && <span className="field-error">Write your password.</span>}
      </label>
      {refusal && (
        <p role="alert" className="finding finding-error px-3 py-2">
          {refusal}
        </p>
      )}
      <button type="submit" className="action action-main justify-self-start" disabled={isSubmitting}>
        {isSubmitting ? 'Signing in…' : 'Sign in'}
      </button>
    </form>
  );
}
