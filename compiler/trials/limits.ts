import { quatToEuler } from '../math/euler';
import { invertMat4, multiplyMat4, rotationOf } from '../math/mat4';
import { CHANNELS } from '../pose/channelValues';
import { readMatrix } from '../pose/worldMatrices';
import type { Channel, JointNode, PoseValues, TurnChannel } from '../rig/Rig';
import { displacement } from './displacement';
import type { PoseDraft } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

const TURNS: readonly TurnChannel[] = ['rx', 'ry', 'rz'];
/** How far past its limit a channel is driven: in rig sizes, degrees, factor. */
const PAST: Readonly<Record<'t' | 'r' | 's', number>> = { t: 0.5, r: 40, s: 0.5 };

function pastOf(channel: Channel, size: number): number {
  const kind = channel[0] as 't' | 'r' | 's';
  return PAST[kind] * (kind === 't' ? size : 1);
}

/** Every limited channel at one of its limits, and the same driven past it; locked ones at rest and driven off it. */
function posesAtLimits(
  bench: TrialBench,
  side: 'min' | 'max',
): { readonly at: PoseValues; readonly past: PoseValues } {
  const { rig, intent, indexOfId, size } = bench;
  const at: PoseDraft = {};
  const past: PoseDraft = {};
  const sign = side === 'max' ? 1 : -1;
  for (const [id, channels] of intent.channels) {
    const name = rig.nodes[indexOfId.get(id) ?? -1]?.name;
    if (name === undefined) continue;
    const limited: Record<string, number> = {};
    const beyond: Record<string, number> = {};
    for (const channel of CHANNELS) {
      const rule = channels[channel];
      if (!rule) continue;
      const limit = rule.locked ? (channel.startsWith('s') ? 1 : 0) : rule[side];
      if (limit === null) continue;
      limited[channel] = limit;
      beyond[channel] = limit + sign * pastOf(channel, size);
    }
    at[name] = limited;
    past[name] = beyond;
  }
  return { at, past };
}

/** Turns of a joint from rest, in degrees in its rotation order. */
function turnsFromRest(index: number, joint: JointNode, { poser, rest, indexOfName }: TrialBench) {
  const local = (matrices: Float64Array) => {
    const own = readMatrix(matrices, index);
    const parent = joint.parent === null ? undefined : indexOfName.get(joint.parent);
    const inverse = parent === undefined ? undefined : invertMat4(readMatrix(matrices, parent));
    return inverse === undefined ? own : multiplyMat4(inverse, own);
  };
  const inverseRest = invertMat4(local(rest));
  if (inverseRest === undefined) return [0, 0, 0] as const;
  return quatToEuler(rotationOf(multiplyMat4(inverseRest, local(poser.world))), joint.order);
}

/** How many degrees joints are turned beyond what the recipe says they are meant to; 0 within. */
function excess(index: number, joint: JointNode, bench: TrialBench): number {
  const turns = turnsFromRest(index, joint, bench);
  let most = 0;
  TURNS.forEach((channel, axis) => {
    const range = joint.limits[channel];
    if (!range) return;
    const turn = turns[axis] as number;
    most = Math.max(most, turn - (range.max ?? Infinity), (range.min ?? -Infinity) - turn);
  });
  return most;
}

/**
 * A control driven past a limit, or off a lock, that the recipe gives it stays there; and with all limited controls at
 * their limits, joints stay within their own.
 */
export function tryLimits(bench: TrialBench): TrialResult {
  const { rig, poser, size, tolerance } = bench;
  const tally = new Tally('limits', rig.scene.unit, tolerance);
  const joints = rig.nodes.flatMap((node, index) =>
    node.kind === 'joint' && Object.keys(node.limits).length > 0 ? [{ node, index }] : [],
  );
  for (const side of ['min', 'max'] as const) {
    const { at, past } = posesAtLimits(bench, side);
    poser.evaluate(at);
    for (const { node, index } of joints) {
      // Beyond its limit the tip of an axis as long as the rig goes astray by this arc.
      tally.add((Math.max(0, excess(index, node, bench)) * Math.PI * size) / 180, node.id, at);
    }
    const limited = poser.world.slice();
    poser.evaluate(past);
    rig.nodes.forEach(({ id }, index) => {
      tally.add(displacement(poser.world, index, limited, index, size), id, past);
    });
  }
  return tally.result();
}
