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

/** Name of the attribute by which an animator chooses the space. */
export const SPACE_ATTRIBUTE = 'space';

/** The spaces of a control in the order of the attribute's values: its parent first, unless it is listed. */
function specifySpaces({ spaces = [], parent }: ControlEntry): readonly string[] {
  if (spaces.length === 0) return [];
  return parent === undefined || spaces.includes(parent) ? spaces : [parent, ...spaces];
}

function specifyAttributes(
  entry: ControlEntry,
  spaces: readonly string[],
): readonly AttributeSpecification[] {
  const attributes = Object.entries(entry.attributes ?? {}).map(([name, option]) => {
    const labels = option.labels ?? null;
    return {
      name,
      default: option.default ?? 0,
      min: option.min ?? (labels ? 0 : null),
      max: option.max ?? (labels ? labels.length - 1 : null),
      labels,
      note: option.note ?? null,
    };
  });
  if (spaces.length < 2) return attributes;
  const chosen = {
    name: SPACE_ATTRIBUTE,
    default: Math.max(0, spaces.indexOf(entry.parent ?? '')),
    min: 0,
    max: spaces.length - 1,
    labels: spaces,
    note: 'what carries this control',
  };
  return [...attributes.filter(({ name }) => name !== SPACE_ATTRIBUTE), chosen];
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
  const spaces = specifySpaces(entry);
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
    attributes: specifyAttributes(entry, spaces),
    spaces,
    spaceFollow: entry.space_follow ?? 'all',
  };
}
