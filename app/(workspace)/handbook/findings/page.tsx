import type { Metadata } from 'next';
import Form from 'next/form';
import { listFindings } from '@/compiler/index';
import { FindingList } from '@/components/handbook/FindingList';
import { HandbookNav } from '@/components/handbook/HandbookNav';

export const metadata: Metadata = { title: 'Findings' };

/** Every finding, or those whose code or summary has the words that are looked for. */
export default async function FindingsPage({ searchParams }: PageProps<'/handbook/findings'>) {
  const { search } = await searchParams;
  const words = (typeof search === 'string' ? search : '').toLowerCase().slice(0, 100);
  const found = listFindings().filter(({ code, summary }) =>
    `${code} ${summary}`.toLowerCase().includes(words),
  );
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/findings" />
      <h1>Findings</h1>
      <Form action="/handbook/findings" className="mt-4 flex flex-wrap items-baseline gap-3">
        <label className="flex flex-wrap items-baseline gap-2">
          <span>Look for</span>
          <input className="plain-input" type="search" name="search" defaultValue={words} />
        </label>
        <button type="submit" className="plain-action">
          Show
        </button>
      </Form>
      <p className="mt-4 text-ink-soft" role="status">
        {found.length === 0 ? 'No finding has these words.' : `${found.length} findings`}
      </p>
      <FindingList findings={found} />
    </div>
  );
}
