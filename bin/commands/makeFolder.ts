import { mkdirSync, statSync } from 'node:fs';
import { dirname, resolve } from 'node:path';

/** Whether the folder is there in the end; false when the one it would lie in is not. */
function tryToMake(path: string): boolean {
  try {
    mkdirSync(path);
    return true;
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    if (code === 'ENOENT') return false;
    if (code === 'EEXIST' && statSync(path).isDirectory()) return true;
    throw error;
  }
}

/**
 * Makes a folder and those it lies in; what is there already stays. Throws the system's error when it cannot.
 * Node's own `recursive` never ends where a folder can have no children, as below /proc.
 */
export function makeFolder(folder: string): void {
  const path = resolve(folder);
  if (tryToMake(path)) return;
  makeFolder(dirname(path));
  if (!tryToMake(path)) throw Object.assign(new Error(`${path} cannot be made`), { code: 'ENOENT' });
}
