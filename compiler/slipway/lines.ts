import type { SourceText, Span } from '../source/SourceText';

/** One line of a script without its line feed. */
export interface Line {
  readonly source: SourceText;
  /** Counted from 1. */
  readonly number: number;
  /** Where it begins and ends (exclusive) in the whole text. */
  readonly start: number;
  readonly end: number;
}

/** The lines of a text; what follows the last line feed is a line only when there is something. */
export function splitLines(source: SourceText): readonly Line[] {
  const lines: Line[] = [];
  let start = 0;
  while (start < source.text.length) {
    const feed = source.text.indexOf('\n', start);
    const end = feed < 0 ? source.text.length : feed;
    lines.push({ source, number: lines.length + 1, start, end });
    start = end + 1;
  }
  return lines;
}

/** The span from one offset of the whole text to another, both on `line`. */
export function spanInLine(line: Line, start: number, end: number): Span {
  return {
    source: line.source.name,
    start,
    end,
    startLine: line.number,
    startColumn: start - line.start + 1,
    endLine: line.number,
    endColumn: end - line.start + 1,
  };
}

/** The span of a whole line. */
export function spanOfLine(line: Line): Span {
  return spanInLine(line, line.start, line.end);
}
