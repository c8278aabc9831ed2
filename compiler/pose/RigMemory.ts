import type { Mat4 } from '../math/mat4';
import { IDENTITY_MAT4 } from '../math/mat4';
import type { Rig } from '../rig/Rig';
import { restMatrix, restWorldMatrices, writeMatrix } from './worldMatrices';

/** The flat arrays that everything which evaluates a rig reads and writes; made once a rig. */
export interface RigMemory {
  /** World matrices of the present evaluation, 16 numbers a node, column-major. */
  readonly world: Float64Array;
  /** Rest transform of every node against its parent, flat like `world`. */
  readonly restLocal: Float64Array;
  /** World matrices at rest. */
  readonly restWorld: readonly Mat4[];
  /** Factor by which solvers stretch each node's offset from its parent; 1 at the start of every evaluation. */
  readonly stretch: Float64Array;
  /** Values of channels, attributes and constants by slot. */
  readonly values: Float64Array;
  /** Index of a node by name; throws for a name that is no node. */
  readonly indexOf: (name: string) => number;
}

/** Makes the memory of a rig, everything at rest. */
export function makeRigMemory(rig: Rig, values: Float64Array, indexOf: (name: string) => number): RigMemory {
  const restLocal = new Float64Array(rig.nodes.length * 16);
  rig.nodes.forEach((node, index) => {
    writeMatrix(restLocal, index, restMatrix(node));
  });
  return {
    world: Float64Array.from(restLocal),
    restLocal,
    restWorld: restWorldMatrices(rig),
    stretch: new Float64Array(rig.nodes.length).fill(1),
    values,
    indexOf,
  };
}

/** Rest matrix of node number `index`. */
export function restOf(memory: RigMemory, index: number): Mat4 {
  return memory.restWorld[index] ?? IDENTITY_MAT4;
}

/** One thing to do on the memory of a rig; nothing is allocated by it. */
export type Step = () => void;
