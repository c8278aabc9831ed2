import type { MergedDocument } from '../../merge/types';
import type { Span } from '../../source/SourceText';
import type { Path } from '../../syntax/types';

/** Where a map entry stands in the one text that wrote it. */
export interface EntrySpans {
  readonly key: Span;
  readonly text: string;
  readonly keyStart: number;
  readonly keyEnd: number;
  readonly valueStart: number;
  readonly valueEnd: number;
}

/**
 * Finds a map entry for editing; null when several documents wrote it, so that an edit of one would only uncover
 * another's.
 */
export function entrySpans(document: MergedDocument, path: Path): EntrySpans | null {
  const writers = document.layers.filter((layer) => layer.has(path));
  const [layer] = writers;
  if (!layer || writers.length > 1) return null;
  const key = layer.spanAt(path, 'key');
  const value = layer.spanAt(path);
  const { text } = layer.source;
  const isPlain = key.source === value.source && key.end < value.start && value.end <= text.length;
  if (!isPlain) return null;
  return {
    key,
    text,
    keyStart: key.start,
    keyEnd: key.end,
    valueStart: value.start,
    valueEnd: value.end,
  };
}
