import type { Severity } from './Finding';

/** What a finding code stands for, written once; the editor, `explain` and the handbook all read it. */
export interface FindingDeclaration {
  readonly severity: Severity;
  /** What is wrong, in one line, for lists of codes. */
  readonly summary: string;
  /** Message with `{named}` parameters; the type checker asks for each of them where it is reported. */
  readonly message: string;
  /** What to do next; may use the same parameters. */
  readonly help: string;
}

/** Names of the `{parameters}` in a template. */
export type ParameterOf<Template extends string> = Template extends `${string}{${infer Name}}${infer Rest}`
  ? Name | ParameterOf<Rest>
  : never;

/** Parameters a declaration needs: those of its message and of its help. */
export type ParametersOf<D extends FindingDeclaration> = Readonly<
  Record<ParameterOf<D['message']> | ParameterOf<D['help']>, string | number>
>;

/** Declares the codes of one stage, keeping their literal types. */
export function declareFindings<const T extends Readonly<Record<string, FindingDeclaration>>>(
  declarations: T,
): T {
  return declarations;
}
