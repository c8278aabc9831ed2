import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listRecipes } from '@/app/_server/operations/recipes/listRecipes';
import type { RecipeListItem, RecipeListQuery } from '@/app/api/v1/_contracts/recipe';
import { createTestDatabase, type TestDatabase } from '../support/testDatabase';
import { createWorld, type World } from '../support/world';

/** Titles with twins, cases, accents and characters that mean something in LIKE. */
const TITLES = [
  'Hare',
  'hare',
  'Häre',
  'Heron',
  'heron 100%',
  'under_score',
  'back\\slash',
  'Zander',
  'Eel',
  'Eel',
];

let test: TestDatabase;
let world: World;

beforeAll(async () => {
  test = await createTestDatabase();
  world = await createWorld(test.database);
  const rows = Array.from({ length: 60 }, (_, index) => ({
    show_id: world.showId,
    name: `r${(index * 37) % 60}`,
    title: TITLES[index % TITLES.length] ?? '',
    created_by: world.people.rigger,
    // Several recipes share a moment, so that only the id tells them apart.
    changed_at: new Date(Date.UTC(2026, 0, 1, 0, 0, 0, Math.floor(index / 7))),
  }));
  await test.database('recipes').insert(rows);
});

afterAll(async () => {
  await test.drop();
});

async function list(query: Partial<RecipeListQuery>) {
  const caller = await world.callerFor(world.people.viewer);
  return listRecipes(caller, {
    slug: world.slug,
    search: '',
    sort: 'name',
    direction: 'asc',
    limit: 100,
    ...query,
  });
}

async function walk(query: Partial<RecipeListQuery>): Promise<readonly RecipeListItem[]> {
  const items: RecipeListItem[] = [];
  for (let cursor: string | undefined; ; ) {
    const page = await list({ ...query, ...(cursor ? { cursor } : {}) });
    items.push(...page.items);
    expect(page.items.length).toBeLessThanOrEqual(query.limit ?? 100);
    if (page.nextCursor === null) return items;
    cursor = page.nextCursor;
  }
}

describe('lists of recipes', () => {
  it('give every recipe once and in one order, whatever the size of a page', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom('name' as const, 'title' as const, 'changed' as const),
        fc.constantFrom('asc' as const, 'desc' as const),
        fc.constantFrom('', 'h', 'eel'),
        fc.integer({ min: 1, max: 70 }),
        async (sort, direction, search, limit) => {
          const whole = await list({ sort, direction, search });
          const walked = await walk({ sort, direction, search, limit });
          expect(walked.map(({ id }) => id)).toEqual(whole.items.map(({ id }) => id));
          expect(new Set(walked.map(({ id }) => id)).size).toBe(whole.total);
        },
      ),
      { numRuns: 40, seed: 20261201 },
    );
  });

  it('turn around exactly when the direction does', async () => {
    for (const sort of ['name', 'title', 'changed'] as const) {
      const up = await list({ sort, direction: 'asc' });
      const down = await list({ sort, direction: 'desc' });
      expect(down.items.map(({ id }) => id)).toEqual(up.items.map(({ id }) => id).toReversed());
    }
  });

  it('sort titles as people do, not bytewise', async () => {
    const { items } = await list({ sort: 'title' });
    const titles = [...new Set(items.map(({ title }) => title))];
    expect(titles.indexOf('hare')).toBeLessThan(titles.indexOf('Heron'));
    expect(titles.indexOf('Häre')).toBeLessThan(titles.indexOf('Heron'));
  });

  it.each([
    ['100%', 'heron 100%'],
    ['r_s', 'under_score'],
    ['k\\s', 'back\\slash'],
  ])('take "%s" for itself, not for a pattern', async (search, title) => {
    const { items } = await list({ search });
    expect(new Set(items.map((item) => item.title))).toEqual(new Set([title]));
  });

  it('search without regard to case, in name and title', async () => {
    expect((await list({ search: 'ZANDER' })).total).toBe(6);
    expect((await list({ search: 'R59' })).items.map(({ name }) => name)).toEqual(['r59']);
  });

  it('keep a place when a recipe is added before it', async () => {
    const first = await list({ sort: 'name', limit: 10 });
    await test.database('recipes').insert({
      show_id: world.showId,
      name: 'aaa',
      title: 'Newcomer',
      created_by: world.people.rigger,
    });
    const second = await list({ sort: 'name', limit: 10, cursor: first.nextCursor ?? '' });
    const seen = new Set(first.items.map(({ id }) => id));
    expect(second.items.filter(({ id }) => seen.has(id))).toEqual([]);
  });

  it('refuse a cursor of another order, a broken one and a hostile one', async () => {
    const { nextCursor } = await list({ sort: 'name', limit: 5 });
    const hostile = Buffer.from('{"sort":"name","direction":"asc","value":{"a":1},"id":"x"}').toString(
      'base64url',
    );
    for (const query of [
      { sort: 'title' as const, cursor: nextCursor ?? '' },
      { direction: 'desc' as const, cursor: nextCursor ?? '' },
      { cursor: 'AAAA' },
      { cursor: hostile },
    ]) {
      await expect(list(query)).rejects.toMatchObject({ reason: { code: 'invalid-cursor' } });
    }
  });

  it.each([
    ['recipes_by_name', 'show_id = :show order by name collate "C", id'],
    ['recipes_by_title', 'show_id = :show order by title collate "und-x-icu", id'],
    ['recipes_by_change', 'show_id = :show order by changed_at, id'],
    ['recipes_by_search', "name || ' ' || title ilike '%heron%'"],
  ])('have the index %s behind them', async (index, rest) => {
    const plan = await test.database.transaction(async (transaction) => {
      await transaction.raw('set local enable_seqscan = off; set local enable_sort = off');
      const { rows } = await transaction.raw(`explain select id from recipes where ${rest}`, {
        show: world.showId,
      });
      return JSON.stringify(rows);
    });
    expect(plan).toContain(index);
  });
});
