import type { Metadata } from 'next';
import { listLanguage, listParts } from '@/compiler/index';
import { HandbookNav } from '@/components/handbook/HandbookNav';
import { KeyList } from '@/components/handbook/KeyList';

export const metadata: Metadata = { title: 'Parts' };

/** `LegThreePart` describes the kind `leg_three`. */
function kindOf(title: string): string {
  return title
    .replace(/Part$/, '')
    .replace(/(?<=[a-z])[A-Z]/g, (letter) => `_${letter}`)
    .toLowerCase();
}

/** Every part with its options, and what an example of it makes. */
export default function PartsPage() {
  const made = new Map([...listParts()].reverse().map((part) => [part.kind, part]));
  const parts = listLanguage().filter(({ title }) => title.endsWith('Part') && made.has(kindOf(title)));
  return (
    <div className="sheet">
      <HandbookNav here="/handbook/parts" />
      <h1>Parts</h1>
      <ul className="mt-4 flex flex-wrap gap-x-5 gap-y-1">
        {parts.map(({ title }) => (
          <li key={title}>
            <a className="plain-action" href={`#${kindOf(title)}`}>
              {kindOf(title)}
            </a>
          </li>
        ))}
      </ul>
      {parts.map((entry) => {
        const kind = kindOf(entry.title);
        const part = made.get(kind);
        return (
          <section key={kind} aria-labelledby={kind} className="mt-8">
            <h2 id={kind}>{kind}</h2>
            <p className="max-w-prose">{entry.description}</p>
            {part?.picture ? (
              // biome-ignore lint/performance/noImgElement: drawn here and now, there is nothing to optimise.
              <img
                className="part-picture"
                alt={`The joints that an example of ${kind} makes, from the front`}
                src={`data:image/svg+xml,${encodeURIComponent(part.picture)}`}
              />
            ) : null}
            <KeyList entry={entry} />
            <h3>What it makes</h3>
            <ul>
              {Object.entries(part?.makes ?? {})
                .filter(([, ids]) => ids.length > 0)
                .map(([what, ids]) => (
                  <li key={what}>
                    {what}: <span className="figures break-words text-sm">{ids.join(', ')}</span>
                  </li>
                ))}
            </ul>
          </section>
        );
      })}
    </div>
  );
}
