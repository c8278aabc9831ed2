import { type Mat4, positionOf } from '@/compiler/math/mat4';
import { createPoser } from '@/compiler/pose/createPoser';
import { readMatrix } from '@/compiler/pose/worldMatrices';
import type { PoseValues, Rig, Vec3 } from '@/compiler/rig/Rig';

/** World matrices of a rig by name, for the given control values. */
export function worldOf(rig: Rig, pose: PoseValues = {}): ReadonlyMap<string, Mat4> {
  const poser = createPoser(rig);
  poser.evaluate(pose);
  return new Map(rig.nodes.map(({ name }, index) => [name, readMatrix(poser.world, index)]));
}

/** Matrix of one node among such matrices. */
export function matrixIn(world: ReadonlyMap<string, Mat4>, name: string): Mat4 {
  const matrix = world.get(name);
  if (matrix === undefined) throw new Error(`no node ${name}`);
  return matrix;
}

/** Position of one node among such matrices. */
export function positionIn(world: ReadonlyMap<string, Mat4>, name: string): Vec3 {
  return positionOf(matrixIn(world, name));
}
