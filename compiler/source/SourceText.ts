/** A named piece of text somebody wrote: a recipe, a house-rules document, a script. */
export interface SourceText {
  /** Shown to people and written into findings, e.g. `hare.recipe.yaml`. */
  readonly name: string;
  readonly text: string;
}

/**
 * A stretch of one source. Offsets count UTF-16 code units from 0, `end` is exclusive; lines and columns
 * count from 1, as editors and SARIF do. An empty stretch marks a place between two characters.
 */
export interface Span {
  readonly source: string;
  readonly start: number;
  readonly end: number;
  readonly startLine: number;
  readonly startColumn: number;
  readonly endLine: number;
  readonly endColumn: number;
}
