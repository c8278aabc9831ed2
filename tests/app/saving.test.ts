import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { findDraft } from '@/app/_server/operations/drafts/findDraft';
import { writeDraft } from '@/app/_server/operations/drafts/writeDraft';
import { createRecipe } from '@/app/_server/operations/recipes/createRecipe';
import { readRecipe } from '@/app/_server/operations/recipes/readRecipe';
import { listVersions } from '@/app/_server/operations/versions/listVersions';
import { readVersion } from '@/app/_server/operations/versions/readVersion';
import { saveVersion } from '@/app/_server/operations/versions/saveVersion';
import { Refusal } from '@/app/_server/refusal';
import { COMPILER_VERSION, sha256Hex } from '@/compiler/index';
import { BROKEN_TEXT, SOUND_TEXT } from '../support/recipeTexts';
import { createTestDatabase, type TestDatabase } from '../support/testDatabase';
import { createWorld, type World } from '../support/world';

let test: TestDatabase;
let world: World;
let recipeId: string;
let count = 0;

beforeAll(async () => {
  test = await createTestDatabase();
  world = await createWorld(test.database);
});

afterAll(async () => {
  await test.drop();
});

beforeEach(async () => {
  count += 1;
  const created = await createRecipe(await world.callerFor(world.people.admin), {
    slug: world.slug,
    name: `recipe_${count}`,
    title: 'A recipe',
    text: 'v1',
    message: 'First',
  });
  recipeId = created.id;
});

async function save(person: string, parent: number, text: string, idempotencyKey?: string) {
  return saveVersion(await world.callerFor(person), {
    recipeId,
    parent,
    text,
    message: `Save ${text}`.slice(0, 50),
    idempotencyKey,
  });
}

async function numbers(): Promise<readonly number[]> {
  const { items } = await listVersions(await world.callerFor(world.people.viewer), { recipeId, limit: 100 });
  return items.map(({ number }) => number);
}

function auditOf(id: string) {
  return test.database('audit_log').where({ subject_id: id }).orderBy('id');
}

