import type {
  Axis,
  Channel,
  LengthUnit,
  LineStyle,
  NumberOrAttribute,
  Quat,
  RigConstraint,
  RotationOrder,
  ShapeName,
  Side,
  Vec3,
} from '../rig/Rig';

/** Words that a key may take, typed by the rig they come from so that the two cannot drift apart. */
const words = <W extends string>(...list: readonly W[]): readonly W[] => list;

const AXES = words<Axis>('+x', '-x', '+y', '-y', '+z', '-z');
const UNITS = words<LengthUnit>('mm', 'cm', 'm');
const SIDES = words<Side>('left', 'right', 'centre');
const ORDERS = words<RotationOrder>('xyz', 'xzy', 'yxz', 'yzx', 'zxy', 'zyx');
const STYLES = words<LineStyle>('dotted', 'dashed', 'solid');
const KINDS = words<RigConstraint['kind']>('parent', 'point', 'orient', 'scale');
const SOLVERS = words('two_bone');

export const SHAPE_NAMES = words<ShapeName>(
  'ring',
  'square',
  'diamond',
  'cross',
  'arrow',
  'ball',
  'box',
  'pin',
  'compass',
);
export const CHANNEL_NAMES = words<Channel>('tx', 'ty', 'tz', 'rx', 'ry', 'rz', 'sx', 'sy', 'sz');

/** What a value of each kind is once read. */
export interface ValueKinds {
  readonly text: string;
  readonly number: number;
  readonly flag: boolean;
  /** A name that an earlier step made. */
  readonly reference: string;
  readonly references: readonly string[];
  /** A reference, or null for the word `none`. */
  readonly parent: string | null;
  readonly vector: Vec3;
  readonly quaternion: Quat;
  readonly weights: readonly number[];
  readonly channels: readonly Channel[];
  readonly blend: NumberOrAttribute;
  readonly scalar: string | number | boolean;
}

/** A kind by name, or the list of words to choose from. */
export type KeyKind = keyof ValueKinds | readonly string[];

export interface KeyRule {
  readonly kind: KeyKind;
  /** May be left out; then it reads null. */
  readonly optional?: true;
}

export interface VerbRule {
  /** What the step does, in one line. */
  readonly summary: string;
  /** Whether the quoted name is a new one, or one that an earlier step made. */
  readonly name: 'new' | 'existing';
  readonly keys: Readonly<Record<string, KeyRule>>;
}

const NODE_KEYS = {
  id: { kind: 'text' },
  parent: { kind: 'parent' },
  container: { kind: 'text' },
  role: { kind: 'text' },
  side: { kind: SIDES },
  at: { kind: 'vector' },
  turn: { kind: 'quaternion' },
} as const;

const RANGE_KEYS = {
  min: { kind: 'number', optional: true },
  max: { kind: 'number', optional: true },
} as const;

/**
 * The verbs of Slipway 1 between its first and its last line, with every key in the order in which it is written.
 * Emitter, parser and reference all read this table; there is no other list.
 */
export const VERBS = {
  scene: {
    summary: 'Opens the scene of one character; the second line of every script.',
    name: 'new',
    keys: {
      recipe: { kind: 'text' },
      house: { kind: 'text' },
      up: { kind: AXES },
      forward: { kind: AXES },
      unit: { kind: UNITS },
      recipe_hash: { kind: 'text' },
      house_hash: { kind: 'text' },
      compiler: { kind: 'text' },
    },
  },
  group: { summary: 'Makes a plain node that carries others.', name: 'new', keys: NODE_KEYS },
  joint: {
    summary: 'Makes a joint of a skeleton.',
    name: 'new',
    keys: { ...NODE_KEYS, order: { kind: ORDERS } },
  },
  control: {
    summary: 'Makes a control: a node with channels that people move.',
    name: 'new',
    keys: { ...NODE_KEYS, order: { kind: ORDERS }, shape: { kind: SHAPE_NAMES }, size: { kind: 'number' } },
  },
  note: { summary: 'Makes the node that carries the rig’s notes.', name: 'new', keys: NODE_KEYS },
  line: {
    summary: 'Makes a drawn line between two nodes.',
    name: 'new',
    keys: { ...NODE_KEYS, from: { kind: 'reference' }, to: { kind: 'reference' }, style: { kind: STYLES } },
  },
  attr: {
    summary: 'Adds a number of its own to a control.',
    name: 'existing',
    keys: { name: { kind: 'text' }, default: { kind: 'number' }, ...RANGE_KEYS },
  },
  limit: {
    summary: 'Limits one channel of a control.',
    name: 'existing',
    keys: { channel: { kind: CHANNEL_NAMES }, ...RANGE_KEYS },
  },
  lock: {
    summary: 'Locks channels of a control at rest.',
    name: 'existing',
    keys: { channels: { kind: 'channels' } },
  },
  show: {
    summary: 'Says whether a node is shown and may be selected; without it both are true.',
    name: 'existing',
    keys: { shown: { kind: 'flag' }, selectable: { kind: 'flag' } },
  },
  entry: {
    summary: 'Adds one note to a note node.',
    name: 'existing',
    keys: { key: { kind: 'text' }, value: { kind: 'scalar' } },
  },
  constrain: {
    summary: 'Makes a node follow others.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      kind: { kind: KINDS },
      target: { kind: 'reference' },
      sources: { kind: 'references' },
      weights: { kind: 'weights' },
      keep_offset: { kind: 'flag' },
      blend: { kind: 'blend', optional: true },
    },
  },
  solve: {
    summary: 'Makes three joints reach for a goal.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      kind: { kind: SOLVERS },
      start: { kind: 'reference' },
      mid: { kind: 'reference' },
      end: { kind: 'reference' },
      goal: { kind: 'reference' },
      pole: { kind: 'reference' },
      blend: { kind: 'blend' },
    },
  },
} as const satisfies Readonly<Record<string, VerbRule>>;

export type Verb = keyof typeof VERBS;
