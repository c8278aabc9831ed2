import type { KeyboardEvent } from 'react';

/** How far each key moves in a list of so many; null for keys that mean nothing in one. */
function target(key: string, at: number, count: number): number | null {
  switch (key) {
    case 'ArrowDown':
      return at + 1;
    case 'ArrowUp':
      return at - 1;
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}

/**
 * Moves the keyboard through the buttons of a long list with the arrow keys, Home and End, so that the whole list is
 * one stop on the way of the Tab key.
 */
export function stepThrough(event: KeyboardEvent<HTMLElement>): void {
  const buttons = [...event.currentTarget.querySelectorAll('button')];
  const at = buttons.indexOf(document.activeElement as HTMLButtonElement);
  const next = target(event.key, at, buttons.length);
  if (at < 0 || next === null) return;
  event.preventDefault();
  buttons[next]?.focus();
}
