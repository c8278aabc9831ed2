import type { Metadata } from 'next';
import { slipwayReference } from '@/compiler/index';
import { HandbookNav } from '@/components/handbook/HandbookNav';
import { Markdown } from '@/components/handbook/Markdown';

export const metadata: Metadata = { title: 'Slipway' };

/** The reference of the build language. */
export default function SlipwayPage() {
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/slipway" />
      <Markdown text={slipwayReference()} />
    </div>
  );
}
