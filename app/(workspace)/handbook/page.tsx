import type { Metadata } from 'next';
import Link from 'next/link';
import { CHAPTERS } from '@/components/handbook/HandbookNav';

export const metadata: Metadata = { title: 'Handbook' };

/** What there is to read. */
export default function HandbookPage() {
  return (
    <div className="sheet">
      <h1>Handbook</h1>
      <p className="mt-4 max-w-prose">
        Made from the same sources as the compiler, so it says what this version does.
      </p>
      <ul className="mt-6 border-ink border-t">
        {CHAPTERS.map(([address, title, summary]) => (
          <li key={address} className="border-rule border-b">
            <Link href={address} className="list-row">
              <span className="font-bold text-xl">{title}</span>
              <span className="ml-auto text-ink-soft">{summary}</span>
            </Link>
          </li>
        ))}
      </ul>
      <p className="mt-6 max-w-prose">
        For people who write adapters:{' '}
        <a className="plain-action" href="/api/v1/conformance-kit" download>
          the conformance kit
        </a>
        , with scripts, poses, expected figures and a skeleton to start from.
      </p>
    </div>
  );
}
