import type { Vec3 } from '../rig/Rig';
import type { Recipe } from '../schema/generated/recipeTypes';

/**
 * A value after expressions. Numbers that could be expressions are numbers, points three numbers; names stay names.
 * Amounts keep their text, because that names an attribute and is no expression.
 */
type Evaluated<T, Raw = AmountKey> = [number | string] extends [T]
  ? number
  : T extends readonly [unknown, unknown, unknown]
    ? Vec3
    : T extends readonly (infer Item)[]
      ? readonly Evaluated<Item, Raw>[]
      : T extends object
        ? { readonly [K in keyof T]: EvaluatedField<K, T[K], Raw> }
        : T;

type AmountKey = 'blend' | 'stretch' | 'swing' | 'bias' | 'volume' | 'roll' | 'bank' | 'break' | 'weight';

type EvaluatedField<K, V, Raw> = K extends Raw ? V : K extends 'toward' | 'bend' ? Vec3 : Evaluated<V, Raw>;

/** A landmark with its points as numbers. */
export interface EvaluatedLandmark {
  readonly at: Vec3;
  readonly side?: 'left' | 'centre';
  readonly right?: Vec3;
}

/** A recipe in which every expression has been replaced by its value. */
export type EvaluatedRecipe = Omit<Evaluated<Recipe>, 'params' | 'landmarks' | 'notes' | 'parts'> & {
  /** Parts have numbers where primitives have amounts. */
  readonly parts?: Evaluated<Recipe['parts'], never>;
  readonly params?: Recipe['params'];
  readonly landmarks?: Readonly<Record<string, EvaluatedLandmark>>;
  readonly notes?: Recipe['notes'];
};
