import { idsRead, idsWritten } from '../expand/solverIds';
import { FindingList } from '../findings/FindingList';
import { CARRIER_ROLE, findCarrier } from '../resolve/findCarrier';
import { CONTAINER_ID_PREFIX, type LinkCollection, linkKey, seatFollowId, spaceId } from '../resolve/ids';
import { NodeNamer } from '../resolve/NodeNamer';
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

/** Whether the root's motion is meant to reach a node: carriers around the root stay, the root carries itself. */
function isCarried(
  { id, role, container }: ResolvedNode,
  recipe: ResolvedRecipe,
  carrier: string | null,
): boolean {
  if (role === CARRIER_ROLE) return id === carrier;
  const isGroupOfContainer = role === CONTAINER_ROLE;
  const inside = isGroupOfContainer ? id.slice(CONTAINER_ID_PREFIX.length) : container;
  // The root stands in this group and cannot carry it.
  if (isGroupOfContainer && inside === recipe.roles.get(CARRIER_ROLE)?.container) return false;
  return recipe.containers.get(inside)?.carried ?? false;
}

function intendNode(node: ResolvedNode, recipe: ResolvedRecipe, carrier: string | null): NodeIntent {
  const isStructure = node.role === CONTAINER_ROLE || node.role === SEAT_ROLE;
  const container = isStructure ? node.container : (recipe.roles.get(node.role)?.container ?? RIG_CONTAINER);
  return {
    kind: node.kind,
    role: node.role,
    container,
    carried: isCarried({ ...node, container }, recipe, carrier),
    shown: (recipe.roles.get(node.role)?.shown ?? true) && (recipe.containers.get(container)?.shown ?? true),
    isStructure,
  };
}

function declaredLinks(recipe: ResolvedRecipe, carrier: string | null): readonly DeclaredLink[] {
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
    // A driver adds to what the root's motion does only when it reads the root.
    ...recipe.drivers
      .filter(({ control }) => control === carrier)
      .map(({ target, control }) => ({ targets: [target], sources: [control] })),
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

/** Composes every name anew for a character; names that clash are for the trial to find, not to report. */
function namesFor(
  character: string,
  recipe: ResolvedRecipe,
  context: ResolveContext,
): ReadonlyMap<string, string> {
  const namer = new NodeNamer({ ...context, findings: new FindingList() }, character, recipe.roles);
  const names = new Map<string, string>();
  for (const { id, role, side, path, kind } of recipe.nodes) {
    const isSideless = role === CONTAINER_ROLE || kind === 'note';
    names.set(id, namer.name({ id, role, side: isSideless ? null : side, path }));
  }
  const sides = linkSides(recipe);
  for (const key of recipe.linkNames.keys()) {
    const slash = key.indexOf('/');
    const role = LINK_ROLES[key.slice(0, slash) as LinkCollection];
    names.set(
      key,
      namer.name({ id: key.slice(slash + 1), role, side: sides.get(key) ?? 'centre', path: [] }),
    );
  }
  return names;
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
    links: declaredLinks(recipe, carrier),
    computedPoles: new Set(computedPoles),
    channels: new Map(recipe.controls.map(({ id, channels }) => [id, channels])),
    lines: new Map(recipe.guideLines.map(({ id, from, to }) => [id, { from, to }])),
    namesFor: (character) => namesFor(character, recipe, context),
  };
}
