import type { StageContext } from '../expand/StageContext';
import { closestNames } from '../findings/closestNames';
import type { Vec3 } from '../rig/Rig';
import type { Span } from '../source/SourceText';
import { LIMITS } from '../syntax/limits';
import type { Path } from '../syntax/types';
import { isPoint, recipeFunctionNames } from './environment';
import { expressionFindings } from './findings';
import { type NameRead, parseExpression } from './parseExpression';

/** What an expression must give at its place. */
export type Wanted = 'number' | 'point';

/** A landmark as expressions see it: the left point's x y z, and the right point. */
export interface LandmarkValue {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly right: { readonly x: number; readonly y: number; readonly z: number };
}

/** Gives the value of a landmark that was worked out before; null when it has none. */
export type FindLandmark = (name: string) => LandmarkValue | null;

const SCOPE_WORDS: Readonly<Record<NameRead['scope'], string>> = {
  params: 'parameter',
  landmarks: 'landmark',
  functions: 'function',
};
const WORDS: Readonly<Record<Wanted, string>> = { number: 'a number', point: 'a point' };

function describe(value: unknown): string {
  if (isPoint(value)) return 'a point';
  if (typeof value === 'number') return 'a number';
  if (typeof value === 'boolean') return 'true or false';
  return typeof value === 'string' ? 'text' : 'something else';
}

/** Works out single expressions against parameters and landmarks, and reports what is wrong at its exact place. */
export class Evaluator {
  /** Parsed expressions by text: the order of landmarks needs them before their values do. */
  readonly #parsed = new Map<string, ReturnType<typeof parseExpression>>();
  readonly #names: Readonly<Record<NameRead['scope'], ReadonlySet<string>>>;

  constructor(
    private readonly context: StageContext,
    private readonly params: Readonly<Record<string, number>>,
    landmarkNames: readonly string[],
    private readonly findLandmark: FindLandmark,
  ) {
    this.#names = {
      params: new Set(Object.keys(params)),
      landmarks: new Set(landmarkNames),
      functions: new Set(recipeFunctionNames),
    };
  }

  #parse(text: string): ReturnType<typeof parseExpression> {
    const known = this.#parsed.get(text);
    if (known) return known;
    const parsed = parseExpression(text.slice(1));
    this.#parsed.set(text, parsed);
    return parsed;
  }

  /** The landmarks that an expression (text with its `=`) reads. */
  landmarksRead(text: string): readonly string[] {
    const parsed = this.#parse(text);
    if ('fault' in parsed) return [];
    return parsed.reads.filter(({ scope }) => scope === 'landmarks').map(({ name }) => name);
  }

  /** The span of a part of the expression where the author's text holds it unchanged, else of the whole value. */
  #spanInside(path: Path, text: string, start: number, end: number): Span {
    const whole = this.context.document.spanAt(path);
    const source = this.context.document.layers.find((layer) => layer.source.name === whole.source)?.source
      .text;
    const written = source?.slice(whole.start, whole.end) ?? '';
    const quote = /^["']/.test(written) ? 1 : 0;
    const first = whole.start + quote;
    if (written.slice(quote, quote + text.length) !== text || whole.startLine !== whole.endLine) return whole;
    // One more for the "=" that the expression itself does not have; an empty place is widened to be seen.
    const from = Math.min(first + 1 + start, whole.end - 1);
    const to = Math.min(Math.max(first + 1 + end, from + 1), whole.end);
    return {
      ...whole,
      start: from,
      end: to,
      startColumn: whole.startColumn + (from - whole.start),
      endColumn: whole.startColumn + (to - whole.start),
    };
  }

  /** Reports a name that is not there; true when all names are. Silent where the cause was reported before. */
  #knowsNames(reads: readonly NameRead[], path: Path, text: string): boolean {
    let known = true;
    for (const { scope, name, start, end } of reads) {
      const names = this.#names[scope];
      if (names.has(name)) continue;
      known = false;
      if (this.context.poisoned.has(`${scope}/${name}`) || this.context.poisoned.has(scope)) continue;
      const close = closestNames(name, names);
      const [only] = close;
      const span = this.#spanInside(path, text, start, end);
      this.context.findings.report(
        expressionFindings,
        'expression-unknown-name',
        span,
        { what: SCOPE_WORDS[scope], name },
        only === undefined
          ? {}
          : {
              help: `Did you mean ${close.map((item) => `"${item}"`).join(' or ')}?`,
              ...(close.length === 1 && span.end - span.start === name.length
                ? { fix: { title: `Write "${only}"`, safe: false, edits: [{ span, newText: only }] } }
                : {}),
            },
      );
    }
    return known;
  }

  /** The value of an expression (text with its `=`), or null with a finding, or silently when a cause is known. */
  evaluate(text: string, path: Path, wanted: Wanted): number | Vec3 | null {
    const { findings } = this.context;
    const parsed = this.#parse(text);
    if ('fault' in parsed) {
      const { problem, start, end } = parsed.fault;
      findings.report(expressionFindings, 'expression-syntax', this.#spanInside(path, text, start, end), {
        problem,
      });
      return null;
    }
    if (!this.#knowsNames(parsed.reads, path, text)) return null;
    const landmarks: Record<string, LandmarkValue> = {};
    for (const { scope, name } of parsed.reads) {
      if (scope !== 'landmarks') continue;
      const value = this.findLandmark(name);
      if (!value) return null;
      landmarks[name] = value;
    }
    const result = parsed.evaluate({ params: this.params, landmarks });
    if ('fault' in result) {
      const { problem, start, end } = result.fault;
      findings.report(expressionFindings, 'expression-failed', this.#spanInside(path, text, start, end), {
        problem,
      });
      return null;
    }
    return this.#accept(result.value, path, wanted);
  }

  #accept(value: unknown, path: Path, wanted: Wanted): number | Vec3 | null {
    const { findings, document } = this.context;
    const point: Vec3 | null = isPoint(value) ? [value.x, value.y, value.z] : null;
    const fits = wanted === 'point' ? point : typeof value === 'number' ? value : null;
    if (fits === null) {
      const span = document.spanAt(path);
      findings.report(expressionFindings, 'expression-type', span, {
        found: describe(value),
        wanted: WORDS[wanted],
      });
      return null;
    }
    for (const part of typeof fits === 'number' ? [fits] : fits) {
      if (!Number.isFinite(part)) {
        findings.report(expressionFindings, 'expression-not-finite', document.spanAt(path), {
          value: String(part),
        });
        return null;
      }
      if (Math.abs(part) > LIMITS.magnitude) {
        const parameters = { value: String(part), limit: LIMITS.magnitude };
        findings.report(expressionFindings, 'expression-too-large', document.spanAt(path), parameters);
        return null;
      }
    }
    return typeof fits === 'number' ? fits + 0 : [fits[0] + 0, fits[1] + 0, fits[2] + 0];
  }
}
