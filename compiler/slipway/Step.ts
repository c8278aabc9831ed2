import type { KeyRule, ValueKinds, VERBS, Verb } from './verbs';

/** What a value of one kind is once read. */
type ValueOf<K> = K extends keyof ValueKinds
  ? ValueKinds[K]
  : K extends readonly (infer Word)[]
    ? Word
    : never;

type KeyValue<R extends KeyRule> = R extends { readonly optional: true }
  ? ValueOf<R['kind']> | null
  : ValueOf<R['kind']>;

type KeyValues<K extends Readonly<Record<string, KeyRule>>> = { readonly [Key in keyof K]: KeyValue<K[Key]> };

/** One step of a script as plain data; its keys and their types follow from the table of verbs. */
export type StepOf<V extends Verb> = V extends Verb
  ? {
      readonly verb: V;
      readonly name: string;
      readonly values: KeyValues<(typeof VERBS)[V]['keys']>;
    }
  : never;

export type Step = StepOf<Verb>;
