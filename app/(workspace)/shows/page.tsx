import type { Metadata } from 'next';
import Link from 'next/link';
import { listShows } from '@/app/_server/operations/shows/listShows';
import { loadForPage } from '@/app/_server/session';

export const metadata: Metadata = { title: 'Shows' };

/** The shows a person belongs to. */
export default async function ShowsPage() {
  const { items } = await loadForPage(listShows);
  return (
    <div className="sheet">
      <h1>Shows</h1>
      {items.length === 0 ? (
        <p className="mt-4 max-w-prose">
          You are not a member of any show yet. Ask an administrator of your studio to add you; then it
          appears here.
        </p>
      ) : (
        <ul className="mt-6 border-ink border-t">
          {items.map(({ id, slug, title, role }) => (
            <li key={id} className="border-rule border-b">
              <Link href={`/shows/${slug}`} className="list-row">
                <span className="font-bold text-xl">{title}</span>
                <span className="ml-auto text-ink-soft">
                  you are {role === 'admin' || role === 'operator' ? 'an' : 'a'} {role}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
