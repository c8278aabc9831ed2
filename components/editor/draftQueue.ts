import type { Draft, PutDraftRequest } from '@/app/api/v1/_contracts/draft';
import { ApiProblem } from '@/components/api/ApiProblem';

/** How an attempt to store a draft ended. */
export type DraftOutcome =
  | { readonly kind: 'stored'; readonly at: string }
  /** Not stored, for a reason that may pass by itself. */
  | { readonly kind: 'failed'; readonly words: string }
  /** Not stored, and the same text will never be. */
  | { readonly kind: 'refused'; readonly words: string }
  | DraftConflict;

/** Another window stored a draft meanwhile; null when it dropped the draft. */
export interface DraftConflict {
  readonly kind: 'conflict';
  readonly other: Draft | null;
}

export interface DraftQueueOptions {
  /** Stores a draft over the given revision; null means that none is stored. Refusals throw an `ApiProblem`. */
  put(draft: PutDraftRequest, revision: number | null): Promise<Draft>;
  /** Drops the stored draft of a revision. */
  drop(revision: number): Promise<void>;
  readonly initial: Draft | null;
  /** Text of the version the work began from; while nothing else was typed there is nothing to store. */
  readonly savedText: string;
}

function toConflict(error: unknown): DraftConflict | null {
  if (!(error instanceof ApiProblem && error.problem.code === 'draft-changed')) return null;
  return { kind: 'conflict', other: error.problem.draft ?? null };
}

function toFailure(error: unknown): DraftOutcome {
  if (!(error instanceof ApiProblem)) {
    return {
      kind: 'failed',
      words: 'The server cannot be reached. Go on typing; your draft is stored as soon as it can be.',
    };
  }
  const { code, status, detail } = error.problem;
  if (code === 'not-signed-in') {
    return {
      kind: 'failed',
      words:
        'You are signed out. Sign in again in another window; your draft is stored as soon as you are back.',
    };
  }
  return { kind: status >= 500 ? 'failed' : 'refused', words: `Your draft is not stored. ${detail}` };
}

/**
 * Keeps one draft on the server in step with a text: one request at a time and in order, so that a window never
 * takes its own slow answer for another window's work, and never over what another window stored.
 */
export class DraftQueue {
  #revision: number | null;
  #storedText: string;
  /** Texts that were sent and not answered: any of them may be stored. */
  readonly #unanswered = new Set<string>();
  #last: Promise<unknown> = Promise.resolve();

  constructor(private readonly options: DraftQueueOptions) {
    this.#revision = options.initial?.revision ?? null;
    this.#storedText = options.initial?.text ?? options.savedText;
  }

  /** Whether the server has this text, as far as is known. */
  holds(text: string): boolean {
    return this.#unanswered.size === 0 && text === this.#storedText;
  }

  /** Stores a text after everything asked before; null when there was nothing left to do. */
  store(draft: PutDraftRequest): Promise<DraftOutcome | null> {
    return this.#queue(async () => (this.holds(draft.text) ? null : this.#put(draft)));
  }

  /** Drops the stored draft, because the work goes on from a saved text; null when that was done. */
  drop(savedText: string): Promise<DraftOutcome | null> {
    return this.#queue(async () => {
      try {
        if (this.#revision !== null) await this.options.drop(this.#revision);
      } catch (error) {
        return toConflict(error) ?? toFailure(error);
      }
      this.follow(null, savedText);
      return null;
    });
  }

  /** Waits for what is on its way. */
  settle(): Promise<void> {
    return this.#queue(async () => undefined);
  }

  /** Goes on from what is known to be stored: another window's draft, or none beside a saved text. */
  follow(draft: Draft | null, savedText: string): void {
    this.#revision = draft?.revision ?? null;
    this.#storedText = draft?.text ?? savedText;
    this.#unanswered.clear();
  }

  /** The next attempt writes over a draft that was seen and not wanted. */
  overrule(draft: Draft | null): void {
    this.#revision = draft?.revision ?? null;
  }

  async #put(draft: PutDraftRequest): Promise<DraftOutcome> {
    try {
      const stored = await this.options.put(draft, this.#revision);
      this.follow(stored, stored.text);
      return { kind: 'stored', at: stored.updatedAt };
    } catch (error) {
      const conflict = toConflict(error);
      if (!conflict) {
        if (!(error instanceof ApiProblem) || error.problem.status >= 500) this.#unanswered.add(draft.text);
        return toFailure(error);
      }
      const { other } = conflict;
      // The same text is no conflict, and neither is our own earlier one of which only the answer was lost.
      if (other && (other.text === draft.text || this.#unanswered.has(other.text))) {
        this.follow(other, other.text);
        return this.holds(draft.text) ? { kind: 'stored', at: other.updatedAt } : this.#put(draft);
      }
      return conflict;
    }
  }

  #queue<Answer>(task: () => Promise<Answer>): Promise<Answer> {
    const next = this.#last.then(task);
    this.#last = next.catch(() => undefined);
    return next;
  }
}
