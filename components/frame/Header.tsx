import Link from 'next/link';
import { Mark } from './Mark';
import { SchemeSwitch } from './SchemeSwitch';
import { SignOut } from './SignOut';
import type { Scheme } from './scheme';

/** The head of every page for people who are signed in. */
export function Header({ name, scheme }: { readonly name: string; readonly scheme: Scheme }) {
  return (
    <header className="page-header">
      <Link href="/shows" className="flex items-center gap-2 font-bold text-xl">
        <Mark />
        Pintle
      </Link>
      <nav aria-label="Main">
        <Link href="/shows" className="plain-action">
          Shows
        </Link>{' '}
        <Link href="/handbook" className="plain-action">
          Handbook
        </Link>
      </nav>
      <div className="ml-auto flex flex-wrap items-baseline gap-x-5 gap-y-1">
        <SchemeSwitch scheme={scheme} />
        <span className="text-sm">{name}</span>
        <SignOut />
      </div>
    </header>
  );
}
