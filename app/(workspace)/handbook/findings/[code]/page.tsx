import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { explainFinding } from '@/compiler/index';
import { HandbookNav } from '@/components/handbook/HandbookNav';
import { Markdown } from '@/components/handbook/Markdown';

type Props = PageProps<'/handbook/findings/[code]'>;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await params).code };
}

/** The page of one finding. */
export default async function FindingPage({ params }: Props) {
  const found = explainFinding((await params).code);
  if (!found) notFound();
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/findings" />
      <h1 className="figures">{found.code}</h1>
      <p className="mt-2 text-ink-soft">
        {found.severity}. {found.summary}
      </p>
      <Markdown text={found.page} withoutTitle />
    </div>
  );
}
