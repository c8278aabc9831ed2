import type { Metadata } from 'next';
import { listLanguage } from '@/compiler/index';
import { HandbookNav } from '@/components/handbook/HandbookNav';
import { KeyList } from '@/components/handbook/KeyList';
import { headingAddress } from '@/components/handbook/Markdown';

export const metadata: Metadata = { title: 'The recipe language' };

/** Every map of the language; parts have a chapter of their own. */
export default function LanguagePage() {
  const entries = listLanguage().filter(({ title }) => !title.endsWith('Part'));
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/language" />
      <h1>The recipe language</h1>
      <ul className="mt-4 flex flex-wrap gap-x-5 gap-y-1">
        {entries.map(({ title }) => (
          <li key={title}>
            <a className="plain-action" href={`#${headingAddress(title)}`}>
              {title}
            </a>
          </li>
        ))}
      </ul>
      {entries.map((entry) => (
        <section key={entry.title} aria-labelledby={headingAddress(entry.title)} className="mt-8">
          <h2 id={headingAddress(entry.title)}>{entry.title}</h2>
          <p className="max-w-prose">{entry.description}</p>
          <KeyList entry={entry} />
        </section>
      ))}
    </div>
  );
}
