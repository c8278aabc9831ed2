import type { MadePart, PartEntry } from '../expand/primitives';
import type { Side } from '../rig/Rig';

/** Who the part is: its id with the side it is made for, e.g. `arm.left`. */
export interface PartContext {
  readonly id: string;
  readonly side: Side;
  /** All parts of the recipe by the ids they were written under, for parts that build on others. */
  readonly parts: Readonly<Record<string, PartEntry>>;
}

/**
 * Writes one part out in primitives, for one side, in the recipe's own language. Mirrored copies are made by the
 * expand stage from the left one. Pure; every missing or wrong value was refused by the schema before.
 */
export type ExpandPart<Kind extends PartEntry['kind']> = (
  context: PartContext,
  part: Extract<PartEntry, { readonly kind: Kind }>,
) => MadePart;
