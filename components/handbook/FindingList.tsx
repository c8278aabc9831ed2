import Link from 'next/link';
import type { FindingEntry } from '@/compiler/index';

/** Findings by code, each leading to its page. */
export function FindingList({ findings }: { readonly findings: readonly FindingEntry[] }) {
  return (
    <ul className="mt-4 border-ink border-t">
      {findings.map(({ code, severity, summary }) => (
        <li key={code} className="border-rule border-b">
          <Link href={`/handbook/findings/${code}`} className="list-row">
            <span className="figures">{code}</span>
            <span className="text-ink-soft">{severity}</span>
            <span className="ml-auto">{summary}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
