import type { Fix } from '../findings/Finding';
import type { MergedDocument } from '../merge/types';
import type { Path } from '../syntax/types';
import { textAt } from './textAt';

/** What to write in place of what. */
export interface Rewriting {
  readonly path: Path;
  readonly part?: 'key' | 'value';
  readonly newText: string;
}

/**
 * A fix that writes other text over keys or values, to be spread into a report. Nothing when one of them was never
 * written, so that no edit lands on a neighbour. Such a fix changes the rig and is therefore never applied unasked.
 */
export function rewrite(
  document: MergedDocument,
  title: string,
  rewritings: readonly Rewriting[],
): { readonly fix?: Fix } {
  const isWritten = rewritings.every(({ path, part }) => textAt(document, path, part) !== null);
  if (!isWritten || rewritings.length === 0) return {};
  const edits = rewritings.map(({ path, part, newText }) => ({
    span: document.spanAt(path, part ?? 'value'),
    newText,
  }));
  return { fix: { title, safe: false, edits } };
}
