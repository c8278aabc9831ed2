import type { Mat4 } from '@/compiler/math/mat4';
import { createPoser } from '@/compiler/pose/createPoser';
import type { PoseValues, Rig } from '@/compiler/rig/Rig';

/** World matrices of a rig by name, for the given control values. */
export function worldOf(rig: Rig, pose: PoseValues = {}): ReadonlyMap<string, Mat4> {
  const poser = createPoser(rig);
  poser.evaluate(pose);
  return new Map(
    rig.nodes.map(({ name }, index) => [
      name,
      Array.from(poser.world.subarray(index * 16, index * 16 + 16)) as unknown as Mat4,
    ]),
  );
}

/** Position of one node among such matrices. */
export function positionIn(
  world: ReadonlyMap<string, Mat4>,
  name: string,
): readonly [number, number, number] {
  const m = world.get(name);
  if (m === undefined) throw new Error(`no node ${name}`);
  return [m[12], m[13], m[14]];
}
