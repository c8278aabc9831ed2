import type { SourceText, Span } from './SourceText';

/** Finds lines and columns in one text; line starts are listed on first use, because most texts have no findings. */
export class LineIndex {
  #starts: number[] | null = null;

  constructor(private readonly source: SourceText) {}

  #lineStarts(): number[] {
    if (this.#starts) return this.#starts;
    const starts = [0];
    const { text } = this.source;
    for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) starts.push(at + 1);
    this.#starts = starts;
    return starts;
  }

  #place(offset: number): { readonly line: number; readonly column: number } {
    const starts = this.#lineStarts();
    let low = 0;
    let high = starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if ((starts[middle] as number) <= offset) low = middle;
      else high = middle - 1;
    }
    return { line: low + 1, column: offset - (starts[low] as number) + 1 };
  }

  /** The span between two offsets, which are moved inside the text if they lie outside. */
  span(start: number, end: number): Span {
    const size = this.source.text.length;
    const from = Math.min(Math.max(start, 0), size);
    const to = Math.min(Math.max(end, from), size);
    const first = this.#place(from);
    const last = this.#place(to);
    return {
      source: this.source.name,
      start: from,
      end: to,
      startLine: first.line,
      startColumn: first.column,
      endLine: last.line,
      endColumn: last.column,
    };
  }
}
