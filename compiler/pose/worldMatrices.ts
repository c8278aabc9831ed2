import type { Mat4 } from '../math/mat4';
import { composeMat4, multiplyMat4 } from '../math/mat4';
import { normaliseQuat, rotate } from '../math/quat';
import type { Quat, Rig, RigNode, Vec3 } from '../rig/Rig';

/** Rest transform of a node against its parent; a rounded rotation is brought to length one. */
export function restMatrix(node: RigNode): Mat4 {
  return composeMat4(node.at, normaliseQuat(node.turn));
}

/** World matrix of every node at rest, in the order of `rig.nodes`, from rest transforms alone. */
export function restWorldMatrices(rig: Rig): readonly Mat4[] {
  const byName = new Map<string, Mat4>();
  return rig.nodes.map((node) => {
    const own = restMatrix(node);
    const parent = node.parent === null ? undefined : byName.get(node.parent);
    const world = parent === undefined ? own : multiplyMat4(parent, own);
    byName.set(node.name, world);
    return world;
  });
}

/** Matrix number `index` of a flat array of world matrices. */
export function readMatrix(world: Float64Array, index: number): Mat4 {
  const o = index * 16;
  const n = (i: number): number => world[o + i] as number;
  return [n(0), n(1), n(2), 0, n(4), n(5), n(6), 0, n(8), n(9), n(10), 0, n(12), n(13), n(14), 1];
}

/** Position part of matrix number `index`. */
export function readPosition(world: Float64Array, index: number): Vec3 {
  const o = index * 16 + 12;
  return [world[o] as number, world[o + 1] as number, world[o + 2] as number];
}

/** Writes one matrix into a flat array. */
export function writeMatrix(world: Float64Array, index: number, matrix: Mat4): void {
  world.set(matrix, index * 16);
}

/** Writes only the position part of matrix number `index`. */
export function writePosition(world: Float64Array, index: number, at: Vec3): void {
  world.set(at, index * 16 + 12);
}

/** Turns the axes of matrix number `index` rigidly in the world, whatever scale they carry; its position stays. */
export function turnAxes(world: Float64Array, index: number, turn: Quat): void {
  for (let column = 0; column < 3; column += 1) {
    const o = index * 16 + column * 4;
    world.set(rotate(turn, [world[o] as number, world[o + 1] as number, world[o + 2] as number]), o);
  }
}

/** out[o] = a[ao] × b[bo], all affine and flat, nothing allocated; `out` must not be one of the factors' places. */
export function multiplyInto(
  out: Float64Array,
  o: number,
  a: Float64Array,
  ao: number,
  b: Float64Array,
  bo: number,
): void {
  for (let column = 0; column < 16; column += 4) {
    const x = b[bo + column] as number;
    const y = b[bo + column + 1] as number;
    const z = b[bo + column + 2] as number;
    const w = column === 12 ? 1 : 0;
    for (let row = 0; row < 3; row += 1) {
      out[o + column + row] =
        (a[ao + row] as number) * x +
        (a[ao + 4 + row] as number) * y +
        (a[ao + 8 + row] as number) * z +
        (a[ao + 12 + row] as number) * w;
    }
  }
}
