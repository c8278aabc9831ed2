import type { Span } from '../../source/SourceText';

function lineBreaks(text: string, from: number, to: number): number {
  let count = 0;
  for (let at = text.indexOf('\n', from); at >= 0 && at < to; at = text.indexOf('\n', at + 1)) count += 1;
  return count;
}

/** The span between two offsets, counted from one that is known nearby: only the text between is looked at. */
export function spanNear(known: Span, text: string, start: number, end: number): Span {
  const line = (offset: number): number =>
    offset >= known.start
      ? known.startLine + lineBreaks(text, known.start, offset)
      : known.startLine - lineBreaks(text, offset, known.start);
  const column = (offset: number): number => (offset === 0 ? 1 : offset - text.lastIndexOf('\n', offset - 1));
  return {
    source: known.source,
    start,
    end,
    startLine: line(start),
    startColumn: column(start),
    endLine: line(end),
    endColumn: column(end),
  };
}
