import { quatToEuler } from '../math/euler';
import { decomposeMat4, invertMat4, type Mat4, multiplyMat4 } from '../math/mat4';
import type { Channel, ControlNode, PoseValues } from '../rig/Rig';

/** Values of one control in a pose, without any of its nine channels; its attributes stay. */
export function withoutChannels(pose: PoseValues, control: string): PoseValues {
  const kept = Object.entries(pose[control] ?? {}).filter(([key]) => !/^[trs][xyz]$/.test(key));
  return { ...pose, [control]: Object.fromEntries(kept) };
}

/** Adds values of one control to a pose. */
export function withValues(
  pose: PoseValues,
  control: string,
  values: Readonly<Record<string, number>>,
): PoseValues {
  return { ...pose, [control]: { ...pose[control], ...values } };
}

/**
 * Channel values that bring a control from `bare`, its world matrix with all channels at rest, to `wanted`: degrees,
 * scene units and factors. Locked channels are left out and stay at rest; a `bare` that flattens space gives nothing.
 */
export function channelsToward(
  control: ControlNode,
  bare: Mat4,
  wanted: Mat4,
): Readonly<Record<string, number>> {
  const inverse = invertMat4(bare);
  if (inverse === undefined) return {};
  const { at, turn, scale } = decomposeMat4(multiplyMat4(inverse, wanted));
  const [rx, ry, rz] = quatToEuler(turn, control.order);
  const [tx, ty, tz] = at;
  const [sx, sy, sz] = scale;
  const all: Readonly<Record<Channel, number>> = { tx, ty, tz, rx, ry, rz, sx, sy, sz };
  const free = Object.entries(all).filter(([channel]) => !control.channels[channel as Channel]?.locked);
  return Object.fromEntries(free);
}
