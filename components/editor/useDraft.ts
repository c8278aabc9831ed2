'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import { type DraftOutcome, DraftQueue } from './draftQueue';
import { deleteDraft, putDraft } from './editorApi';

/** How long after the last key a draft is stored, so that it is safe within two seconds. */
const PAUSE = 1200;
/** How long to wait before storing is tried again when it failed for a reason that may pass. */
const RETRY = 4000;
/** Browsers finish a request after its page is gone only while its body is small (Fetch: 64 KiB of UTF-8). */
const SURE_LENGTH = 20_000;

export type DraftState =
  | { readonly kind: 'same' }
  | { readonly kind: 'unsaved' }
  | { readonly kind: 'storing' }
  | DraftOutcome;

export interface DraftKeeper {
  readonly state: DraftState;
  /** Stores this window's text over the other one's, after both were seen. */
  keepMine(): void;
  /** Goes on from the draft that another window stored; from the saved version when it dropped the draft. */
  takeOther(other: Draft | null): void;
  /** Drops the stored draft and goes on from a saved text. */
  goOnFrom(savedText: string): Promise<void>;
  /** Runs a save during which nothing is stored; when it succeeds, the draft it was made from is gone. */
  during<Saved>(save: () => Promise<Saved>): Promise<Saved>;
}

/**
 * Keeps unsaved work on the server: within two seconds of the last key, when the page is left, again and again
 * while it fails for a reason that may pass, and never over a draft that another window wrote.
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
  /** Where the work is safe; what the words go back to when a change is undone before it was stored. */
  const safe = useRef(state);
  if (state.kind === 'same' || state.kind === 'stored') safe.current = state;
  const [isHeld, setIsHeld] = useState(false);
  const [queue] = useState(
    () =>
      new DraftQueue({
        put: (draft, revision) =>
          putDraft(recipeId, draft, revision, { keepalive: draft.text.length <= SURE_LENGTH }),
        drop: (revision) => deleteDraft(recipeId, revision),
        initial,
        savedText,
      }),
  );
  const isStopped = isReadOnly || isHeld || state.kind === 'conflict';
  const isFailing = state.kind === 'failed' || state.kind === 'refused';
  const latest = useRef({ text, basedOn, isStopped, isFailing });
  latest.current = { text, basedOn, isStopped, isFailing };

  const store = useCallback(async (): Promise<void> => {
    const wanted = latest.current;
    if (wanted.isStopped || queue.holds(wanted.text)) return;
    setState({ kind: 'storing' });
    const outcome = await queue.store({ text: wanted.text, basedOn: wanted.basedOn });
    // What was typed while the answer was on its way is stored by its own timer.
    if (outcome) setState(latest.current.text === wanted.text ? outcome : afterwards(outcome));
  }, [queue]);

  useEffect(() => {
    if (isStopped) return;
    if (queue.holds(text)) {
      setState((before) => (before.kind === 'unsaved' ? safe.current : before));
      return;
    }
    setState((before) => (before.kind === 'failed' ? before : { kind: 'unsaved' }));
    const timer = setTimeout(() => void store(), PAUSE);
    return () => clearTimeout(timer);
  }, [text, isStopped, queue, store]);

  useEffect(() => {
    if (state.kind !== 'failed') return;
    const timer = setTimeout(() => void store(), RETRY);
    return () => clearTimeout(timer);
  }, [state, store]);

  useEffect(() => {
    const leave = (): void => {
      if (document.visibilityState === 'hidden') void store();
    };
    const warn = (event: BeforeUnloadEvent): void => {
      const { text: unsaved, isStopped: isSafe, isFailing } = latest.current;
      if (isSafe || queue.holds(unsaved)) return;
      if (isFailing || unsaved.length > SURE_LENGTH) event.preventDefault();
    };
    document.addEventListener('visibilitychange', leave);
    window.addEventListener('beforeunload', warn);
    return () => {
      document.removeEventListener('visibilitychange', leave);
      window.removeEventListener('beforeunload', warn);
      void store();
    };
  }, [queue, store]);

  return {
    state,
    keepMine() {
      if (state.kind !== 'conflict') return;
      queue.overrule(state.other);
      setState({ kind: 'unsaved' });
    },
    takeOther(other) {
      queue.follow(other, savedText);
      setState(other ? { kind: 'stored', at: other.updatedAt } : { kind: 'same' });
    },
    async goOnFrom(next) {
      setState((await queue.drop(next)) ?? { kind: 'same' });
    },
    async during(save) {
      setIsHeld(true);
      latest.current = { ...latest.current, isStopped: true };
      try {
        await queue.settle();
        const saved = await save();
        queue.follow(null, text);
        setState({ kind: 'same' });
        return saved;
      } finally {
        setIsHeld(false);
      }
    },
  };
}

/** A text that has changed since is not stored yet, however the earlier one fared; other windows still matter. */
function afterwards(outcome: DraftOutcome): DraftState {
  return outcome.kind === 'stored' ? { kind: 'unsaved' } : outcome;
}
