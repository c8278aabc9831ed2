'use client';

import { diffLines } from 'diff';
import { useMemo } from 'react';

interface SideLine {
  readonly key: string;
  readonly text: string;
  readonly isChanged: boolean;
}

/** Lines of both texts, with those marked that the other side does not have. */
function toSides(
  left: string,
  right: string,
): { readonly left: readonly SideLine[]; readonly right: readonly SideLine[] } {
  const sides = { left: [] as SideLine[], right: [] as SideLine[] };
  const add = (side: 'left' | 'right', value: string, isChanged: boolean): void => {
    for (const text of value.replace(/\n$/, '').split('\n')) {
      sides[side].push({ key: `${sides[side].length}`, text, isChanged });
    }
  };
  for (const { value, added, removed } of diffLines(left, right)) {
    if (!added) add('left', value, removed === true);
    if (!removed) add('right', value, added === true);
  }
  return sides;
}

export interface TwoSidesProps {
  readonly leftTitle: string;
  readonly left: string;
  readonly rightTitle: string;
  readonly right: string;
}

/** Two texts beside each other, to choose between. */
export function TwoSides({ leftTitle, left, rightTitle, right }: TwoSidesProps) {
  const sides = useMemo(() => toSides(left, right), [left, right]);
  const column = (title: string, lines: readonly SideLine[]) => (
    <section className="min-w-0">
      <h3 className="border-rule border-b pb-1">{title}</h3>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolling region must be reachable by keyboard. */}
      <ol className="figures max-h-72 overflow-auto text-xs" tabIndex={0} aria-label={title}>
        {lines.map(({ key, text, isChanged }) => (
          <li key={key} className={isChanged ? 'line-changed whitespace-pre' : 'whitespace-pre'}>
            {text === '' ? ' ' : text}
          </li>
        ))}
      </ol>
    </section>
  );
  return (
    <div className="mt-4 grid gap-4 md:grid-cols-2">
      {column(leftTitle, sides.left)}
      {column(rightTitle, sides.right)}
    </div>
  );
}
