import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import type { Side } from '../rig/Rig';
import type { Path } from '../syntax/types';

type Entry<K extends keyof EvaluatedRecipe> =
  NonNullable<EvaluatedRecipe[K]> extends Readonly<Record<string, infer E>> ? E : never;

/** Primitives as the language writes them, after expressions; parts give these and authors adjust them. */
export type ChainEntry = Entry<'chains'>;
export type ControlEntry = Entry<'controls'>;
export type SolverEntry = Entry<'solvers'>;
export type ConstraintEntry = Entry<'constraints'>;
export type DriverEntry = Entry<'drivers'>;
export type GeometryEntry = Entry<'geometry'>;
export type SkinEntry = Entry<'skins'>;
export type ShapeEntry = Entry<'shapes'>;
export type GuideLineEntry = Entry<'guide_lines'>;
export type PartEntry = Entry<'parts'>;

export interface PrimitiveEntries {
  readonly chains: ChainEntry;
  readonly controls: ControlEntry;
  readonly solvers: SolverEntry;
  readonly constraints: ConstraintEntry;
  readonly drivers: DriverEntry;
  readonly geometry: GeometryEntry;
  readonly skins: SkinEntry;
  readonly shapes: ShapeEntry;
  readonly guide_lines: GuideLineEntry;
}

export type Collection = keyof PrimitiveEntries;

export const COLLECTIONS = [
  'chains',
  'controls',
  'solvers',
  'constraints',
  'drivers',
  'geometry',
  'skins',
  'shapes',
  'guide_lines',
] as const satisfies Collection[];

/** What one part makes, in the recipe's own language, keyed by id. */
export type MadePrimitives = {
  readonly [C in Collection]?: Readonly<Record<string, PrimitiveEntries[C]>>;
};

/** What one part makes, and how it changes what other parts make: merged onto it, or leaving it out by `omit`. */
export type MadePart = MadePrimitives & { readonly adjusts?: MadePrimitives };

/** One primitive on one side, with where it came from. */
export interface Sided<E> {
  readonly id: string;
  readonly side: Side;
  readonly entry: E;
  readonly path: Path;
  readonly part: string | null;
}
