import type { MergedDocument } from '../merge/types';
import type { Path } from '../syntax/types';

/** The author's own text at a path; null when no document wrote a value there. */
export function textAt(document: MergedDocument, path: Path, part: 'key' | 'value' = 'value'): string | null {
  if (!document.layers.some((layer) => layer.has(path))) return null;
  const span = document.spanAt(path, part);
  const layer = document.layers.find(({ source }) => source.name === span.source);
  return layer ? layer.source.text.slice(span.start, span.end) : null;
}
