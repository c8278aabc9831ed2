import type {
  Channel,
  ChannelRule,
  ControlNode,
  JointNode,
  NoteNode,
  RigAttribute,
  RigNode,
  TurnChannel,
  ValueRange,
} from '../rig/Rig';
import type { StepOf } from './Step';

export type NodeStep = StepOf<'group' | 'joint' | 'control' | 'note' | 'line' | 'geometry'>;

/** A node while later steps may still add to it. */
export interface NodeDraft {
  readonly step: NodeStep;
  readonly attributes: RigAttribute[];
  readonly channels: Map<Channel, ChannelRule>;
  readonly limits: Map<TurnChannel, ValueRange>;
  readonly limited: Set<Channel>;
  readonly entries: NoteNode['entries'][number][];
  shown: boolean;
  selectable: boolean;
  /** Whether a `show` step was met. */
  showGiven: boolean;
}

/** A new node, shown and selectable, with nothing added yet. */
export function draftNode(step: NodeStep): NodeDraft {
  return {
    step,
    attributes: [],
    channels: new Map(),
    limits: new Map(),
    limited: new Set(),
    entries: [],
    shown: true,
    selectable: true,
    showGiven: false,
  };
}

/** The node of the rig that a finished draft stands for. */
export function finishNode(draft: NodeDraft): RigNode {
  const { step, shown, selectable } = draft;
  const { id, parent, container, role, side, at, turn } = step.values;
  const base = { id, name: step.name, parent, container, role, side, at, turn, shown, selectable };
  switch (step.verb) {
    case 'group':
      return { ...base, kind: 'group' };
    case 'joint':
      return {
        ...base,
        kind: 'joint',
        order: step.values.order,
        limits: Object.fromEntries(draft.limits) as JointNode['limits'],
      };
    case 'control': {
      const { order, shape, size } = step.values;
      const channels: ControlNode['channels'] = Object.fromEntries(draft.channels);
      return { ...base, kind: 'control', order, shape, size, channels, attributes: draft.attributes };
    }
    case 'note':
      return { ...base, kind: 'note', entries: draft.entries };
    case 'line': {
      const { from, to, style } = step.values;
      return { ...base, kind: 'line', from, to, style };
    }
    case 'geometry':
      return { ...base, kind: 'geometry', mesh: step.values.mesh };
    default:
      return step satisfies never;
  }
}
