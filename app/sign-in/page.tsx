import type { Metadata } from 'next';
import { Mark } from '@/components/frame/Mark';
import { SignInForm } from '@/components/signin/SignInForm';

export const metadata: Metadata = { title: 'Sign in' };

/** An address within this application; anything else leads to the shows. */
function safeAddress(value: string | string[] | undefined): string {
  return typeof value === 'string' && /^\/(?![/\\])/.test(value) ? value : '/shows';
}

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { callbackUrl } = await searchParams;
  return (
    <main className="sign-in">
      <div className="sign-in-slip">
        <p className="flex items-center gap-3 font-bold text-2xl">
          <Mark size={34} />
          Pintle
        </p>
        <p className="mt-2 max-w-sm text-ink-soft">
          Rig recipes for character teams: written as text, proven by moving, kept for good.
        </p>
        <h1 className="mt-8 text-2xl">Sign in</h1>
        <SignInForm callbackUrl={safeAddress(callbackUrl)} />
      </div>
    </main>
  );
}
