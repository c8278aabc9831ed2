import type { Span } from '../source/SourceText';

/** `error` stops the build; `warning` does not; `info` explains a choice the compiler made. */
export type Severity = 'error' | 'warning' | 'info';

/** Another place that belongs to the same trouble, e.g. the first of two things with one name. */
export interface RelatedPlace {
  readonly span: Span;
  readonly label: string;
}

/** A repair as data. `safe` ones keep the meaning of everything else and may be applied without asking. */
export interface Fix {
  readonly title: string;
  readonly safe: boolean;
  readonly edits: readonly { readonly span: Span; readonly newText: string }[];
}

/** One diagnostic about something a person wrote. Findings are values; the compiler never throws them. */
export interface Finding {
  readonly code: string;
  readonly severity: Severity;
  /** One sentence of fact, names in quotes. */
  readonly message: string;
  readonly span: Span;
  readonly related: readonly RelatedPlace[];
  /** What to do next, in one or two sentences. */
  readonly help: string;
  readonly fix?: Fix;
}
