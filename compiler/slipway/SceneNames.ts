import type { FindingList } from '../findings/FindingList';
import type { RigNode } from '../rig/Rig';
import type { Span } from '../source/SourceText';
import { slipwayFindings } from './findings';
import type { PlacedStep } from './readStep';
import type { Statement } from './Value';
import { VERBS } from './verbs';

type NodeKind = RigNode['kind'];

/** Names that the statements of a script make, with the line of each; the earliest counts. */
function collectMadeNames(statements: readonly Statement[]): ReadonlyMap<string, number> {
  const made = new Map<string, number>();
  for (const { verb, name, line } of statements) {
    const makes = Object.hasOwn(VERBS, verb) && VERBS[verb as keyof typeof VERBS].name === 'new';
    if (makes && verb !== 'scene' && !made.has(name)) made.set(name, line);
  }
  return made;
}

/**
 * The names of a scene while its script runs: what is taken, what each reference means, and a finding where it means
 * nothing.
 */
export class SceneNames {
  readonly #findings: FindingList;
  readonly #linesOfNames: ReadonlyMap<string, number>;
  readonly #everyLineRead: boolean;
  readonly #steps = new Map<string, PlacedStep>();
  readonly #kinds = new Map<string, NodeKind>();

  /**
   * `statements` are all that could be read by the grammar; `everyLineRead` is false when some could not, so that
   * what those would have made is not reported missing as well.
   */
  constructor(statements: readonly Statement[], everyLineRead: boolean, findings: FindingList) {
    this.#findings = findings;
    this.#linesOfNames = collectMadeNames(statements);
    this.#everyLineRead = everyLineRead;
  }

  /** Takes the step's name for it, with the kind of node it makes or null; false with a finding when it is taken. */
  take(placed: PlacedStep, kind: NodeKind | null): boolean {
    const { name } = placed.step;
    const first = this.#steps.get(name);
    if (first !== undefined) {
      const related = [{ span: first.nameSpan, label: 'first made here' }];
      this.#findings.report(slipwayFindings, 'script-name-taken', placed.nameSpan, { name }, { related });
      return false;
    }
    this.#steps.set(name, placed);
    if (kind !== null) this.#kinds.set(name, kind);
    return true;
  }

  /** Where the thing of that name was made. */
  spanOf(name: string): Span | undefined {
    return this.#steps.get(name)?.nameSpan;
  }

  /** Whether `name`, written at `span`, is a node made so far, and of kind `expected` if given; else a finding. */
  isNode(name: string, span: Span, line: number, expected: NodeKind | null = null): boolean {
    const kind = this.#kinds.get(name);
    if (kind !== undefined) {
      if (expected === null || kind === expected) return true;
      this.#findings.report(slipwayFindings, 'script-reference-kind', span, { name, kind, expected });
      return false;
    }
    const madeOn = this.#linesOfNames.get(name);
    if (madeOn !== undefined && madeOn > line) {
      const parameters = { name, line: madeOn };
      this.#findings.report(slipwayFindings, 'script-reference-forward', span, parameters);
    } else if (this.#steps.has(name) || madeOn === line || (madeOn === undefined && this.#everyLineRead)) {
      this.#findings.report(slipwayFindings, 'script-reference-unknown', span, { name });
    }
    // What is left was made on a line that has a finding of its own.
    return false;
  }
}
