import { closeSync, openSync, readSync } from 'node:fs';
import type { SourceText } from '../../compiler/index';
import { printable } from './printable';
import { WrongUse } from './WrongUse';

/** Far above anything people write; a larger file is none of ours, and is not read into memory. */
const MOST_BYTES = 64 * 1024 * 1024;
const CHUNK_BYTES = 1024 * 1024;

/**
 * Counted while reading, as the size a file states says nothing of a pipe or a device.
 * Null when there is more than `MOST_BYTES`.
 */
function readBytes(path: string): Buffer | null {
  const file = openSync(path, 'r');
  try {
    const chunks: Buffer[] = [];
    for (let total = 0; total <= MOST_BYTES; ) {
      const chunk = Buffer.alloc(CHUNK_BYTES);
      const count = readSync(file, chunk);
      if (count === 0) return Buffer.concat(chunks);
      chunks.push(chunk.subarray(0, count));
      total += count;
    }
    return null;
  } finally {
    closeSync(file);
  }
}

/** The text of a file, under the name it was called by; a file that cannot be read is a wrong use. */
export function readText(path: string): SourceText {
  let bytes: Buffer | null;
  try {
    bytes = readBytes(path);
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    const reason =
      code === 'ENOENT'
        ? 'there is no such file'
        : code === 'EISDIR'
          ? 'it is a folder'
          : (code ?? 'unknown');
    throw new WrongUse(`${printable(path)} cannot be read: ${reason}.`);
  }
  if (bytes === null) throw new WrongUse(`${printable(path)} is larger than 64 MiB.`);
  return { name: path, text: bytes.toString('utf8') };
}
