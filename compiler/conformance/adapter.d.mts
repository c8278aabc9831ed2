/** Values of a line by key: numbers, texts, lists, flags, attributes in place of numbers, null for what is left out. */
export type AdapterValues = Readonly<Record<string, unknown>>;

/** What an adapter needs of a 3D program; see the comment at the head of `adapter.mjs`. */
export interface AdapterHost {
  scene(name: string, values: AdapterValues): void;
  node(kind: string, name: string, values: AdapterValues): void;
  attribute(control: string, values: AdapterValues): void;
  limit(node: string, values: AdapterValues): void;
  lock(control: string, values: AdapterValues): void;
  show(node: string, values: AdapterValues): void;
  entry(note: string, values: AdapterValues): void;
  constrain(name: string, values: AdapterValues): void;
  space(name: string, values: AdapterValues): void;
  drive(name: string, values: AdapterValues): void;
  solve(kind: string, name: string, values: AdapterValues): void;
  skin(name: string, values: AdapterValues): void;
  shape(name: string, values: AdapterValues): void;
  done(): void;
}

/** What a script may be refused for, with the line it stands on. */
export class Refused extends Error {
  readonly line: number;
}

/** Carries out a script on a host; refuses one that is not whole before the first step. */
export function build(text: string, host: AdapterHost): Promise<void>;
