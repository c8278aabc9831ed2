import type { RelatedPlace } from '../findings/Finding';
import type { Span } from '../source/SourceText';
import type { JsonValue, Path, SourceDocument } from '../syntax/types';
import { mergePatch } from './mergePatch';
import type { MergedDocument } from './types';

/**
 * Merges documents in order by RFC 7396 and remembers where values came from: the origin of a value is the last
 * document that wrote its path, looked up only when someone asks.
 */
export function mergeDocuments(layers: readonly SourceDocument[]): MergedDocument {
  const written = layers.filter(({ value }) => value !== undefined);
  const value = written.reduce<JsonValue | undefined>(
    (merged, layer) => mergePatch(merged, layer.value ?? null),
    undefined,
  );
  const newestFirst = [...layers].reverse();

  const spanAt = (path: Path, part: 'value' | 'key' = 'value'): Span => {
    for (let size = path.length; size >= 0; size -= 1) {
      const origin = newestFirst.find((layer) => layer.has(path.slice(0, size)));
      // The whole path goes to the layer, which shows a missing end at the key around it.
      if (origin) return origin.spanAt(path, part);
    }
    const [newest] = newestFirst;
    if (!newest) throw new RangeError('mergeDocuments was given no documents');
    return newest.spanAt([], part);
  };

  const earlierPlaces = (path: Path): readonly RelatedPlace[] =>
    newestFirst
      .filter((layer) => layer.has(path))
      .slice(1)
      .map((layer) => ({ span: layer.spanAt(path), label: `set before in ${layer.source.name}` }));

  return {
    value,
    layers,
    isBroken: layers.some((layer) => layer.isBroken),
    refusedEntries: new Set(layers.flatMap((layer) => [...layer.refusedEntries])),
    spanAt,
    earlierPlaces,
  };
}
