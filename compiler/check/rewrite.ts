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

/** Whether a value has a name by which other places repeat it: they would change along. */
function isAnchored(document: MergedDocument, path: Path): boolean {
  if (typeof path.at(-1) !== 'string') return false;
  const key = document.spanAt(path, 'key');
  const value = document.spanAt(path);
  const layer = document.layers.find(({ source }) => source.name === key.source);
  return layer?.source.text.slice(key.end, value.start).includes('&') ?? false;
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
  const canWrite = rewritings.every(
    ({ path, part }) => textAt(document, path, part) !== null && !isAnchored(document, path),
  );
  if (!canWrite || rewritings.length === 0) return {};
  const edits = rewritings.map(({ path, part, newText }) => ({
    span: document.spanAt(path, part ?? 'value'),
    newText,
  }));
  return { fix: { title, safe: false, edits } };
}
