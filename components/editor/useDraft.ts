'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import { ApiProblem } from '@/components/api/ApiProblem';
import { putDraft } from './editorApi';

/** How long after the last key a draft is stored, so that it is safe within two seconds. */
const PAUSE = 1200;
/** How long to wait before storing is tried again when the server could not be reached. */
const RETRY = 4000;

export type DraftState =
  | { readonly kind: 'same' }
  | { readonly kind: 'unsaved' }
  | { readonly kind: 'storing' }
  | { readonly kind: 'stored'; readonly at: string }
  | { readonly kind: 'unreachable' }
  /** Another window stored a draft meanwhile; null when it dropped the draft. */
  | { readonly kind: 'conflict'; readonly other: Draft | null };

export interface DraftKeeper {
  readonly state: DraftState;
  /** Stores this window's text over the other one's, after both were seen. */
  keepMine(): void;
  /** Goes on from a draft that another window stored. */
  takeOther(other: Draft | null): void;
  /** Forgets the stored draft, after a version was saved from it. */
  forget(): void;
}

/**
 * Keeps unsaved work on the server: within two seconds of the last key, again and again while the server cannot be
 * reached, and never over a draft that another window wrote.
 */
export function useDraft(options: {
  readonly recipeId: string;
  readonly basedOn: number;
  readonly initial: Draft | null;
  readonly text: string;
  /** Text of the version the work began from; while they are the same there is nothing to store. */
  readonly savedText: string;
  readonly isReadOnly: boolean;
}): DraftKeeper {
  const { recipeId, basedOn, initial, text, savedText, isReadOnly } = options;
  const [state, setState] = useState<DraftState>(
    initial ? { kind: 'stored', at: initial.updatedAt } : { kind: 'same' },
  );
  const revision = useRef(initial?.revision ?? null);
  const storedText = useRef(initial?.text ?? savedText);
  const isConflict = state.kind === 'conflict';

  const store = useCallback(
    async (wanted: string): Promise<void> => {
      setState({ kind: 'storing' });
      try {
        const draft = await putDraft(recipeId, { text: wanted, basedOn }, revision.current);
        revision.current = draft.revision;
        storedText.current = draft.text;
        setState({ kind: 'stored', at: draft.updatedAt });
      } catch (error) {
        if (error instanceof ApiProblem && error.problem.code === 'draft-changed') {
          setState({ kind: 'conflict', other: error.problem.draft ?? null });
        } else {
          setState({ kind: 'unreachable' });
        }
      }
    },
    [recipeId, basedOn],
  );

  useEffect(() => {
    if (isReadOnly || isConflict || text === storedText.current) return;
    setState((before) => (before.kind === 'unreachable' ? before : { kind: 'unsaved' }));
    const timer = setTimeout(() => void store(text), PAUSE);
    return () => clearTimeout(timer);
  }, [text, isReadOnly, isConflict, store]);

  useEffect(() => {
    if (state.kind !== 'unreachable') return;
    const timer = setTimeout(() => void store(text), RETRY);
    return () => clearTimeout(timer);
  }, [state, store, text]);

  return {
    state,
    keepMine() {
      revision.current = state.kind === 'conflict' ? (state.other?.revision ?? null) : revision.current;
      void store(text);
    },
    takeOther(other) {
      revision.current = other?.revision ?? null;
      storedText.current = other?.text ?? savedText;
      setState(other ? { kind: 'stored', at: other.updatedAt } : { kind: 'same' });
    },
    forget() {
      revision.current = null;
      storedText.current = text;
      setState({ kind: 'same' });
    },
  };
}
