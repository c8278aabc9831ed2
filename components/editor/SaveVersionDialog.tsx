'use client';

import { useMutation } from '@tanstack/react-query';
import { Dialog } from 'radix-ui';
import { type FormEvent, useRef, useState } from 'react';
import type { CreateVersionRequest, NewestVersion, VersionListItem } from '@/app/api/v1/_contracts/version';
import { ApiProblem } from '@/components/api/ApiProblem';
import { TextComparison } from '@/components/versions/TextComparison';

export interface SaveVersionDialogProps {
  readonly recipeId: string;
  readonly parent: number;
  readonly text: string;
  readonly errorCount: number;
  /** Saves; the same key is given again when the same save is tried again. */
  save(version: CreateVersionRequest, key: string): Promise<VersionListItem>;
  onSaved(version: VersionListItem): void;
  /** Goes on from the version that somebody else saved. */
  takeTheirs(number: number): Promise<void>;
  onClose(): void;
}

function failureWords(error: unknown): string {
  return error instanceof ApiProblem
    ? error.problem.detail
    : 'The server cannot be reached. Your text is still here; try again.';
}

/** Asks what changed and saves the next version; when somebody was quicker, shows both sides first. */
export function SaveVersionDialog(props: SaveVersionDialogProps) {
  const { recipeId, parent, text, errorCount, onSaved, onClose } = props;
  const [message, setMessage] = useState('');
  const [newest, setNewest] = useState<NewestVersion | null>(null);
  const attempt = useRef({ asked: '', key: '' });
  const save = useMutation({
    mutationFn: () => {
      const version = { parent: newest?.number ?? parent, message, text };
      const asked = JSON.stringify(version);
      if (attempt.current.asked !== asked) attempt.current = { asked, key: crypto.randomUUID() };
      return props.save(version, attempt.current.key);
    },
    onSuccess: onSaved,
    onError(error) {
      if (error instanceof ApiProblem && error.problem.newest) setNewest(error.problem.newest);
    },
  });
  const take = useMutation({ mutationFn: props.takeTheirs });
  const isStale = save.error instanceof ApiProblem && save.error.problem.code === 'stale-parent';
  const isBusy = save.isPending || take.isPending;
  const failure = take.error ?? (isStale ? null : save.error);

  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (message.trim() !== '') save.mutate();
  };

  return (
    <Dialog.Root open onOpenChange={(open) => !open && !isBusy && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="dialog-veil" />
        <Dialog.Content className={newest ? 'dialog-sheet dialog-sheet-wide' : 'dialog-sheet'}>
          <Dialog.Title className="dialog-title">Save version {(newest?.number ?? parent) + 1}</Dialog.Title>
          <Dialog.Description className="text-ink-soft">
            {newest
              ? `${newest.author.name} saved version ${newest.number} while you were working. Nothing of yours is lost: look at both, then choose.`
              : 'A version is kept for good. Say in a line what changed, for those who read it later.'}
          </Dialog.Description>
          {newest && (
            <>
              <TextComparison
                beforeTitle={`Version ${newest.number}, ${newest.author.name}`}
                before={newest.text}
                afterTitle="Yours"
                after={text}
              />
              <a
                className="plain-action mt-3 inline-block"
                href={`/recipes/${recipeId}/compare?from=${parent}&to=${newest.number}`}
                target="_blank"
                rel="noopener"
              >
                See what changed from version {parent} to {newest.number} (in a new window)
              </a>
            </>
          )}
          <form onSubmit={submit} className="mt-4 grid gap-3">
            {errorCount > 0 && (
              <p className="finding finding-warning px-3 py-2">
                This text has {errorCount} error{errorCount === 1 ? '' : 's'}. It can be kept, but nothing can
                be built from it.
              </p>
            )}
            <label className="grid gap-1">
              What changed
              <input
                className="plain-input"
                value={message}
                maxLength={500}
                required
                onChange={(event) => setMessage(event.target.value)}
              />
            </label>
            {failure && (
              <p role="alert" className="text-signal">
                {failureWords(failure)}
              </p>
            )}
            <div className="flex flex-wrap gap-3">
              <button type="submit" className="action action-main" disabled={isBusy || message.trim() === ''}>
                {save.isPending
                  ? 'Saving…'
                  : newest
                    ? `Save mine after version ${newest.number}`
                    : 'Save version'}
              </button>
              {newest && (
                <button
                  type="button"
                  className="action"
                  disabled={isBusy}
                  onClick={() => take.mutate(newest.number)}
                >
                  Go on from version {newest.number}
                </button>
              )}
              <Dialog.Close asChild>
                <button type="button" className="action" disabled={isBusy}>
                  Not now
                </button>
              </Dialog.Close>
            </div>
          </form>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
