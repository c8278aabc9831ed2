import { type ComparedLine, type ComparedRow, compareTexts } from './compareTexts';

function Line({
  line,
  sign,
  words,
}: {
  readonly line: ComparedLine | null;
  readonly sign: string;
  readonly words: string;
}) {
  if (!line) return <td className="compared-none" colSpan={2} />;
  return (
    <>
      <td className="compared-number">{line.number}</td>
      <td className="compared-text">
        <span aria-hidden className="compared-sign">
          {sign}
        </span>
        {words !== '' && <span className="sr-only">{words}: </span>}
        {line.pieces.map(({ text, start, isChanged }) =>
          isChanged ? <mark key={start}>{text}</mark> : <span key={start}>{text}</span>,
        )}
      </td>
    </>
  );
}

/** What a reader who cannot see the colours hears before a line. */
const WORDS: Readonly<Record<ComparedRow['kind'], { readonly before: string; readonly after: string }>> = {
  same: { before: '', after: '' },
  changed: { before: 'before', after: 'after' },
  removed: { before: 'removed', after: '' },
  added: { before: '', after: 'added' },
};

function RowTable({ rows }: { readonly rows: readonly ComparedRow[] }) {
  return (
    <table className="compared-table figures">
      <colgroup>
        <col className="compared-number-column" />
        <col />
        <col className="compared-number-column" />
        <col />
      </colgroup>
      <tbody>
        {rows.map((row) => (
          <tr
            key={`${row.before?.number ?? ''}-${row.after?.number ?? ''}`}
            className={`compared compared-${row.kind}`}
          >
            <Line line={row.before} sign={row.kind === 'same' ? ' ' : '−'} words={WORDS[row.kind].before} />
            <Line line={row.after} sign={row.kind === 'same' ? ' ' : '+'} words={WORDS[row.kind].after} />
          </tr>
        ))}
      </tbody>
    </table>
  );
}

export interface TextComparisonProps {
  readonly beforeTitle: string;
  readonly before: string;
  readonly afterTitle: string;
  readonly after: string;
}

/** Two texts beside each other, by line and word; what is the same far from any change is folded. */
export function TextComparison({ beforeTitle, before, afterTitle, after }: TextComparisonProps) {
  const blocks = compareTexts(before, after);
  if (before === after) return <p className="mt-6">Both texts are the same.</p>;
  return (
    <div className="compared-blocks mt-6">
      <div className="compared-titles">
        <p>{beforeTitle}</p>
        <p>{afterTitle}</p>
      </div>
      {blocks.map(({ kind, rows }) => {
        const first = rows[0];
        const key = `${first?.before?.number ?? ''}-${first?.after?.number ?? ''}`;
        return kind === 'rows' ? (
          <RowTable key={key} rows={rows} />
        ) : (
          <details key={key}>
            <summary className="compared-fold">
              {rows.length} line{rows.length === 1 ? '' : 's'} the same
            </summary>
            <RowTable rows={rows} />
          </details>
        );
      })}
    </div>
  );
}
