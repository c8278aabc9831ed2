import type { Span } from '../source/SourceText';

/** A value as written, before its key says what it must be. */
export type Value =
  | { readonly kind: 'string'; readonly value: string; readonly span: Span }
  | { readonly kind: 'number'; readonly value: number; readonly span: Span }
  | { readonly kind: 'word'; readonly value: string; readonly span: Span }
  | { readonly kind: 'list'; readonly items: readonly Value[]; readonly span: Span }
  | { readonly kind: 'attribute'; readonly control: Value; readonly attribute: Value; readonly span: Span };

export interface Pair {
  readonly key: string;
  readonly keySpan: Span;
  readonly value: Value;
}

/** One line by the grammar alone. */
export interface Statement {
  readonly verb: string;
  readonly verbSpan: Span;
  readonly name: string;
  readonly nameSpan: Span;
  readonly pairs: readonly Pair[];
  readonly line: number;
  readonly span: Span;
}
