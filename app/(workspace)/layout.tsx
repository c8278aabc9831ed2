import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { readMe } from '@/app/_server/operations/people/readMe';
import { loadForPage } from '@/app/_server/session';
import { QueryProvider } from '@/components/api/QueryProvider';
import { Header } from '@/components/frame/Header';
import { readScheme, SCHEME_COOKIE } from '@/components/frame/scheme';

/** The frame around every page for people who are signed in. What they may see is decided beside the data. */
export default async function WorkspaceLayout({ children }: { readonly children: ReactNode }) {
  const me = await loadForPage(readMe);
  const scheme = readScheme((await cookies()).get(SCHEME_COOKIE)?.value);
  return (
    <QueryProvider>
      <a className="skip-link" href="#content">
        Skip to the content
      </a>
      <Header name={me.name} scheme={scheme} />
      <main id="content" tabIndex={-1}>
        {children}
      </main>
    </QueryProvider>
  );
}
