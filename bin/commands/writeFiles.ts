import { renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { makeFolder } from './makeFolder';
import { printable } from './printable';
import { WrongUse } from './WrongUse';

/** One file to be written. */
export interface WrittenFile {
  readonly name: string;
  readonly text: string;
  readonly encoding: 'utf8' | 'base64';
}

function cannotWrite(folder: string, error: unknown): WrongUse {
  const code = (error as NodeJS.ErrnoException).code;
  const reason = code === 'EEXIST' || code === 'ENOTDIR' ? 'it is not a folder' : (code ?? 'unknown');
  return new WrongUse(`${printable(folder)} cannot be written to: ${reason}.`);
}

/**
 * Writes files into a folder, made if need be. Each is written beside its place and then moved there, and none is
 * moved before all are written, so that nothing half-written is ever seen under its name.
 */
export function writeFiles(folder: string, files: readonly WrittenFile[]): void {
  const drafts = files.map(({ name, text, encoding }) => ({
    content: Buffer.from(text, encoding),
    place: join(folder, name),
    draft: join(folder, `.${name}.${process.pid}`),
  }));
  try {
    makeFolder(folder);
  } catch (error) {
    throw cannotWrite(folder, error);
  }
  try {
    for (const { draft, content } of drafts) writeFileSync(draft, content);
    for (const { draft, place } of drafts) renameSync(draft, place);
  } catch (error) {
    for (const { draft } of drafts) rmSync(draft, { force: true });
    throw cannotWrite(folder, error);
  }
}
