import Link from 'next/link';
import type { VersionList } from '@/app/api/v1/_contracts/version';
import { instantWords } from '@/components/frame/dates';

export interface VersionTableProps {
  readonly recipeId: string;
  readonly list: VersionList;
  readonly isFirstPage: boolean;
}

/** Versions of a recipe, a row each, with what can be done with them. */
export function VersionTable({ recipeId, list, isFirstPage }: VersionTableProps) {
  const newest = isFirstPage ? list.items[0]?.number : undefined;
  return (
    <>
      <table className="list-table mt-6">
        <thead>
          <tr>
            <th scope="col">Version</th>
            <th scope="col">What changed</th>
            <th scope="col">By</th>
            <th scope="col">When (UTC)</th>
            <th scope="col">Hash</th>
            <th scope="col">Findings</th>
            <th scope="col">
              <span className="sr-only">Do</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {list.items.map(
            ({ number, parent, message, author, createdAt, contentHash, errors, warnings, state }) => (
              <tr key={number}>
                <th scope="row">
                  <Link
                    className="list-title figures"
                    href={
                      number === newest ? `/recipes/${recipeId}` : `/recipes/${recipeId}?version=${number}`
                    }
                  >
                    {number}
                  </Link>
                  <span className="block font-normal text-ink-soft text-sm">{state}</span>
                </th>
                <td className="max-w-md">{message}</td>
                <td>{author.name}</td>
                <td className="figures">{instantWords(createdAt)}</td>
                <td className="figures">{contentHash.slice(0, 12)}</td>
                <td className={errors > 0 ? 'text-error' : ''}>
                  {errors > 0
                    ? `${errors} error${errors === 1 ? '' : 's'}`
                    : warnings > 0
                      ? `${warnings} warning${warnings === 1 ? '' : 's'}`
                      : 'clean'}
                </td>
                <td>
                  <span className="flex flex-wrap justify-end gap-x-4">
                    {parent !== null && (
                      <Link
                        className="plain-action"
                        href={`/recipes/${recipeId}/compare?from=${parent}&to=${number}`}
                      >
                        Compare with {parent}
                      </Link>
                    )}
                    {errors === 0 && (
                      <a
                        className="plain-action"
                        href={`/api/v1/recipes/${recipeId}/versions/${number}/build/archive`}
                      >
                        Download build<span className="sr-only"> of version {number}</span>
                      </a>
                    )}
                  </span>
                </td>
              </tr>
            ),
          )}
        </tbody>
      </table>
      <p className="mt-4 flex gap-6">
        {!isFirstPage && (
          <Link className="plain-action" href={`/recipes/${recipeId}/versions`}>
            Newest versions
          </Link>
        )}
        {list.nextCursor !== null && (
          <Link className="plain-action" href={`/recipes/${recipeId}/versions?cursor=${list.nextCursor}`}>
            Older versions
          </Link>
        )}
      </p>
    </>
  );
}
