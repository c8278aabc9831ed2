import { CHANNELS } from '../pose/channelValues';
import type { Channel, ControlNode, PoseValues, Rig } from '../rig/Rig';

/** Turn in degrees to either side of a channel without a limit. */
const FREE_TURN = 25;
/** Seconds from one pose to the next. */
export const POSE_SECONDS = 0.25;

const TURNS: readonly Channel[] = CHANNELS.filter((channel) => channel.startsWith('r'));

function extreme(control: ControlNode, side: 'min' | 'max'): Readonly<Record<string, number>> {
  const values: Record<string, number> = {};
  for (const channel of TURNS) {
    const rule = control.channels[channel];
    if (rule?.locked) continue;
    const free = side === 'min' ? -FREE_TURN : FREE_TURN;
    const limit = rule?.[side] ?? free;
    values[channel] = side === 'min' ? Math.max(limit, -90) : Math.min(limit, 90);
  }
  return values;
}

/** Attributes that move by themselves: all but choices and those that blend between two ways of moving. */
function attributeExtremes(control: ControlNode, side: 'min' | 'max'): Readonly<Record<string, number>> {
  const values: Record<string, number> = {};
  for (const { name, min, max, labels } of control.attributes) {
    if (labels === null && min !== null && max !== null) values[name] = side === 'min' ? min : max;
  }
  return values;
}

/**
 * Poses of a range-of-motion clip: rest, then each control's free turns and its bounded attributes at both ends of
 * their ranges, one control after the other in the order of the rig, rest at the end. Unlimited turns go 25 degrees to
 * either side, none beyond 90.
 */
export function rangeOfMotion(rig: Rig): readonly PoseValues[] {
  const poses: PoseValues[] = [{}];
  for (const node of rig.nodes) {
    if (node.kind !== 'control') continue;
    for (const side of ['min', 'max'] as const) {
      const values = { ...extreme(node, side), ...attributeExtremes(node, side) };
      if (Object.keys(values).length > 0) poses.push({ [node.name]: values });
    }
  }
  return [...poses, {}];
}
