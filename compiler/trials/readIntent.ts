import { idsRead, idsWritten } from '../expand/solverIds';
import { FindingList } from '../findings/FindingList';
import { CARRIER_ROLE, findCarrier } from '../resolve/findCarrier';
import { CONTAINER_ID_PREFIX, type LinkCollection, linkKey, seatFollowId, spaceId } from '../resolve/ids';
import { type Nameable, NodeNamer } from '../resolve/NodeNamer';
import type { ResolveContext } from '../resolve/Reporter';
import { RIG_CONTAINER } from '../resolve/resolveContainers';
import type { ResolvedNode, ResolvedRecipe } from '../resolve/types';
import type { Side } from '../rig/Rig';
import { findTwins } from './findTwins';
import type { DeclaredLink, NodeIntent, TrialIntent } from './TrialIntent';

const CONTAINER_ROLE = 'container';
const SEAT_ROLE = 'seat';

/** Roles by which links are named, as `resolveRecipe` gives them. */
const LINK_ROLES: Readonly<Record<LinkCollection, string>> = {
  constraints: 'aid',
  spaces: 'aid',
  drivers: 'aid',
  skins: 'aid',
  solvers: 'solver',
  shapes: 'shape',
};

function intendNode(node: ResolvedNode, recipe: ResolvedRecipe, carrier: string | null): NodeIntent {
  const { id, role } = node;
  const { containers, roles } = recipe;
  const isContainer = role === CONTAINER_ROLE;
  const isStructure = isContainer || role === SEAT_ROLE;
  const container = isStructure ? node.container : (roles.get(role)?.container ?? RIG_CONTAINER);
  // A container's own group shares the fate of what it holds, but for the one in which the root stands.
  const inside = isContainer ? id.slice(CONTAINER_ID_PREFIX.length) : container;
  const isAroundRoot = isContainer && inside === roles.get(CARRIER_ROLE)?.container;
  const isCarried = containers.get(inside)?.carried === true && !isAroundRoot;
  return {
    container,
    // Carriers around the root stay; the root carries itself.
    carried: role === CARRIER_ROLE ? id === carrier : isCarried,
    shown: (roles.get(role)?.shown ?? true) && (containers.get(inside)?.shown ?? true),
  };
}

function declaredLinks(recipe: ResolvedRecipe): readonly DeclaredLink[] {
  return [
    ...recipe.constraints.map(({ target, sources }) => ({
      targets: [target],
      sources: sources.map(({ node }) => node),
    })),
    ...recipe.seats.map(({ id, follows }) => ({ targets: [id], sources: [follows] })),
    ...recipe.controls
      .filter(({ spaces }) => spaces.length > 1)
      .map(({ id, spaces, parent }) => ({
        targets: [id],
        sources: parent !== null && spaces.includes(parent) ? [parent] : spaces.slice(0, 1),
      })),
    ...recipe.solvers.map((solver) => ({ targets: idsWritten(solver), sources: idsRead(solver) })),
  ];
}

/** Side of every link that has one, by `linkKey`. */
function linkSides(recipe: ResolvedRecipe): ReadonlyMap<string, Side> {
  const { constraints, solvers, drivers, skins, shapes, controls, seats, nodeById } = recipe;
  const sides = new Map<string, Side>();
  for (const [collection, links] of Object.entries({ constraints, solvers, drivers, skins, shapes })) {
    for (const { id, side } of links) sides.set(linkKey(collection as LinkCollection, id), side);
  }
  for (const { id, side } of controls) sides.set(linkKey('spaces', spaceId(id)), side);
  for (const { id, occupant } of seats) {
    sides.set(linkKey('constraints', seatFollowId(id)), nodeById.get(occupant)?.side ?? 'centre');
  }
  return sides;
}

/** Stands for the character in a name; no name that a person writes can hold it. */
const ANY_CHARACTER = '_\u0000';

/**
 * Composes every name once, with a place left for the character, so that a whole cast can be named quickly; names that
 * clash are for the trial to find, not to report here.
 */
function nameParts(recipe: ResolvedRecipe, context: ResolveContext): ReadonlyMap<string, readonly string[]> {
  const namer = new NodeNamer({ ...context, findings: new FindingList() }, ANY_CHARACTER, recipe.roles);
  const parts = new Map<string, readonly string[]>();
  const add = (key: string, thing: Nameable): void => {
    parts.set(key, namer.name(thing).split(ANY_CHARACTER));
  };
  for (const { id, role, side, path, kind } of recipe.nodes) {
    const isSideless = role === CONTAINER_ROLE || kind === 'note';
    add(id, { id, role, side: isSideless ? null : side, path });
  }
  const sides = linkSides(recipe);
  for (const key of recipe.linkNames.keys()) {
    const slash = key.indexOf('/');
    const role = LINK_ROLES[key.slice(0, slash) as LinkCollection];
    add(key, { id: key.slice(slash + 1), role, side: sides.get(key) ?? 'centre', path: [] });
  }
  return parts;
}

/** Reads from the resolved recipe what its rig has to keep. */
export function readIntent(recipe: ResolvedRecipe, context: ResolveContext): TrialIntent {
  const silent = { ...context, findings: new FindingList() };
  const carrier = findCarrier(recipe.controls, silent)?.id ?? null;
  const poleOf = new Map(recipe.controls.map(({ id, place }) => [id, place]));
  const computedPoles = recipe.solvers.flatMap((solver) =>
    (solver.kind === 'two_bone' || solver.kind === 'reach') && poleOf.get(solver.pole)?.kind === 'pole'
      ? [solver.id]
      : [],
  );
  return {
    nodes: new Map(recipe.nodes.map((node) => [node.id, intendNode(node, recipe, carrier)])),
    carrier,
    left: recipe.scene.left,
    twins: findTwins(recipe),
    links: declaredLinks(recipe),
    drivenByRoot: new Set(
      recipe.drivers.filter(({ control }) => control === carrier).map(({ target }) => target),
    ),
    computedPoles: new Set(computedPoles),
    channels: new Map(recipe.controls.map(({ id, channels }) => [id, channels])),
    lines: new Map(recipe.guideLines.map(({ id, from, to }) => [id, { from, to }])),
    nameParts: () => nameParts(recipe, context),
  };
}
