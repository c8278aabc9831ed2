import type { FindingList } from '../findings/FindingList';
import type { Span } from '../source/SourceText';
import { slipwayFindings } from './findings';
import { type Line, spanInLine, spanOfLine } from './lines';
import { scanString } from './scanString';
import type { Pair, Statement, Value } from './Value';

// Sticky patterns, one a terminal of the grammar. Strings, which may be long, are scanned by a loop instead: an
// alternation under a star keeps a backtracking state for every character.
const WORD = /[+-]?[A-Za-z][A-Za-z0-9_]*/y;
const NUMBER = /-?(?:0|[1-9][0-9]*)(?:\.[0-9]+)?(?:[eE][+-]?[0-9]+)?/y;

/** What could not be read, where; thrown and caught within this file only, so that the rules below read plainly. */
class Unreadable {
  constructor(
    readonly at: number,
    readonly expected: string,
  ) {}
}

/** Reads one line by the rules of the grammar, each method being the rule it is named for. */
class LineReader {
  #at: number;
  readonly #line: Line;
  readonly #text: string;

  constructor(line: Line) {
    this.#line = line;
    this.#at = line.start;
    this.#text = line.source.text;
  }

  statement(): Statement {
    const [verb, verbSpan] = this.#word('a verb');
    this.#literal(' ');
    const name = this.#string();
    const pairs: Pair[] = [];
    while (this.#at < this.#line.end) {
      this.#literal(' ');
      pairs.push(this.#pair());
    }
    const { number } = this.#line;
    const span = spanOfLine(this.#line);
    return { verb, verbSpan, name: name.value, nameSpan: name.span, pairs, line: number, span };
  }

  #pair(): Pair {
    const [key, keySpan] = this.#word('a key');
    this.#literal('=');
    return { key, keySpan, value: this.#value() };
  }

  #value(): Value {
    const start = this.#at;
    if (this.#next() === '(') return this.#list();
    if (this.#text.startsWith('attr(', start) && start + 5 <= this.#line.end) return this.#attribute();
    return this.#scalar();
  }

  #scalar(): Value {
    const start = this.#at;
    if (this.#next() === '"') return this.#string();
    const number = this.#match(NUMBER);
    if (number !== undefined) {
      const value = Number(number);
      if (!Number.isFinite(value)) throw new Unreadable(start, 'a number a double can hold');
      return { kind: 'number', value: value + 0, span: this.#from(start) };
    }
    const [value, span] = this.#word('a value');
    return { kind: 'word', value, span };
  }

  #list(): Value {
    const start = this.#at;
    const items: Value[] = [];
    this.#literal('(');
    while (this.#next() !== ')') {
      if (items.length > 0) this.#literal(' ', 'a space or ")"');
      items.push(this.#scalar());
    }
    this.#literal(')');
    return { kind: 'list', items, span: this.#from(start) };
  }

  #attribute(): Value {
    const start = this.#at;
    this.#at += 'attr('.length;
    const control = this.#string();
    this.#literal(' ');
    const attribute = this.#string();
    this.#literal(')');
    return { kind: 'attribute', control, attribute, span: this.#from(start) };
  }

  #string(): Extract<Value, { kind: 'string' }> {
    const start = this.#at;
    if (this.#next() !== '"') throw new Unreadable(start, 'a text in quotes');
    const scanned = scanString(this.#text, start, this.#line.end);
    if (!scanned.closed) throw new Unreadable(scanned.at, scanned.expected);
    this.#at = scanned.end;
    return { kind: 'string', value: scanned.value, span: this.#from(start) };
  }

  #word(expected: string): readonly [string, Span] {
    const start = this.#at;
    const word = this.#match(WORD);
    if (word === undefined) throw new Unreadable(start, expected);
    return [word, this.#from(start)];
  }

  #literal(character: string, expected = character === ' ' ? 'a space' : `"${character}"`): void {
    if (this.#next() !== character) throw new Unreadable(this.#at, expected);
    this.#at += 1;
  }

  #next(): string {
    return this.#at < this.#line.end ? (this.#text[this.#at] ?? '') : '';
  }

  #match(pattern: RegExp): string | undefined {
    pattern.lastIndex = this.#at;
    const found = pattern.exec(this.#text)?.[0];
    if (found === undefined || this.#at + found.length > this.#line.end) return undefined;
    this.#at += found.length;
    return found;
  }

  #from(start: number): Span {
    return spanInLine(this.#line, start, this.#at);
  }
}

function describeFound(line: Line, at: number): string {
  if (at >= line.end) return 'the end of the line';
  const character = String.fromCodePoint(line.source.text.codePointAt(at) ?? 0);
  return JSON.stringify(character);
}

/** Reads one line by the grammar; null with one finding at the first place that does not fit. */
export function parseLine(line: Line, findings: FindingList): Statement | null {
  try {
    return new LineReader(line).statement();
  } catch (problem) {
    if (!(problem instanceof Unreadable)) throw problem;
    const span = spanInLine(line, problem.at, Math.min(problem.at + 1, line.end));
    const found = describeFound(line, problem.at);
    findings.report(slipwayFindings, 'script-syntax', span, { expected: problem.expected, found });
    return null;
  }
}
