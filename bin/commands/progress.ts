import { printable } from './printable';

/** A line on a terminal that says which of several files is being worked on; elsewhere it stays silent. */
export function startProgress(total: number, { isWanted }: { readonly isWanted: boolean }) {
  const isShown = isWanted && total > 1 && process.stderr.isTTY;
  return {
    show(index: number, file: string): void {
      if (isShown) process.stderr.write(`\r${index + 1}/${total} ${printable(file)}\u001b[K`);
    },
    clear(): void {
      if (isShown) process.stderr.write('\r\u001b[K');
    },
  };
}
