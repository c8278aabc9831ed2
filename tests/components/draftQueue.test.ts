import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Draft, PutDraftRequest } from '@/app/api/v1/_contracts/draft';
import type { Problem } from '@/app/api/v1/_contracts/problem';
import { ApiProblem } from '@/components/api/ApiProblem';
import { DraftQueue } from '@/components/editor/draftQueue';

const SAVED = 'as saved';

function problem(code: Problem['code'], status: number, more: Partial<Problem> = {}): ApiProblem {
  return new ApiProblem({
    type: `/${code}`,
    title: code,
    status,
    detail: `${code}.`,
    code,
    requestId: '1',
    ...more,
  });
}

/** A draft on a server that keeps the rules of the API: each write states what it expects to find. */
class DraftStore {
  draft: Draft | null = null;
  #revisions = 0;
  /** What happens to the requests to come: the request is lost, its answer is lost, or all is well. */
  readonly fates: ('request lost' | 'answer lost' | 'well')[] = [];

  async put({ text, basedOn }: PutDraftRequest, revision: number | null): Promise<Draft> {
    const fate = this.fates.shift() ?? 'well';
    await Promise.resolve();
    if (fate === 'request lost') throw new TypeError('no network');
    if ((this.draft?.revision ?? null) !== revision) {
      throw problem('draft-changed', 412, { draft: this.draft });
    }
    this.#revisions += 1;
    this.draft = { text, basedOn, revision: this.#revisions, updatedAt: '2026-12-01T10:00:00.000Z' };
    if (fate === 'answer lost') throw new TypeError('no network');
    return this.draft;
  }

  async drop(revision: number): Promise<void> {
    await Promise.resolve();
    if (this.draft && this.draft.revision !== revision) {
      throw problem('draft-changed', 412, { draft: this.draft });
    }
    this.draft = null;
  }
}

function begin(store: DraftStore): DraftQueue {
  return new DraftQueue({
    put: (draft, revision) => store.put(draft, revision),
    drop: (revision) => store.drop(revision),
    initial: store.draft,
    savedText: SAVED,
  });
}

const write = (queue: DraftQueue, text: string) => queue.store({ text, basedOn: 1 });

describe('a draft kept on the server', () => {
  it('is stored, and once is enough', async () => {
    const store = new DraftStore();
    const queue = begin(store);
    expect(queue.holds(SAVED)).toBe(true);
    expect(await write(queue, 'one')).toEqual({ kind: 'stored', at: '2026-12-01T10:00:00.000Z' });
    expect(await write(queue, 'one')).toBeNull();
    expect(store.draft).toMatchObject({ text: 'one', revision: 1 });
  });

  it('follows quick typing in order, though answers are slow', async () => {
    const store = new DraftStore();
    const queue = begin(store);
    const outcomes = await Promise.all(['a', 'ab', 'abc'].map((text) => write(queue, text)));
    expect(outcomes.map((outcome) => outcome?.kind)).toEqual(['stored', 'stored', 'stored']);
    expect(store.draft?.text).toBe('abc');
  });

  it('is not taken for another window’s when only the answer was lost', async () => {
    const store = new DraftStore();
    const queue = begin(store);
    store.fates.push('answer lost');
    expect(await write(queue, 'one')).toMatchObject({ kind: 'failed' });
    expect(await write(queue, 'one and two')).toMatchObject({ kind: 'stored' });
    expect(store.draft?.text).toBe('one and two');
  });

  it('is never written over by another window, and shows what that one stored', async () => {
    const store = new DraftStore();
    const mine = begin(store);
    const theirs = begin(store);
    await write(theirs, 'theirs');
    expect(await write(mine, 'mine')).toMatchObject({ kind: 'conflict', other: { text: 'theirs' } });
    expect(store.draft?.text).toBe('theirs');
  });

  it('is written over once that was seen and overruled', async () => {
    const store = new DraftStore();
    const mine = begin(store);
    await write(begin(store), 'theirs');
    await write(mine, 'mine');
    mine.overrule(store.draft);
    expect(await write(mine, 'mine')).toMatchObject({ kind: 'stored' });
    expect(store.draft?.text).toBe('mine');
  });

  it('is gone on from where another window left it', async () => {
    const store = new DraftStore();
    const mine = begin(store);
    await write(begin(store), 'theirs');
    mine.follow(store.draft, SAVED);
    expect(mine.holds('theirs')).toBe(true);
    expect(await write(mine, 'theirs and mine')).toMatchObject({ kind: 'stored' });
  });

  it('is no conflict where both windows hold the same text', async () => {
    const store = new DraftStore();
    const mine = begin(store);
    await write(begin(store), 'the same');
    expect(await write(mine, 'the same')).toMatchObject({ kind: 'stored' });
  });

  it('is dropped after what is on its way, and begun anew', async () => {
    const store = new DraftStore();
    const queue = begin(store);
    void write(queue, 'one');
    expect(await queue.drop('as saved next')).toBeNull();
    expect(store.draft).toBeNull();
    expect(queue.holds('as saved next')).toBe(true);
    expect(await write(queue, 'two')).toMatchObject({ kind: 'stored' });
  });

  it('is not dropped when another window has changed it', async () => {
    const store = new DraftStore();
    await write(begin(store), 'one');
    const mine = begin(store);
    await write(begin(store), 'theirs');
    expect(await mine.drop(SAVED)).toMatchObject({ kind: 'conflict', other: { text: 'theirs' } });
    expect(store.draft?.text).toBe('theirs');
  });

  it.each([
    ['a lost connection', new TypeError('no network'), 'failed', /cannot be reached/],
    ['a fault of the server', problem('internal-error', 500), 'failed', /not stored/],
    ['a session that ended', problem('not-signed-in', 401), 'failed', /signed out/],
    ['a role that was taken away', problem('forbidden', 403), 'refused', /forbidden\./],
    ['a text that is too long', problem('body-too-large', 413), 'refused', /body-too-large\./],
  ])('says in words what %s means', async (_, error, kind, words) => {
    const queue = new DraftQueue({
      put: () => Promise.reject(error),
      drop: () => Promise.reject(error),
      initial: null,
      savedText: SAVED,
    });
    const outcome = await write(queue, 'one');
    expect(outcome).toMatchObject({ kind, words: expect.stringMatching(words) });
    expect(queue.holds('one')).toBe(false);
  });

  it('ends with the last text, however requests and answers were lost on the way', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(
          fc.record({
            text: fc.constantFrom('a', 'b', 'c', 'd', SAVED),
            fate: fc.constantFrom('request lost' as const, 'answer lost' as const, 'well' as const),
          }),
          { minLength: 1, maxLength: 30 },
        ),
        async (steps) => {
          const store = new DraftStore();
          const queue = begin(store);
          for (const { text, fate } of steps) {
            store.fates.splice(0, store.fates.length, fate);
            const outcome = await write(queue, text);
            // One window alone never conflicts with itself.
            expect(outcome?.kind).not.toBe('conflict');
          }
          const last = steps.at(-1)?.text ?? '';
          store.fates.length = 0;
          await write(queue, last);
          expect(queue.holds(last)).toBe(true);
          expect(store.draft?.text ?? SAVED).toBe(last);
        },
      ),
    );
  });
});
