import type { SourceText, Span } from '../source/SourceText';

export type JsonValue = null | boolean | number | string | JsonValue[] | { [key: string]: JsonValue };

/** Steps from the top of a document to a value: map keys and list positions. */
export type Path = readonly (string | number)[];

/** One parsed YAML text: its plain value and where each part of it was written. */
export interface SourceDocument {
  readonly source: SourceText;
  /** Undefined when the text was refused or holds nothing. */
  readonly value: JsonValue | undefined;
  /** True when the text is not YAML throughout, so that its structure cannot be relied upon. */
  readonly isBroken: boolean;
  /** Entries (`chains/arm`, or `title` at the top) in which a value was refused and therefore left out. */
  readonly refusedEntries: ReadonlySet<string>;
  /** Whether the author wrote anything at `path` in this very document. */
  has(path: Path): boolean;
  /** Where `path` was written: its value (default) or its key. Falls back to the nearest surviving parent. */
  spanAt(path: Path, part?: 'value' | 'key'): Span;
}
