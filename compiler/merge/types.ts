import type { RelatedPlace } from '../findings/Finding';
import type { Span } from '../source/SourceText';
import type { JsonValue, Path, SourceDocument } from '../syntax/types';

/** Documents merged in order by RFC 7396, later ones winning, with the origin of every value kept. */
export interface MergedDocument {
  readonly value: JsonValue | undefined;
  readonly layers: readonly SourceDocument[];
  /** True when one of the layers is not YAML throughout. */
  readonly isBroken: boolean;
  /** Entries in which a layer's value was refused. */
  readonly refusedEntries: ReadonlySet<string>;
  /** Where the value at `path` was set last. */
  spanAt(path: Path, part?: 'value' | 'key'): Span;
  /** Earlier layers that had set the same value, for `related`. */
  earlierPlaces(path: Path): readonly RelatedPlace[];
}
