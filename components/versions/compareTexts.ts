import { diffLines, diffWordsWithSpace } from 'diff';

/** A stretch of a line; changed ones are marked. */
export interface Piece {
  readonly text: string;
  /** Where it begins in its line. */
  readonly start: number;
  readonly isChanged: boolean;
}

/** One line of one side. */
export interface ComparedLine {
  readonly number: number;
  readonly pieces: readonly Piece[];
}

/** A row of the comparison: the same line on both sides, or a line that only one side has, or that changed. */
export interface ComparedRow {
  readonly kind: 'same' | 'changed' | 'removed' | 'added';
  readonly before: ComparedLine | null;
  readonly after: ComparedLine | null;
}

/** Rows in the order of the text; a run of equal ones that is longer than its surroundings need can be folded. */
export interface ComparedBlock {
  readonly kind: 'rows' | 'folded';
  readonly rows: readonly ComparedRow[];
}

/** Equal lines kept in sight around a change. */
const CONTEXT = 3;

function toLines(value: string): readonly string[] {
  return value.replace(/\n$/, '').split('\n');
}

function plain(text: string): readonly Piece[] {
  return [{ text, start: 0, isChanged: false }];
}

/** The two sides of a changed line, by words. */
function byWords(
  before: string,
  after: string,
): { readonly before: readonly Piece[]; readonly after: readonly Piece[] } {
  const parts = diffWordsWithSpace(before, after);
  const side = (skip: 'added' | 'removed'): readonly Piece[] => {
    const pieces: Piece[] = [];
    let start = 0;
    for (const { value, added, removed } of parts.filter((part) => !part[skip])) {
      pieces.push({ text: value, start, isChanged: added === true || removed === true });
      start += value.length;
    }
    return pieces;
  };
  return { before: side('added'), after: side('removed') };
}

function toRows(before: string, after: string): readonly ComparedRow[] {
  const rows: ComparedRow[] = [];
  let left = 0;
  let right = 0;
  let removed: readonly string[] = [];
  const flushRemoved = (): void => {
    for (const text of removed) {
      left += 1;
      rows.push({ kind: 'removed', before: { number: left, pieces: plain(text) }, after: null });
    }
    removed = [];
  };
  for (const part of diffLines(before, after)) {
    const lines = toLines(part.value);
    if (part.removed) {
      flushRemoved();
      removed = lines;
    } else if (part.added) {
      // Lines taken out and put in at one place are read as changed, line by line, as far as they go together.
      const together = Math.min(removed.length, lines.length);
      for (let index = 0; index < together; index += 1) {
        left += 1;
        right += 1;
        const words = byWords(removed[index] ?? '', lines[index] ?? '');
        rows.push({
          kind: 'changed',
          before: { number: left, pieces: words.before },
          after: { number: right, pieces: words.after },
        });
      }
      removed = removed.slice(together);
      flushRemoved();
      for (const text of lines.slice(together)) {
        right += 1;
        rows.push({ kind: 'added', before: null, after: { number: right, pieces: plain(text) } });
      }
    } else {
      flushRemoved();
      for (const text of lines) {
        left += 1;
        right += 1;
        rows.push({
          kind: 'same',
          before: { number: left, pieces: plain(text) },
          after: { number: right, pieces: plain(text) },
        });
      }
    }
  }
  flushRemoved();
  return rows;
}

/** Compares two texts line by line and word by word, and folds what is the same far from any change. */
export function compareTexts(before: string, after: string): readonly ComparedBlock[] {
  const rows = toRows(before, after);
  const isNear = rows.map(() => false);
  rows.forEach(({ kind }, index) => {
    if (kind === 'same') return;
    for (
      let near = Math.max(0, index - CONTEXT);
      near <= Math.min(rows.length - 1, index + CONTEXT);
      near += 1
    )
      isNear[near] = true;
  });
  const blocks: { kind: ComparedBlock['kind']; rows: ComparedRow[] }[] = [];
  rows.forEach((row, index) => {
    const kind = isNear[index] ? 'rows' : 'folded';
    const last = blocks[blocks.length - 1];
    if (last?.kind === kind) last.rows.push(row);
    else blocks.push({ kind, rows: [row] });
  });
  return blocks;
}
