import { invariant } from '../findings/invariant';
import { positionOf } from '../math/mat4';
import type { PoseValues, Rig, RigNode, Vec3 } from '../rig/Rig';
import { createPoser } from './createPoser';
import { indexNodes } from './evaluationOrder';
import { readMatrix } from './worldMatrices';

/** One node of a posed rig, as the command line prints it. */
export interface PosedNode {
  readonly name: string;
  readonly id: string;
  readonly kind: RigNode['kind'];
  readonly parent: string | null;
  readonly container: string;
  readonly role: string;
  readonly side: RigNode['side'];
  readonly shown: boolean;
  readonly selectable: boolean;
  /** World matrix, column-major, in the scene's unit. */
  readonly world: readonly number[];
  /** Lines only: world positions of both ends. */
  readonly ends?: readonly [Vec3, Vec3];
}

/** Every node of a sound rig in its order, with its world matrix for the given control values. */
export function describePose(rig: Rig, pose: PoseValues = {}): readonly PosedNode[] {
  const poser = createPoser(rig);
  poser.evaluate(pose);
  const byName = indexNodes(rig);
  const positionAt = (name: string): Vec3 => {
    const index = byName.get(name);
    invariant(index !== undefined, `every reference of a rig names a node ("${name}")`);
    return positionOf(readMatrix(poser.world, index));
  };
  return rig.nodes.map((node, index) => {
    const { name, id, kind, parent, container, role, side, shown, selectable } = node;
    return {
      name,
      id,
      kind,
      parent,
      container,
      role,
      side,
      shown,
      selectable,
      // Adding zero turns −0, which rounding leaves here and there, into 0.
      world: readMatrix(poser.world, index).map((entry) => entry + 0),
      ...(node.kind === 'line' ? { ends: [positionAt(node.from), positionAt(node.to)] as const } : {}),
    };
  });
}
