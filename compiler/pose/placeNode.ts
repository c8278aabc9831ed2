import { IDENTITY_MAT4 } from '../math/mat4';
import type { RotationOrder } from '../rig/Rig';
import { writeChannelMatrix } from './controlTransform';
import type { Drive } from './driver';
import type { RigMemory, Step } from './RigMemory';
import type { ReadBase } from './space';
import type { ValueTable } from './ValueTable';
import { multiplyInto } from './worldMatrices';

/** What there is to know of a node to place it by itself, before its constraints. */
export interface NodePlacing {
  readonly node: number;
  readonly parent: number | null;
  readonly order: RotationOrder;
  /** First channel slot of a control; −1 for what has no channels of its own. */
  readonly channelSlot: number;
  readonly drives: readonly Drive[];
  readonly space: ReadBase | null;
  /** Node whose stretch multiplies this one's offset; −1 when no solver stretches it. */
  readonly stretchedBy: number;
}

/** A node with nothing but a parent: world = parent's world × rest. */
export function isPlain({ channelSlot, drives, space, stretchedBy }: NodePlacing): boolean {
  return channelSlot < 0 && drives.length === 0 && space === null && stretchedBy < 0;
}

/** Memory that placing one node needs at a time; one serves a whole rig. */
export interface PlacingMemory {
  readonly channels: Float64Array;
  readonly channelMatrix: Float64Array;
  readonly local: Float64Array;
  readonly base: Float64Array;
}

export function makePlacingMemory(): PlacingMemory {
  return {
    channels: new Float64Array(9),
    channelMatrix: Float64Array.from(IDENTITY_MAT4),
    local: Float64Array.from(IDENTITY_MAT4),
    base: Float64Array.from(IDENTITY_MAT4),
  };
}

/** Places a row of plain nodes, each after its parent. */
export function placePlainNodes(placings: readonly NodePlacing[], memory: RigMemory): Step {
  const { world, restLocal } = memory;
  const nodes = Int32Array.from(placings, ({ node }) => node * 16);
  const parents = Int32Array.from(placings, ({ parent }) => (parent === null ? -1 : parent * 16));
  return () => {
    for (let i = 0; i < nodes.length; i += 1) {
      const o = nodes[i] as number;
      const p = parents[i] as number;
      if (p >= 0) multiplyInto(world, o, world, p, restLocal, o);
      else for (let c = 0; c < 15; c += 1) world[o + c] = restLocal[o + c] as number;
    }
  };
}

/** world = parent's world (or the chosen space) × rest, its offset stretched × own and driven channels. */
export function placeNode(
  placing: NodePlacing,
  memory: RigMemory,
  scratch: PlacingMemory,
  table: ValueTable,
): Step {
  const { node, parent, order, channelSlot, drives, space, stretchedBy } = placing;
  const { world, restLocal, stretch, values } = memory;
  const { channels, channelMatrix, local, base } = scratch;
  const { moved } = table;
  const o = node * 16;
  const isDriven = drives.length > 0;
  return () => {
    let from: Float64Array = restLocal;
    let f = o;
    const factor = stretchedBy < 0 ? 1 : (stretch[stretchedBy] as number);
    if (isDriven || moved[node] === 1) {
      for (let i = 0; i < 9; i += 1) {
        channels[i] = channelSlot < 0 ? (i < 6 ? 0 : 1) : (values[channelSlot + i] as number);
      }
      for (let i = 0; i < drives.length; i += 1) (drives[i] as Drive)(channels);
      writeChannelMatrix(order, channels, channelMatrix);
      multiplyInto(local, 0, restLocal, o, channelMatrix, 0);
      from = local;
      f = 0;
    }
    if (factor !== 1) {
      if (from === restLocal) for (let i = 0; i < 15; i += 1) local[i] = restLocal[o + i] as number;
      for (let i = 12; i < 15; i += 1) {
        local[i] = (local[i] as number) + (factor - 1) * (restLocal[o + i] as number);
      }
      from = local;
      f = 0;
    }
    if (space !== null) {
      space(base);
      multiplyInto(world, o, base, 0, from, f);
    } else if (parent !== null) multiplyInto(world, o, world, parent * 16, from, f);
    else for (let i = 0; i < 15; i += 1) world[o + i] = from[f + i] as number;
  };
}
