import type { ExpandedRecipe, Specification } from '../expand/types';
import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import { buildTree } from './buildTree';
import { checkParentRings } from './checkParentRings';
import { checkReferences } from './checkReferences';
import { findCarrier } from './findCarrier';
import { type LinkCollection, linkKey, seatFollowId, spaceId } from './ids';
import { NodeNamer } from './NodeNamer';
import type { ResolveContext } from './Reporter';
import { resolveContainers, resolveRoles } from './resolveContainers';
import { collectThings } from './things';
import type { ResolvedRecipe } from './types';

/** Settles what everything is called, what it refers to and where it lies. */
export function resolveRecipe(
  recipe: EvaluatedRecipe,
  expanded: ExpandedRecipe,
  character: string,
  context: ResolveContext,
): ResolvedRecipe {
  const containers = resolveContainers(recipe, context);
  const roles = resolveRoles(recipe, containers, context);
  const things = collectThings(expanded, context);
  const linked = checkReferences(expanded, things, context);
  const onRing = checkParentRings([...linked.chains, ...linked.controls], things, context);
  const carrier = findCarrier(linked.controls, context);
  const namer = new NodeNamer(context, character, roles);
  const { nodes, seats } = buildTree({
    linked,
    notes: expanded.notes,
    containers,
    roles,
    carrier,
    onRing,
    context,
    namer,
  });
  const nodeById = new Map(nodes.map((node) => [node.id, node]));
  const linkNames = new Map<string, string>();
  const nameLinks = (collection: LinkCollection, links: readonly Specification[], role: string): void => {
    for (const { id, side, path } of links) {
      linkNames.set(linkKey(collection, id), namer.name({ id, role, side, path }));
    }
  };
  nameLinks('constraints', linked.constraints, 'aid');
  nameLinks('solvers', linked.solvers, 'solver');
  nameLinks('drivers', linked.drivers, 'aid');
  nameLinks('skins', linked.skins, 'aid');
  nameLinks('shapes', linked.shapes, 'shape');
  for (const { id, side, path, spaces } of linked.controls) {
    if (spaces.length < 2) continue;
    const space = spaceId(id);
    linkNames.set(linkKey('spaces', space), namer.name({ id: space, role: 'aid', side, path }));
  }
  for (const { id, occupant } of seats) {
    const node = nodeById.get(occupant);
    const follow = seatFollowId(id);
    linkNames.set(
      linkKey('constraints', follow),
      namer.name({ id: follow, role: 'aid', side: node?.side ?? 'centre', path: node?.path ?? [] }),
    );
  }
  return {
    ...linked,
    scene: expanded.scene,
    landmarks: expanded.landmarks,
    notes: expanded.notes,
    containers,
    roles,
    seats,
    nodes,
    nodeById,
    linkNames,
  };
}
