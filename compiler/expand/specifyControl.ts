import type { Channel, ChannelRule } from '../rig/Rig';
import { expandFindings } from './findings';
import type { ControlEntry, Sided } from './primitives';
import type { StageContext } from './StageContext';
import type { AttributeSpecification, ControlPlace, ControlSpecification } from './types';

const CHANNEL_GROUPS: Readonly<Record<string, readonly Channel[]>> = {
  move: ['tx', 'ty', 'tz'],
  turn: ['rx', 'ry', 'rz'],
  scale: ['sx', 'sy', 'sz'],
};

/** Channels in the order everything lists them. */
export const CHANNELS: readonly Channel[] = ['tx', 'ty', 'tz', 'rx', 'ry', 'rz', 'sx', 'sy', 'sz'];

function specifyChannels(entry: ControlEntry): ControlSpecification['channels'] {
  const rules = new Map<Channel, ChannelRule>();
  const written = Object.entries(entry.channels ?? {});
  // A single channel's own entry wins over its group's, whatever the order they are written in.
  const groupsFirst = [
    ...written.filter(([name]) => name in CHANNEL_GROUPS),
    ...written.filter(([name]) => !(name in CHANNEL_GROUPS)),
  ];
  for (const [name, option] of groupsFirst) {
    for (const channel of CHANNEL_GROUPS[name] ?? [name as Channel]) {
      const before = rules.get(channel);
      rules.set(channel, {
        locked: option.locked ?? before?.locked ?? false,
        min: option.min ?? before?.min ?? null,
        max: option.max ?? before?.max ?? null,
      });
    }
  }
  const channels: Partial<Record<Channel, ChannelRule>> = {};
  for (const channel of CHANNELS) {
    const rule = rules.get(channel);
    if (rule && (rule.locked || rule.min !== null || rule.max !== null)) channels[channel] = rule;
  }
  return channels;
}

function specifyAttributes(entry: ControlEntry): readonly AttributeSpecification[] {
  return Object.entries(entry.attributes ?? {}).map(([name, option]) => ({
    name,
    default: option.default ?? 0,
    min: option.min ?? null,
    max: option.max ?? null,
  }));
}

function specifyPlace(sided: Sided<ControlEntry>, context: StageContext): ControlPlace | null {
  const { entry, id, path } = sided;
  if (entry.pole_of) {
    if (entry.at !== undefined) {
      context.findings.report(
        expandFindings,
        'control-place-twice',
        context.document.spanAt([...path, 'at']),
        { id },
      );
    }
    const [start, mid, end] = entry.pole_of.joints;
    if (start === undefined || mid === undefined || end === undefined) return null;
    return {
      kind: 'pole',
      joints: [start, mid, end],
      distance: entry.pole_of.distance ?? 1,
      bend: entry.pole_of.bend ?? null,
    };
  }
  if (entry.at === undefined) {
    context.findings.report(expandFindings, 'entry-incomplete', context.document.spanAt(path, 'key'), {
      id,
      key: 'at',
    });
    return null;
  }
  return { kind: 'place', at: entry.at };
}

/** Fills in a control's defaults; null (with a finding) when it says nowhere to stand. */
export function specifyControl(
  sided: Sided<ControlEntry>,
  context: StageContext,
): ControlSpecification | null {
  const { id, entry, side, path, part } = sided;
  const place = specifyPlace(sided, context);
  if (!place) return null;
  return {
    id,
    side,
    path,
    part,
    role: entry.role ?? 'control',
    place,
    align: entry.align === undefined || entry.align === 'world' ? null : entry.align,
    parent: entry.parent ?? null,
    shape: entry.shape ?? 'ring',
    size: entry.size ?? 1,
    order: entry.rotation_order ?? 'xyz',
    channels: specifyChannels(entry),
    attributes: specifyAttributes(entry),
  };
}
