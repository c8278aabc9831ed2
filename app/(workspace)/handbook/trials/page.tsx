import type { Metadata } from 'next';
import { explainFinding, listFindings } from '@/compiler/index';
import { HandbookNav } from '@/components/handbook/HandbookNav';
import { Markdown } from '@/components/handbook/Markdown';

export const metadata: Metadata = { title: 'Trials' };

/** Every trial with its page. */
export default function TrialsPage() {
  const trials = listFindings().filter(({ code }) => code.startsWith('trial-'));
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/trials" />
      <h1>Trials</h1>
      <p className="mt-4 max-w-prose">
        Every compile moves the rig and measures what it does. Each trial is a proof with a number and a
        tolerance; what fails one is not built.
      </p>
      {trials.map(({ code, summary }) => (
        <section key={code} aria-labelledby={code} className="mt-8">
          <h2 id={code} className="figures">
            {code}
          </h2>
          <p>{summary}</p>
          <Markdown text={explainFinding(code)?.page ?? ''} shift={1} withoutTitle />
        </section>
      ))}
    </div>
  );
}
