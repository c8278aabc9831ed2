import type { ChainSpecification } from '../expand/types';
import type { ResolvedRecipe } from '../resolve/types';

/** The chain of every joint, by the joint's id. */
export function chainsByJoint(recipe: ResolvedRecipe): ReadonlyMap<string, ChainSpecification> {
  const chains = new Map<string, ChainSpecification>();
  for (const chain of recipe.chains) for (const id of chain.jointIds) chains.set(id, chain);
  return chains;
}
