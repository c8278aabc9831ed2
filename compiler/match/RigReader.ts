import { invariant } from '../findings/invariant';
import type { Mat4 } from '../math/mat4';
import { createPoser } from '../pose/createPoser';
import { indexNodes } from '../pose/evaluationOrder';
import { readMatrix, restWorldMatrices } from '../pose/worldMatrices';
import type { ControlNode, PoseValues, Rig } from '../rig/Rig';

/** A rig whose nodes can be read by name, at rest and in any pose. */
export interface RigReader {
  readonly rig: Rig;
  control(name: string): ControlNode;
  restOf(name: string): Mat4;
  /** World matrices of the named nodes in a pose. */
  worldOf(pose: PoseValues, names: readonly string[]): readonly Mat4[];
}

/** Makes a reader of a sound rig; it is evaluated again for every pose that is asked for. */
export function makeRigReader(rig: Rig): RigReader {
  const byName = indexNodes(rig);
  const rest = restWorldMatrices(rig);
  const poser = createPoser(rig);
  const indexOf = (name: string): number => {
    const index = byName.get(name);
    invariant(index !== undefined, `every reference of a rig names a node ("${name}")`);
    return index;
  };
  return {
    rig,
    control(name) {
      const node = rig.nodes[indexOf(name)];
      invariant(node?.kind === 'control', `"${name}" is a control`);
      return node;
    },
    restOf: (name) => rest[indexOf(name)] as Mat4,
    worldOf(pose, names) {
      poser.evaluate(pose);
      return names.map((name) => readMatrix(poser.world, indexOf(name)));
    },
  };
}
