import type { MergedDocument } from '../merge/types';
import type { Path } from '../syntax/types';

/** Whether any document wrote a value at a path. */
export function isWritten(document: MergedDocument, path: Path): boolean {
  return document.layers.some((layer) => layer.has(path));
}
