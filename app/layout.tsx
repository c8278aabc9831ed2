import '@fontsource/alegreya-sans/400.css';
import '@fontsource/alegreya-sans/400-italic.css';
import '@fontsource/alegreya-sans/500.css';
import '@fontsource/alegreya-sans/700.css';
import '@fontsource-variable/spline-sans-mono';
import './globals.css';
import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import { connection } from 'next/server';
import type { ReactNode } from 'react';
import { readScheme, SCHEME_COOKIE } from '@/components/frame/scheme';

export const metadata: Metadata = {
  title: { default: 'Pintle', template: '%s · Pintle' },
  description: 'Rig recipes for character teams: written, compiled, proven, kept.',
};

/** Every page. It is made anew for each request, because its scripts carry the nonce of that request. */
export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  await connection();
  const scheme = readScheme((await cookies()).get(SCHEME_COOKIE)?.value);
  return (
    <html lang="en-GB" {...(scheme === 'system' ? {} : { 'data-scheme': scheme })}>
      <body>{children}</body>
    </html>
  );
}
