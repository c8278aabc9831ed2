import { invariant } from '../findings/invariant';
import { conjugateInto, type Mutable, makeQuat, makeVec, multiplyQuatInto } from '../math/inPlace';
import { invertMat4, multiplyMat4, rotationOf } from '../math/mat4';
import { conjugateQuat, multiplyQuat } from '../math/quat';
import type { RigSpace } from '../rig/Rig';
import { type RigMemory, restOf } from './RigMemory';
import { multiplyInto, rotationInto, transformPointInto, turnAxes } from './worldMatrices';

/** Writes, to `base`, what stands for the world matrix of the control's parent in the space that is chosen. */
export type ReadBase = (base: Float64Array) => void;

/** Which source an attribute's value picks: the nearest whole number within the list. */
export function spaceIndex(value: number, count: number): number {
  return Math.min(count - 1, Math.max(0, Math.round(value)));
}

/**
 * Prepares a space against rest: each source carries what the control's parent is to it at rest, so at rest every
 * choice gives the same. `turn` takes the source's rotation alone and leaves place and size to the parent.
 */
export function prepareSpace(
  space: RigSpace,
  memory: RigMemory,
  parent: number,
  attributeSlot: number,
): ReadBase {
  const { world, values, indexOf } = memory;
  const sources = Int32Array.from(space.sources, (name) => indexOf(name) * 16);
  const offsets = new Float64Array(space.sources.length * 16);
  const turns: Mutable[] = [];
  const restParent = restOf(memory, parent);
  space.sources.forEach((name, index) => {
    const rest = restOf(memory, indexOf(name));
    const inverse = invertMat4(rest);
    invariant(inverse !== undefined, 'rest matrices hold no scale and can be inverted');
    offsets.set(multiplyMat4(inverse, restParent), index * 16);
    turns.push(makeQuat(multiplyQuat(conjugateQuat(rotationOf(rest)), rotationOf(restParent))));
  });
  const turn = makeQuat();
  const own = makeQuat();
  const c = indexOf(space.control) * 16 + 12;
  const at = makeVec(memory.restLocal.subarray(c, c + 3));
  const place = makeVec();
  const turned = makeVec();
  const p = parent * 16;
  return (base) => {
    const index = spaceIndex(values[attributeSlot] as number, sources.length);
    const source = sources[index] as number;
    if (space.follow === 'all') {
      multiplyInto(base, 0, world, source, offsets, index * 16);
      return;
    }
    for (let i = 0; i < 16; i += 1) base[i] = world[p + i] as number;
    rotationInto(turn, world, source);
    multiplyQuatInto(turn, turn, turns[index] as Mutable);
    rotationInto(own, base, 0);
    conjugateInto(own, own);
    multiplyQuatInto(turn, turn, own);
    // The control's own place stays where its parent has it.
    transformPointInto(place, base, 0, at);
    turnAxes(base, 0, turn);
    transformPointInto(turned, base, 0, at);
    for (let i = 0; i < 3; i += 1) {
      base[12 + i] = (base[12 + i] as number) + (place[i] as number) - (turned[i] as number);
    }
  };
}
