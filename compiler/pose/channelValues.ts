import type { Channel, ControlNode, NumberOrAttribute, PoseValues, RigAttribute } from '../rig/Rig';

/** All channels in the order in which their values are stored: translate, rotate, scale. */
export const CHANNELS: readonly Channel[] = ['tx', 'ty', 'tz', 'rx', 'ry', 'rz', 'sx', 'sy', 'sz'];

/** The value, or the nearer bound when it lies outside; null is no bound. */
export function clampValue(value: number, min: number | null, max: number | null): number {
  if (min !== null && value < min) return min;
  return max !== null && value > max ? max : value;
}

function givenValue(pose: PoseValues, control: string, key: string): number | undefined {
  // Own properties only: a control may be called `constructor`, an attribute `length`.
  const values = Object.hasOwn(pose, control) ? pose[control] : undefined;
  const value = values !== undefined && Object.hasOwn(values, key) ? values[key] : undefined;
  return Number.isFinite(value) ? value : undefined;
}

/**
 * Value of one channel: what the pose gives, within the channel's limits; rest (0, scale 1) when it gives none, no
 * finite number, or the channel is locked.
 */
export function channelValue(control: ControlNode, channel: Channel, pose: PoseValues): number {
  const rest = channel.startsWith('s') ? 1 : 0;
  const rule = control.channels[channel];
  if (rule?.locked) return rest;
  const value = givenValue(pose, control.name, channel);
  if (value === undefined) return rest;
  return rule === undefined ? value : clampValue(value, rule.min, rule.max);
}

/** Value of an attribute: what the pose gives, within its limits; its default when it gives no finite number. */
export function attributeValue(control: string, attribute: RigAttribute, pose: PoseValues): number {
  const value = givenValue(pose, control, attribute.name);
  return value === undefined ? attribute.default : clampValue(value, attribute.min, attribute.max);
}

/** A number, or an attribute's value in a pose, prepared by the names it needs. */
export type NumberReader = (pose: PoseValues) => number;

/** Makes a reader for a plain number or an attribute of one of `controls`; an unknown attribute reads 0. */
export function readerOf(value: NumberOrAttribute, controls: ReadonlyMap<string, ControlNode>): NumberReader {
  if (typeof value === 'number') return () => value;
  const attribute = controls
    .get(value.control)
    ?.attributes.find((candidate) => candidate.name === value.attribute);
  if (attribute === undefined) return () => 0;
  return (pose) => attributeValue(value.control, attribute, pose);
}
