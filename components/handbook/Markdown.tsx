import { Marked, type Token, type Tokens } from 'marked';
import { Fragment, type ReactNode } from 'react';

const markdown = new Marked({ gfm: true });

/** An address within a page for a heading's words. */
export function headingAddress(words: string): string {
  return words
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');
}

function unescaped(text: string): string {
  return text
    .replaceAll('&lt;', '<')
    .replaceAll('&gt;', '>')
    .replaceAll('&quot;', '"')
    .replaceAll('&#39;', "'")
    .replaceAll('&amp;', '&');
}

function inline(tokens: readonly Token[] | undefined): ReactNode {
  return tokens?.map((token, index) => {
    // Tokens have no names of their own; their order never changes.
    const key = `${token.type}-${index}`;
    switch (token.type) {
      case 'codespan':
        return (
          <code key={key} className="figures">
            {unescaped(token.text as string)}
          </code>
        );
      case 'strong':
        return <strong key={key}>{inline(token.tokens)}</strong>;
      case 'em':
        return <em key={key}>{inline(token.tokens)}</em>;
      case 'text':
        return (
          <Fragment key={key}>
            {token.tokens ? inline(token.tokens) : unescaped(token.text as string)}
          </Fragment>
        );
      default:
        // Links, images and tags have no place in the handbook's texts; they are shown as they were written.
        return <Fragment key={key}>{token.raw}</Fragment>;
    }
  });
}

function Table({ table }: { readonly table: Tokens.Table }) {
  return (
    <table className="handbook-table">
      <thead>
        <tr>
          {table.header.map((cell) => (
            <th key={cell.text} scope="col" className="handbook-cell">
              {inline(cell.tokens)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {table.rows.map((row) => (
          <tr key={row.map(({ text }) => text).join('|')}>
            {row.map((cell, index) => (
              <td key={table.header[index]?.text ?? index} className="handbook-cell">
                {inline(cell.tokens)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Heading({ token, shift }: { readonly token: Tokens.Heading; readonly shift: number }) {
  const level = Math.min(6, token.depth + shift);
  const Tag = `h${level}` as 'h1' | 'h2' | 'h3' | 'h4' | 'h5' | 'h6';
  return <Tag id={headingAddress(token.text)}>{inline(token.tokens)}</Tag>;
}

function block(token: Token, key: string, shift: number): ReactNode {
  switch (token.type) {
    case 'heading':
      return <Heading key={key} token={token as Tokens.Heading} shift={shift} />;
    case 'paragraph':
      return <p key={key}>{inline(token.tokens)}</p>;
    case 'code':
      return (
        <pre key={key} className="handbook-code figures">
          {token.text as string}
        </pre>
      );
    case 'table':
      return <Table key={key} table={token as Tokens.Table} />;
    case 'list':
      return (
        <ul key={key}>
          {(token as Tokens.List).items.map((item) => (
            <li key={item.raw}>{blocks(item.tokens, shift)}</li>
          ))}
        </ul>
      );
    case 'text':
      return <Fragment key={key}>{inline(token.tokens)}</Fragment>;
    case 'space':
      return null;
    default:
      return <p key={key}>{token.raw}</p>;
  }
}

function blocks(tokens: readonly Token[], shift: number): ReactNode {
  return tokens.map((token, index) => block(token, `${token.type}-${index}`, shift));
}

/**
 * A text of the handbook, from Markdown. Nothing in it becomes markup: tokens are turned into elements one by one, and
 * what has no element here is shown as it was written. `shift` lowers headings; `withoutTitle` leaves out the first.
 */
export function Markdown({
  text,
  shift = 0,
  withoutTitle = false,
}: {
  readonly text: string;
  readonly shift?: number;
  readonly withoutTitle?: boolean;
}) {
  const tokens = markdown.lexer(text);
  const first = tokens.findIndex(({ type }) => type === 'heading');
  const shown = withoutTitle ? tokens.filter((_, index) => index !== first) : tokens;
  return <div className="handbook-text">{blocks(shown, shift)}</div>;
}
