'use client';

import { signOut } from 'next-auth/react';

export function SignOut() {
  return (
    <button
      type="button"
      className="plain-action text-sm"
      onClick={() => void signOut({ callbackUrl: '/sign-in' })}
    >
      Sign out
    </button>
  );
}
