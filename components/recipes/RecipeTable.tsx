import Link from 'next/link';
import type { RecipeList, RecipeListQuery } from '@/app/api/v1/_contracts/recipe';
import { instantWords } from '@/components/frame/dates';

export interface RecipeTableProps {
  readonly slug: string;
  readonly list: RecipeList;
  readonly query: RecipeListQuery;
  readonly mayWrite: boolean;
}

const COLUMNS: readonly { readonly sort: RecipeListQuery['sort']; readonly words: string }[] = [
  { sort: 'title', words: 'Title' },
  { sort: 'name', words: 'Name' },
  { sort: 'changed', words: 'Last version' },
];

function address(slug: string, query: RecipeListQuery, change: Partial<RecipeListQuery>): string {
  const { search, sort, direction, cursor } = { ...query, cursor: undefined, ...change };
  const parameters = new URLSearchParams({ sort, direction });
  if (search !== '') parameters.set('search', search);
  if (cursor !== undefined) parameters.set('cursor', cursor);
  return `/shows/${slug}?${parameters}`;
}

function findingWords(errors: number, warnings: number): string {
  if (errors > 0) return `${errors} error${errors === 1 ? '' : 's'}`;
  return warnings > 0 ? `${warnings} warning${warnings === 1 ? '' : 's'}` : 'clean';
}

function Empty({ query, slug, mayWrite }: Pick<RecipeTableProps, 'query' | 'slug' | 'mayWrite'>) {
  if (query.search !== '') {
    return (
      <p className="mt-8">
        No recipe has “{query.search}” in its name or title.{' '}
        <Link className="plain-action" href={`/shows/${slug}`}>
          Show all recipes
        </Link>
      </p>
    );
  }
  return (
    <p className="mt-8 max-w-prose">
      This show has no recipes yet.{' '}
      {mayWrite
        ? 'Begin with New recipe: a sample gives you a rig that already works, and you change it from there.'
        : 'A rigger of the show can make the first one.'}
    </p>
  );
}

/** The recipes of a show, a row each. */
export function RecipeTable({ slug, list, query, mayWrite }: RecipeTableProps) {
  if (list.items.length === 0) return <Empty query={query} slug={slug} mayWrite={mayWrite} />;
  return (
    <>
      <table className="list-table mt-6">
        <thead>
          <tr>
            {COLUMNS.map(({ sort, words }) => {
              const isSorted = query.sort === sort;
              const direction = isSorted && query.direction === 'asc' ? 'desc' : 'asc';
              return (
                <th
                  key={sort}
                  scope="col"
                  aria-sort={isSorted ? (query.direction === 'asc' ? 'ascending' : 'descending') : 'none'}
                >
                  <Link className="plain-action" href={address(slug, query, { sort, direction })}>
                    {words}
                    {isSorted && <span aria-hidden> {query.direction === 'asc' ? '↑' : '↓'}</span>}
                  </Link>
                </th>
              );
            })}
            <th scope="col">By</th>
            <th scope="col">Findings</th>
            <th scope="col">
              <span className="sr-only">More</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {list.items.map(({ id, name, title, latest }) => (
            <tr key={id}>
              <th scope="row">
                <Link className="list-title" href={`/recipes/${id}`}>
                  {title}
                </Link>
              </th>
              <td className="figures">{name}</td>
              <td>
                {latest && (
                  <>
                    <span className="figures">
                      {latest.number} · {instantWords(latest.createdAt)}
                    </span>
                    <span className="block max-w-md truncate text-ink-soft text-sm">{latest.message}</span>
                  </>
                )}
              </td>
              <td>{latest?.author.name}</td>
              <td className={latest && latest.errors > 0 ? 'text-error' : ''}>
                {latest && findingWords(latest.errors, latest.warnings)}
              </td>
              <td className="text-right">
                <Link className="plain-action" href={`/recipes/${id}/versions`}>
                  Versions <span className="sr-only">of {title}</span>
                </Link>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-4 flex flex-wrap gap-6">
        <span className="text-ink-soft">
          {list.total} recipe{list.total === 1 ? '' : 's'}
        </span>
        {query.cursor !== undefined && (
          <Link className="plain-action" href={address(slug, query, {})}>
            First page
          </Link>
        )}
        {list.nextCursor !== null && (
          <Link className="plain-action" href={address(slug, query, { cursor: list.nextCursor })}>
            Next page
          </Link>
        )}
      </p>
    </>
  );
}
