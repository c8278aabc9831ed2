import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import { mergePatch } from '../merge/mergePatch';
import { orderByReads } from '../order/orderByReads';
import type { HouseRules } from '../schema/generated/houseTypes';
import type { JsonValue } from '../syntax/types';
import { resolveFindings } from './findings';
import { type ResolveContext, reportUnknown, spanInRecipeOrHouse } from './Reporter';
import type { ResolvedContainer, ResolvedRole } from './types';

/** The rig's own group: the container everything lies in. */
export const RIG_CONTAINER = 'rig';

type ContainerEntry = NonNullable<HouseRules['containers']>[string];
type RoleEntry = NonNullable<HouseRules['roles']>[string];

function mergeMaps<E>(
  house: Readonly<Record<string, E>>,
  recipe: object | undefined,
): Readonly<Record<string, E>> {
  return recipe === undefined
    ? house
    : (mergePatch(house as unknown as JsonValue, recipe as unknown as JsonValue) as unknown as Record<
        string,
        E
      >);
}

/**
 * Lays the recipe's containers over the house's and settles what each inherits. Unknown parents, rings and
 * containers that move otherwise than what they lie in are findings; the container then lies in the rig.
 */
export function resolveContainers(
  recipe: EvaluatedRecipe,
  context: ResolveContext,
): ReadonlyMap<string, ResolvedContainer> {
  const entries = new Map(
    Object.entries(mergeMaps<ContainerEntry>(context.house.rules.containers, recipe.containers)),
  );
  const { order, rings } = orderByReads([...entries.keys()], (id) => {
    const parent = entries.get(id)?.parent;
    return parent === undefined ? [] : [parent];
  });
  for (const ring of rings) {
    const span = spanInRecipeOrHouse(context, ['containers', ring.at(-2) ?? '', 'parent']);
    context.findings.report(resolveFindings, 'container-ring', span, { ring: ring.join(' → ') });
  }
  const resolved = new Map<string, ResolvedContainer>();
  for (const id of order) {
    const entry = entries.get(id);
    if (!entry) continue;
    if (entry.parent !== undefined && !entries.has(entry.parent)) {
      const span = spanInRecipeOrHouse(context, ['containers', id, 'parent']);
      reportUnknown(context, span, 'container', entry.parent, entries.keys());
    }
    // On a ring one parent is not settled before; the container then lies in the rig.
    const parent = entry.parent === undefined ? undefined : resolved.get(entry.parent);
    const inherited = parent?.carried ?? false;
    let carried = entry.moves === undefined ? inherited : entry.moves === 'carried';
    if (parent && carried !== inherited) {
      context.findings.report(
        resolveFindings,
        'container-moves-conflict',
        spanInRecipeOrHouse(context, ['containers', id, 'moves']),
        {
          id,
          moves: carried ? 'carried' : 'parked',
          parent: parent.id,
          parentMoves: inherited ? 'carried' : 'parked',
        },
      );
      carried = inherited;
    }
    resolved.set(id, {
      id,
      parent: parent?.id ?? null,
      carried,
      shown: (entry.shown ?? true) && (parent?.shown ?? true),
    });
  }
  return resolved;
}

/** Roles whose nodes are part of the structure: they lie wherever what they hold lies. */
const STRUCTURE_ROLES: ReadonlySet<string> = new Set(['container', 'seat']);

/** Lays the recipe's roles over the house's and checks that each has a container that exists. */
export function resolveRoles(
  recipe: EvaluatedRecipe,
  containers: ReadonlyMap<string, ResolvedContainer>,
  context: ResolveContext,
): ReadonlyMap<string, ResolvedRole> {
  const roles = new Map<string, ResolvedRole>();
  for (const [id, entry] of Object.entries(mergeMaps<RoleEntry>(context.house.rules.roles, recipe.roles))) {
    const { container } = entry;
    if (container === undefined) {
      if (!STRUCTURE_ROLES.has(id)) {
        const span = spanInRecipeOrHouse(context, ['roles', id], 'key');
        context.findings.report(resolveFindings, 'role-without-container', span, { role: id });
      }
    } else if (!containers.has(container)) {
      const span = spanInRecipeOrHouse(context, ['roles', id, 'container']);
      reportUnknown(context, span, 'container', container, containers.keys());
    }
    roles.set(id, {
      token: entry.token ?? '',
      container: container !== undefined && containers.has(container) ? container : null,
      shown: entry.shown ?? true,
      selectable: entry.selectable ?? true,
    });
  }
  return roles;
}
