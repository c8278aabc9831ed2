import type { Span } from '../source/SourceText';
import type { FindingDeclaration, ParametersOf } from './catalogue';
import type { Finding, Fix, RelatedPlace, Severity } from './Finding';

/** More findings than this help nobody; the count of those left out is said in one last finding. */
export const MAXIMUM_FINDINGS = 500;

/** Puts parameters into a message or help template; a missing one stays visible as `{name}`. */
export function fillTemplate(
  template: string,
  parameters: Readonly<Record<string, string | number>>,
): string {
  return template.replace(/\{(\w+)\}/g, (whole, name: string) => String(parameters[name] ?? whole));
}

/** Collects what a stage finds, so that one compile shows everything and nothing is thrown. */
export class FindingList {
  readonly #found: Finding[] = [];
  #errors = 0;
  #severities: ReadonlyMap<string, Severity | 'off'> = new Map();

  /** True once anything was reported that stops the build. */
  get hasErrors(): boolean {
    return this.#errors > 0;
  }

  get all(): readonly Finding[] {
    return this.#found;
  }

  /** Reports `code` of `declarations` at `span`; parameters fill both message and help. */
  report<T extends Readonly<Record<string, FindingDeclaration>>, C extends keyof T & string>(
    declarations: T,
    code: C,
    span: Span,
    parameters: ParametersOf<T[C]>,
    more: { readonly related?: readonly RelatedPlace[]; readonly fix?: Fix; readonly help?: string } = {},
  ): void {
    const declaration = declarations[code] as FindingDeclaration;
    this.add({
      code,
      severity: declaration.severity,
      message: fillTemplate(declaration.message, parameters),
      span,
      related: more.related ?? [],
      help: more.help ?? fillTemplate(declaration.help, parameters),
      ...(more.fix ? { fix: more.fix } : {}),
    });
  }

  /** From now on findings of these codes have the given severity, or are left out. */
  overrule(severities: ReadonlyMap<string, Severity | 'off'>): void {
    this.#severities = severities;
  }

  add(finding: Finding): void {
    const severity = this.#severities.get(finding.code) ?? finding.severity;
    if (severity === 'off') return;
    this.#found.push(severity === finding.severity ? finding : { ...finding, severity });
    if (severity === 'error') this.#errors += 1;
  }
}
