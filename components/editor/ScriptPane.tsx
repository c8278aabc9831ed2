'use client';

import { useEffect, useMemo, useRef } from 'react';
import { stepThrough } from '@/components/ui/stepThrough';

const ID = / id="([a-z0-9_.]+)"/;

export interface ScriptPaneProps {
  readonly script: string;
  readonly chosen: readonly string[];
  onChoose(id: string | null): void;
}

/** The emitted build script, line by line; lines that make a chosen thing are marked. */
export function ScriptPane({ script, chosen, onChoose }: ScriptPaneProps) {
  const lines = useMemo(
    () =>
      script
        .trimEnd()
        .split('\n')
        .map((text, index) => ({ number: index + 1, text, id: ID.exec(text)?.[1] ?? null })),
    [script],
  );
  const first = useRef<HTMLLIElement>(null);
  const ids = useMemo(() => new Set(chosen), [chosen]);
  const firstChosen = lines.find(({ id }) => id !== null && ids.has(id))?.number;

  useEffect(() => {
    if (firstChosen !== undefined) first.current?.scrollIntoView({ block: 'nearest' });
  }, [firstChosen]);

  const tabStop = firstChosen ?? lines.find(({ id }) => id !== null)?.number;

  return (
    <section className="h-full overflow-auto" aria-label="Build script">
      <ol className="figures script-lines py-2 text-xs" onKeyDown={stepThrough}>
        {lines.map(({ number, text, id }) => {
          const isChosen = id !== null && ids.has(id);
          return (
            <li
              key={number}
              ref={number === firstChosen ? first : undefined}
              aria-current={isChosen ? 'true' : undefined}
              className={isChosen ? 'script-line script-line-chosen' : 'script-line'}
            >
              <span aria-hidden className="script-number">
                {number}
              </span>
              {id === null ? (
                <span>{text}</span>
              ) : (
                <button
                  type="button"
                  tabIndex={number === tabStop ? 0 : -1}
                  className="text-left"
                  onClick={() => onChoose(id)}
                >
                  {text}
                </button>
              )}
            </li>
          );
        })}
      </ol>
    </section>
  );
}
