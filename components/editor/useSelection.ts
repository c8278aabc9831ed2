'use client';

import { useCallback, useMemo, useState } from 'react';
import type { BuiltRig } from '@/components/worker/messages';
import type { TextRange } from './CodePane';

export interface Selection {
  /** Ids of the chosen things. */
  readonly chosen: readonly string[];
  /** Where they were written. */
  readonly ranges: readonly TextRange[];
  choose(id: string | null): void;
  /** Chooses what the entry around a place of the text makes. */
  chooseAt(offset: number): void;
}

const NONE: readonly string[] = [];

function rangesOf(built: BuiltRig | null, chosen: readonly string[]): readonly TextRange[] {
  const ids = new Set(chosen);
  const ranges = new Map<number, TextRange>();
  for (const { id, start, end } of built?.places ?? []) {
    if (ids.has(id) && start !== null && end !== null) ranges.set(start, { start, end });
  }
  return [...ranges.values()];
}

/** One choice for the whole page: text, picture, list and script all read and set it. */
export function useSelection(built: BuiltRig | null): Selection {
  const [chosen, setChosen] = useState(NONE);

  const choose = useCallback((id: string | null) => setChosen(id === null ? NONE : [id]), []);

  const chooseAt = useCallback(
    (offset: number) => {
      const around = (built?.places ?? []).filter(
        ({ start, end }) => start !== null && end !== null && start <= offset && offset <= end,
      );
      const smallest = Math.min(...around.map(({ start, end }) => (end ?? 0) - (start ?? 0)));
      const ids = around
        .filter(({ start, end }) => (end ?? 0) - (start ?? 0) === smallest)
        .map(({ id }) => id);
      setChosen(ids.length === 0 ? NONE : ids);
    },
    [built],
  );

  const ranges = useMemo(() => rangesOf(built, chosen), [built, chosen]);
  return { chosen, ranges, choose, chooseAt };
}
