/** Throws when something the program itself promised does not hold; never for what a person wrote. */
export function invariant(holds: unknown, promise: string): asserts holds {
  if (!holds) throw new Error(`Broken invariant: ${promise}`);
}
