'use client';

import { Dialog } from 'radix-ui';
import { useRef, useState } from 'react';
import { stepThrough } from '@/components/ui/stepThrough';

/** Something a person can do on the page. */
export interface Command {
  readonly words: string;
  readonly keys: string | null;
  run(): void;
}

/** Everything that can be done here, to be found by typing a few letters. */
export function CommandList({
  commands,
  onClose,
}: {
  readonly commands: readonly Command[];
  onClose(): void;
}) {
  const [search, setSearch] = useState('');
  const words = search.trim().toLowerCase();
  const found = commands.filter((command) => command.words.toLowerCase().includes(words));
  const list = useRef<HTMLUListElement>(null);
  const chosen = useRef<Command | null>(null);
  const run = (command: Command | undefined): void => {
    if (!command) return;
    chosen.current = command;
    onClose();
  };
  return (
    <Dialog.Root open onOpenChange={(open) => !open && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="dialog-veil" />
        <Dialog.Content
          className="dialog-sheet"
          aria-describedby={undefined}
          onCloseAutoFocus={(event) => {
            // The list gives the keyboard back to where it came from, unless a command takes it elsewhere.
            if (!chosen.current) return;
            event.preventDefault();
            chosen.current.run();
          }}
        >
          <Dialog.Title className="dialog-title">What would you like to do?</Dialog.Title>
          <form
            onSubmit={(event) => {
              event.preventDefault();
              run(found[0]);
            }}
          >
            <input
              className="plain-input w-full"
              aria-label="Search the commands"
              value={search}
              onKeyDown={(event) => {
                if (event.key !== 'ArrowDown') return;
                event.preventDefault();
                list.current?.querySelector('button')?.focus();
              }}
              onChange={(event) => setSearch(event.target.value)}
            />
          </form>
          <ul className="mt-3 divide-y divide-rule" ref={list} onKeyDown={stepThrough}>
            {found.map((command) => (
              <li key={command.words}>
                <button type="button" className="command-row" onClick={() => run(command)}>
                  <span>{command.words}</span>
                  {command.keys && <kbd className="figures text-ink-soft text-sm">{command.keys}</kbd>}
                </button>
              </li>
            ))}
          </ul>
          {found.length === 0 && <p className="mt-3 text-ink-soft">No command has these letters.</p>}
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
