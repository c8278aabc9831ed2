import type { Finding } from '../../compiler/index';
import { printable } from './printable';

/** Most characters of a line that are shown; a line may be a whole file. */
const WIDTH = 160;
/** Of them, how many before the place that is pointed at. */
const BEFORE = 60;

/** The line a finding stands on, numbered, with carets under its exact place; of a long line only what is around it. */
export function frame({ span }: Finding, text: string): string {
  const line = text.split('\n', span.startLine)[span.startLine - 1]?.replace(/\r$/, '') ?? '';
  const first = span.startColumn - 1;
  const last = span.endLine === span.startLine ? span.endColumn - 1 : line.length;
  const from = line.length > WIDTH ? Math.max(0, first - BEFORE) : 0;
  const shown = printable(line.slice(from, from + WIDTH));
  const lead = from > 0 ? '…' : '';
  const tail = from + WIDTH < line.length ? '…' : '';
  // Tabs are kept, so that the carets stand under the text however wide the terminal draws them.
  const indent = `${lead}${shown.slice(0, first - from)}`.replace(/[^\t]/g, ' ');
  const carets = '^'.repeat(Math.max(1, Math.min(last, from + WIDTH) - first));
  return `${String(span.startLine).padStart(5)} | ${lead}${shown}${tail}\n      | ${indent}${carets}`;
}