describe('saving a version', () => {
  it('keeps text, author, parent, hash, findings and compiler, and is the newest then', async () => {
    const saved = await save(world.people.rigger, 1, BROKEN_TEXT);
    expect(saved).toMatchObject({
      number: 2,
      parent: 1,
      contentHash: sha256Hex(BROKEN_TEXT),
      compilerVersion: COMPILER_VERSION,
      author: { id: world.people.rigger, name: 'rigger' },
      state: 'saved',
    });
    expect(saved.errors).toBeGreaterThan(0);
    expect((await save(world.people.reviewer, 2, SOUND_TEXT)).errors).toBe(0);
    const viewer = await world.callerFor(world.people.viewer);
    expect((await readVersion(viewer, { recipeId, number: 2 })).text).toBe(BROKEN_TEXT);
    expect((await readRecipe(viewer, { recipeId })).latest).toMatchObject({
      number: 3,
      author: { name: 'reviewer' },
      errors: 0,
    });
  });

  it('keeps any Unicode text byte for byte', async () => {
    const text = '\ufeff# “ÿ”\r\n\tname: 🐇\u2028\u202e\u0001';
    await save(world.people.rigger, 1, text);
    const { text: read } = await readVersion(await world.callerFor(world.people.viewer), {
      recipeId,
      number: 2,
    });
    expect(read).toBe(text);
  });

  it('is refused on top of any version but the newest, with what was saved meanwhile', async () => {
    await save(world.people.reviewer, 1, 'theirs');
    for (const parent of [1, 3, 99]) {
      await expect(save(world.people.rigger, parent, 'mine')).rejects.toMatchObject({
        reason: {
          code: 'stale-parent',
          newest: { number: 2, text: 'theirs', author: { id: world.people.reviewer, name: 'reviewer' } },
        },
      });
    }
    expect(await numbers()).toEqual([2, 1]);
  });

  it('drops the draft of the person who saved and of nobody else', async () => {
    const rigger = await world.callerFor(world.people.rigger);
    const reviewer = await world.callerFor(world.people.reviewer);
    const draft = { recipeId, text: 'draft', basedOn: 1, expected: { kind: 'none' } } as const;
    await writeDraft(rigger, draft);
    await writeDraft(reviewer, draft);
    await save(world.people.rigger, 1, 'next');
    expect(await findDraft(rigger, { recipeId })).toBeNull();
    expect(await findDraft(reviewer, { recipeId })).toMatchObject({ text: 'draft', basedOn: 1 });
    await expect(save(world.people.reviewer, 1, 'late')).rejects.toThrow(Refusal);
    expect(await findDraft(reviewer, { recipeId })).toMatchObject({ text: 'draft' });
  });

  it('loses nothing and doubles nothing when many save at once', async () => {
    const savers = [world.people.rigger, world.people.reviewer, world.people.admin];
    const outcomes = await Promise.allSettled(
      Array.from({ length: 40 }, (_, index) => save(savers[index % 3] ?? '', 1, `text ${index}`)),
    );
    const saved = outcomes.filter(({ status }) => status === 'fulfilled');
    const refused = outcomes.flatMap((outcome) => (outcome.status === 'rejected' ? [outcome.reason] : []));
    expect(saved).toHaveLength(1);
    expect(refused.map(({ reason }) => reason?.code)).toEqual(Array(39).fill('stale-parent'));
    expect(await numbers()).toEqual([2, 1]);
  });

  it('numbers without a gap when everybody tries again until they are through', async () => {
    const savers = [world.people.rigger, world.people.reviewer, world.people.admin];
    const saveAtLast = async (person: string, text: string): Promise<void> => {
      for (let parent = 1; ; ) {
        try {
          await save(person, parent, text);
          return;
        } catch (thrown) {
          if (!(thrown instanceof Refusal) || thrown.reason.code !== 'stale-parent') throw thrown;
          parent = thrown.reason.newest.number;
        }
      }
    };
    await Promise.all(
      Array.from({ length: 12 }, (_, index) => saveAtLast(savers[index % 3] ?? '', `t${index}`)),
    );
    expect(await numbers()).toEqual([13, 12, 11, 10, 9, 8, 7, 6, 5, 4, 3, 2, 1]);
    const viewer = await world.callerFor(world.people.viewer);
    const texts = await Promise.all(
      Array.from(
        { length: 12 },
        async (_, index) => (await readVersion(viewer, { recipeId, number: index + 2 })).text,
      ),
    );
    expect(texts.toSorted()).toEqual(Array.from({ length: 12 }, (_, index) => `t${index}`).toSorted());
    expect(await auditOf(recipeId)).toHaveLength(13);
  });

  it('happens once for one idempotency key, also when the same request comes many times at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 8 }, () => save(world.people.rigger, 1, 'once', 'key-1')),
    );
    expect(new Set(answers.map(({ number }) => number))).toEqual(new Set([2]));
    expect(await numbers()).toEqual([2, 1]);
    expect((await save(world.people.rigger, 1, 'once', 'key-1')).number).toBe(2);
    await expect(save(world.people.rigger, 1, 'else', 'key-1')).rejects.toMatchObject({
      reason: { code: 'idempotency-key-reused' },
    });
    // The key belongs to the person: somebody else may use the same word.
    expect((await save(world.people.reviewer, 2, 'theirs', 'key-1')).number).toBe(3);
  });

  it('remembers a key for a day', async () => {
    await save(world.people.rigger, 1, 'once', 'key-3');
    await test.database.raw("update idempotency_keys set created_at = created_at - interval '25 hours'");
    expect((await save(world.people.rigger, 2, 'new', 'key-4')).number).toBe(3);
    expect(await test.database('idempotency_keys').select('key')).toEqual([{ key: 'key-4' }]);
  });

  it('keeps no answer of a request that was refused', async () => {
    await expect(save(world.people.rigger, 9, 'again', 'key-2')).rejects.toThrow(Refusal);
    expect((await save(world.people.rigger, 1, 'again', 'key-2')).number).toBe(2);
  });

  it('is written into the audit log with person, place and number', async () => {
    await save(world.people.rigger, 1, 'next');
    const entries = await auditOf(recipeId);
    expect(entries.map(({ action }) => action)).toEqual(['recipe.create', 'version.save']);
    expect(entries[1]).toMatchObject({
      person_id: world.people.rigger,
      show_id: world.showId,
      address: '192.0.2.7',
      details: { number: 2 },
    });
  });
});

describe('creating a recipe', () => {
  it('leaves nothing behind when the name is taken', async () => {
    const before = await test.database('audit_log').count({ total: '*' });
    const again = createRecipe(await world.callerFor(world.people.rigger), {
      slug: world.slug,
      name: `recipe_${count}`,
      title: 'Again',
      text: 'x',
      message: 'Again',
    });
    await expect(again).rejects.toMatchObject({ reason: { code: 'name-taken' } });
    expect(await test.database('audit_log').count({ total: '*' })).toEqual(before);
  });

  it('lets one of many of one name through', async () => {
    const caller = await world.callerFor(world.people.rigger);
    const outcomes = await Promise.allSettled(
      Array.from({ length: 10 }, () =>
        createRecipe(caller, { slug: world.slug, name: 'wanted', title: 'W', text: 'x', message: 'F' }),
      ),
    );
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });
});

describe('a recipe that extends another', () => {
  it('is compiled with the version it names, from its own show only', async () => {
    const rigger = await world.callerFor(world.people.rigger);
    const text = 'format: 1\nrecipe: child\nextends: cart@1\n';
    const make = async (caller: typeof rigger, slug: string) =>
      createRecipe(caller, { slug, name: `child_${count}`, title: 'Child', text, message: 'First' });
    expect((await make(rigger, world.slug)).latest).toMatchObject({ errors: 0 });
    const stranger = await world.callerFor(world.people.stranger);
    expect((await make(stranger, 'second')).latest?.errors).toBeGreaterThan(0);
  });
});
