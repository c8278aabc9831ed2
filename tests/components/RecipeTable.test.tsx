import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { type RecipeListItem, recipeListQuerySchema } from '@/app/api/v1/_contracts/recipe';
import { RecipeTable } from '@/components/recipes/RecipeTable';

afterEach(cleanup);

const item = (name: string, errors: number, warnings: number): RecipeListItem => ({
  id: `00000000-0000-4000-8000-00000000000${name.length}`,
  name,
  title: `The ${name}`,
  latest: {
    number: 4,
    author: { id: '00000000-0000-4000-8000-000000000009', name: 'Marta' },
    createdAt: '2026-12-01T09:30:00.000Z',
    message: 'Longer ears',
    errors,
    warnings,
  },
});
const fresh: RecipeListItem = { ...item('barrel', 0, 0), latest: null };

function show(
  items: readonly RecipeListItem[],
  query: Record<string, unknown> = {},
  more: { nextCursor?: string; mayWrite?: boolean } = {},
) {
  const { nextCursor = null, mayWrite = true } = more;
  render(
    <RecipeTable
      slug="post"
      list={{ items: [...items], nextCursor, total: items.length }}
      query={recipeListQuerySchema.parse(query)}
      mayWrite={mayWrite}
    />,
  );
}
const hrefOf = (name: string | RegExp): URL =>
  new URL(screen.getByRole('link', { name }).getAttribute('href') ?? '', 'https://x.invalid');

describe('recipes of a show', () => {
  it('have a row each, with version, author and findings in words', () => {
    show([item('eel', 2, 1), item('hare', 0, 1), item('mouse', 0, 0), fresh]);
    const cells = screen
      .getAllByRole('row')
      .slice(1)
      .map((row) =>
        within(row)
          .getAllByRole('cell')
          .map(({ textContent }) => textContent),
      );
    const version = '4 · 2026-12-01 09:30Longer ears';
    expect(cells.map((row) => row.slice(0, 4))).toEqual([
      ['eel', version, 'Marta', '2 errors'],
      ['hare', version, 'Marta', '1 warning'],
      ['mouse', version, 'Marta', 'clean'],
      ['barrel', '', '', ''],
    ]);
    expect(hrefOf('The hare').pathname).toBe(`/recipes/${item('hare', 0, 0).id}`);
    expect(hrefOf('Versions of The hare').pathname).toBe(`/recipes/${item('hare', 0, 0).id}/versions`);
    expect(screen.getByText('4 recipes')).toBeDefined();
  });

  it('are sorted by a heading, and the other way round by the same', () => {
    show([item('hare', 0, 0)], { sort: 'title', direction: 'asc', search: 'ha', cursor: 'abc' });
    const title = screen.getByRole('columnheader', { name: 'Title' });
    expect(title.getAttribute('aria-sort')).toBe('ascending');
    expect(screen.getByRole('columnheader', { name: 'Name' }).getAttribute('aria-sort')).toBe('none');
    expect(Object.fromEntries(hrefOf('Title').searchParams)).toEqual({
      sort: 'title',
      direction: 'desc',
      search: 'ha',
    });
    expect(Object.fromEntries(hrefOf('Name').searchParams)).toEqual({
      sort: 'name',
      direction: 'asc',
      search: 'ha',
    });
  });

  it('lead on to the next page and back to the first', () => {
    show([item('hare', 0, 0)], { cursor: 'abc' }, { nextCursor: 'a b&c' });
    expect(hrefOf('Next page').searchParams.get('cursor')).toBe('a b&c');
    expect(hrefOf('First page').searchParams.get('cursor')).toBeNull();
    cleanup();
    show([item('hare', 0, 0)]);
    expect(screen.queryByRole('link', { name: /page/ })).toBeNull();
    expect(screen.getByText('1 recipe')).toBeDefined();
  });

  it('say what to do when there are none', () => {
    show([], { search: 'wombat' });
    expect(screen.getByText(/No recipe has “wombat” in its name or title\./)).toBeDefined();
    expect(hrefOf('Show all recipes').pathname).toBe('/shows/post');
    cleanup();
    show([]);
    expect(screen.getByText(/Begin with New recipe/)).toBeDefined();
    cleanup();
    show([], {}, { mayWrite: false });
    expect(screen.getByText(/A rigger of the show can make the first one\./)).toBeDefined();
  });
});
