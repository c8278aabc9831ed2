import {
  canonicalQuat,
  conjugateQuat,
  IDENTITY_QUAT,
  multiplyQuat,
  normaliseQuat,
  rotate,
} from '../math/quat';
import { add, sub, ZERO } from '../math/vec3';
import type { ResolvedNode, ResolvedRecipe } from '../resolve/types';
import type { Quat, Rig, RigNode, RigScene, Vec3 } from '../rig/Rig';
import { POSITION_DECIMALS, TURN_DECIMALS } from '../solve/tolerances';
import type { RestPlace, SolvedRecipe } from '../solve/types';
import { assembleLinks } from './assembleLinks';

const WORLD: RestPlace = { position: ZERO, turn: IDENTITY_QUAT };

function round(value: number, decimals: number): number {
  const factor = 10 ** decimals;
  return Math.round(value * factor) / factor + 0;
}

function roundTurn(turn: Quat): Quat {
  const [x, y, z, w] = canonicalQuat(normaliseQuat(turn));
  return [round(x, TURN_DECIMALS), round(y, TURN_DECIMALS), round(z, TURN_DECIMALS), round(w, TURN_DECIMALS)];
}

function roundPoint([x, y, z]: Vec3): Vec3 {
  return [round(x, POSITION_DECIMALS), round(y, POSITION_DECIMALS), round(z, POSITION_DECIMALS)];
}

/** Where a node ends up in the world by the rounded numbers, so that rounding never adds up along a chain. */
function placeUnder(parent: RestPlace, at: Vec3, turn: Quat): RestPlace {
  return {
    position: add(parent.position, rotate(parent.turn, at)),
    turn: normaliseQuat(multiplyQuat(parent.turn, turn)),
  };
}

/** Puts names, tree and geometry together. Call it only when no stage found an error. */
export function assembleRig(scene: RigScene, recipe: ResolvedRecipe, solved: SolvedRecipe): Rig {
  const nameOf = (id: string): string => recipe.nodeById.get(id)?.name ?? id;
  const chainOf = new Map(recipe.chains.flatMap((chain) => chain.jointIds.map((id) => [id, chain] as const)));
  const controlOf = new Map(recipe.controls.map((control) => [control.id, control]));
  const lineOf = new Map(recipe.guideLines.map((line) => [line.id, line]));
  const meshOf = new Map(recipe.geometry.map(({ id, mesh }) => [id, mesh]));
  const world = new Map<string, RestPlace>();

  const base = (node: ResolvedNode) => {
    const parent = node.parent === null ? WORLD : (world.get(node.parent) ?? WORLD);
    const place = solved.places.get(node.id) ?? parent;
    const inverse = conjugateQuat(parent.turn);
    const at = roundPoint(rotate(inverse, sub(place.position, parent.position)));
    const turn = roundTurn(multiplyQuat(inverse, place.turn));
    world.set(node.id, placeUnder(parent, at, turn));
    return {
      id: node.id,
      name: node.name,
      parent: node.parent === null ? null : nameOf(node.parent),
      container: node.container,
      role: node.role,
      side: node.side,
      at,
      turn,
      shown: node.shown,
      selectable: node.selectable,
    };
  };

  const assembleNode = (node: ResolvedNode): RigNode => {
    switch (node.kind) {
      case 'joint': {
        const chain = chainOf.get(node.id);
        const limits = chain?.limits[node.id.slice(chain.id.length + 1)] ?? {};
        return { ...base(node), kind: 'joint', order: chain?.order ?? 'xyz', limits };
      }
      case 'control': {
        const control = controlOf.get(node.id);
        return {
          ...base(node),
          kind: 'control',
          order: control?.order ?? 'xyz',
          shape: control?.shape ?? 'ring',
          size: solved.sizes.get(node.id) ?? 1,
          channels: control?.channels ?? {},
          attributes: control?.attributes ?? [],
        };
      }
      case 'line': {
        const line = lineOf.get(node.id);
        return {
          ...base(node),
          kind: 'line',
          from: nameOf(line?.from ?? ''),
          to: nameOf(line?.to ?? ''),
          style: line?.style ?? 'dotted',
        };
      }
      case 'note':
        return { ...base(node), kind: 'note', entries: recipe.notes };
      case 'group':
        return { ...base(node), kind: 'group' };
      case 'geometry':
        return { ...base(node), kind: 'geometry', mesh: meshOf.get(node.id) ?? node.id };
      default:
        return node.kind satisfies never;
    }
  };

  const nodes = recipe.nodes.map(assembleNode);
  return { scene, nodes, ...assembleLinks(recipe, solved) };
}
