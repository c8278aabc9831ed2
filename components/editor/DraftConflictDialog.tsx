'use client';

import { Dialog } from 'radix-ui';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import { TextComparison } from '@/components/versions/TextComparison';

export interface DraftConflictDialogProps {
  readonly other: Draft | null;
  readonly text: string;
  onKeepMine(): void;
  onTakeOther(): void;
}

/** Two windows worked on one draft: shows both and lets the person choose; neither is dropped silently. */
export function DraftConflictDialog({ other, text, onKeepMine, onTakeOther }: DraftConflictDialogProps) {
  return (
    <Dialog.Root open>
      <Dialog.Portal>
        <Dialog.Overlay className="dialog-veil" />
        <Dialog.Content
          className="dialog-sheet dialog-sheet-wide"
          onEscapeKeyDown={(event) => event.preventDefault()}
        >
          <Dialog.Title className="dialog-title">Another window changed this draft</Dialog.Title>
          <Dialog.Description className="text-ink-soft">
            {other
              ? 'You have this recipe open twice, and the other window stored its text first. Choose which one to go on with.'
              : 'The other window has saved a version or dropped the draft. You can go on with your text as a new draft.'}
          </Dialog.Description>
          {other && (
            <TextComparison
              beforeTitle="The other window"
              before={other.text}
              afterTitle="This window"
              after={text}
            />
          )}
          <div className="mt-4 flex flex-wrap gap-3">
            <button type="button" className="action action-main" onClick={onKeepMine}>
              Keep this window's text
            </button>
            <button type="button" className="action" onClick={onTakeOther}>
              {other ? "Take the other window's text" : 'Go back to the saved version'}
            </button>
          </div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
