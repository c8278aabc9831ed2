'use client';

import { useQuery } from '@tanstack/react-query';
import { Dialog } from 'radix-ui';
import { ApiProblem } from '@/components/api/ApiProblem';
import { readBuild } from './editorApi';

export interface BuildDialogProps {
  readonly recipeId: string;
  readonly number: number;
  /** True while the text holds changes that this version does not. */
  readonly isChanged: boolean;
  onClose(): void;
}

/** A file's size as people read it: bytes up to a thousand, then kilobytes of a thousand. */
export function sizeWords(bytes: number): string {
  return bytes < 1000 ? `${bytes} bytes` : `${(bytes / 1000).toFixed(1)} kB`;
}

/** Every file of a version's build, one by one, with what proves that it arrived whole. */
export function BuildDialog({ recipeId, number, isChanged, onClose }: BuildDialogProps) {
  const build = useQuery({
    queryKey: ['build', recipeId, number],
    queryFn: () => readBuild(recipeId, number),
  });
  const address = `/api/v1/recipes/${recipeId}/versions/${number}/build`;
  return (
    <Dialog.Root open onOpenChange={(open) => !open && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="dialog-veil" />
        <Dialog.Content className="dialog-sheet">
          <Dialog.Title className="dialog-title">Build of version {number}</Dialog.Title>
          <Dialog.Description className="text-ink-soft">
            The same recipe always gives these very bytes; the SHA-256 beneath each file proves it.
            {isChanged && ' Your unsaved changes are not in them.'}
          </Dialog.Description>
          {build.isPending && (
            <p className="mt-4" role="status">
              Building…
            </p>
          )}
          {build.error && (
            <p className="mt-4 text-signal" role="alert">
              {build.error instanceof ApiProblem
                ? build.error.problem.detail
                : 'The server cannot be reached. Close this and try again.'}
            </p>
          )}
          <ul className="mt-4 divide-y divide-rule">
            {build.data?.files.map(({ name, bytes, sha256 }) => (
              <li key={name} className="py-2">
                <p className="flex flex-wrap items-baseline gap-x-4">
                  <a
                    className="plain-action figures"
                    href={`${address}/files/${encodeURIComponent(name)}`}
                    download
                  >
                    {name}
                  </a>
                  <span className="figures ml-auto text-ink-soft text-sm">{sizeWords(bytes)}</span>
                </p>
                <p className="figures break-all text-ink-soft text-xs">{sha256}</p>
              </li>
            ))}
          </ul>
          <div className="mt-4 flex flex-wrap gap-3">
            {build.data && (
              <a className="action action-main inline-flex items-center" href={`${address}/archive`} download>
                All of it as one zip
              </a>
            )}
            <Dialog.Close asChild>
              <button type="button" className="action">
                Close
              </button>
            </Dialog.Close>
          </div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
