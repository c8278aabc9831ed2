'use client';

import { useMutation } from '@tanstack/react-query';
import { Dialog } from 'radix-ui';
import { type FormEvent, useState } from 'react';
import type { NewestVersion, VersionListItem } from '@/app/api/v1/_contracts/version';
import { ApiProblem } from '@/components/api/ApiProblem';
import { createVersion } from './editorApi';
import { TwoSides } from './TwoSides';

export interface SaveVersionDialogProps {
  readonly recipeId: string;
  readonly parent: number;
  readonly text: string;
  readonly errorCount: number;
  onSaved(version: VersionListItem): void;
  onTakeTheirs(newest: NewestVersion): void;
  onClose(): void;
}

/** Asks what changed and saves the next version; when somebody was quicker, shows both sides first. */
export function SaveVersionDialog(props: SaveVersionDialogProps) {
  const { recipeId, parent, text, errorCount, onSaved, onTakeTheirs, onClose } = props;
  const [message, setMessage] = useState('');
  const [newest, setNewest] = useState<NewestVersion | null>(null);
  const save = useMutation({
    mutationFn: () => createVersion(recipeId, { parent: newest?.number ?? parent, message, text }),
    onSuccess: onSaved,
    onError(error) {
      if (error instanceof ApiProblem && error.problem.newest) setNewest(error.problem.newest);
    },
  });
  const isStale = save.error instanceof ApiProblem && save.error.problem.code === 'stale-parent';

  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (message.trim() !== '') save.mutate();
  };

  return (
    <Dialog.Root open onOpenChange={(open) => !open && onClose()}>
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
            <TwoSides
              leftTitle={`Version ${newest.number}, ${newest.author.name}`}
              left={newest.text}
              rightTitle="Yours"
              right={text}
            />
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
            {save.isError && !isStale && (
              <p role="alert" className="text-signal">
                {save.error instanceof ApiProblem
                  ? save.error.problem.detail
                  : 'The server cannot be reached. Your text is still here; try again.'}
              </p>
            )}
            <div className="flex flex-wrap gap-3">
              <button
                type="submit"
                className="action action-main"
                disabled={save.isPending || message.trim() === ''}
              >
                {save.isPending
                  ? 'Saving…'
                  : newest
                    ? `Save mine after version ${newest.number}`
                    : 'Save version'}
              </button>
              {newest && (
                <button type="button" className="action" onClick={() => onTakeTheirs(newest)}>
                  Go on from version {newest.number}
                </button>
              )}
              <Dialog.Close asChild>
                <button type="button" className="action">
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
