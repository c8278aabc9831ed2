import type { Span } from '../../source/SourceText';

interface Place {
  readonly line: number;
  readonly column: number;
}

function placeNear(known: Span, text: string, offset: number): Place {
  const isAfter = offset >= known.start;
  // Cut out first: on a text that is one long line, a search would otherwise run on to its end.
  const between = isAfter ? text.slice(known.start, offset) : text.slice(offset, known.start);
  const breaks = between.split('\n').length - 1;
  const line = known.startLine + (isAfter ? breaks : -breaks);
  if (breaks === 0) return { line, column: known.startColumn + offset - known.start };
  if (isAfter) return { line, column: between.length - between.lastIndexOf('\n') };
  return { line, column: offset === 0 ? 1 : offset - text.lastIndexOf('\n', offset - 1) };
}

/** The span between two offsets, counted from one that is known nearby: only the text between is looked at. */
export function spanNear(known: Span, text: string, start: number, end: number): Span {
  const first = placeNear(known, text, start);
  const last = placeNear(known, text, end);
  return {
    source: known.source,
    start,
    end,
    startLine: first.line,
    startColumn: first.column,
    endLine: last.line,
    endColumn: last.column,
  };
}
