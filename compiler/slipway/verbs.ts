import type {
  Axis,
  Channel,
  LengthUnit,
  LineStyle,
  NumberOrAttribute,
  Quat,
  RigConstraint,
  RigDriver,
  RigSpace,
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
const KINDS = words<RigConstraint['kind']>('parent', 'point', 'orient', 'scale', 'aim');
const FOLLOWS = words<RigSpace['follow']>('all', 'turn');
const CURVES = words<RigDriver['curve']>('linear', 'smooth');
const BEYONDS = words<RigDriver['beyond']>('hold', 'extend');

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
  readonly numbers: readonly number[];
  readonly texts: readonly string[];
  readonly channels: readonly Channel[];
  /** A number, or an attribute that gives one between 0 and 1. */
  readonly blend: NumberOrAttribute;
  /** A number, or an attribute that gives one. */
  readonly amount: NumberOrAttribute;
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

/** Keys of the solvers that make the end of a chain meet a goal. */
const REACH_KEYS = {
  goal: { kind: 'reference' },
  pole: { kind: 'reference' },
  blend: { kind: 'blend' },
  stretch: { kind: 'blend' },
  stretch_limit: { kind: 'number' },
  soft: { kind: 'number' },
  swing: { kind: 'amount' },
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
  geometry: {
    summary: 'Makes the node that stands for a mesh of the model.',
    name: 'new',
    keys: { ...NODE_KEYS, mesh: { kind: 'text' } },
  },
  attr: {
    summary: 'Adds a number of its own to a control.',
    name: 'existing',
    keys: {
      name: { kind: 'text' },
      default: { kind: 'number' },
      ...RANGE_KEYS,
      labels: { kind: 'texts', optional: true },
      note: { kind: 'text', optional: true },
    },
  },
  limit: {
    summary: 'Limits one channel of a control, or says how far a joint is meant to turn.',
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
      axis: { kind: AXES, optional: true },
      up_axis: { kind: AXES, optional: true },
      up: { kind: 'reference', optional: true },
    },
  },
  space: {
    summary: 'Lets an attribute choose what carries a control.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      control: { kind: 'reference' },
      attribute: { kind: 'text' },
      sources: { kind: 'references' },
      follow: { kind: FOLLOWS },
    },
  },
  drive: {
    summary: 'Adds a value that follows a control to a channel of a node.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      control: { kind: 'reference' },
      input: { kind: 'text' },
      target: { kind: 'reference' },
      channel: { kind: CHANNEL_NAMES },
      inputs: { kind: 'numbers' },
      outputs: { kind: 'numbers' },
      curve: { kind: CURVES },
      beyond: { kind: BEYONDS },
    },
  },
  two_bone: {
    summary: 'Makes three joints reach for a goal.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      start: { kind: 'reference' },
      mid: { kind: 'reference' },
      end: { kind: 'reference' },
      ...REACH_KEYS,
    },
  },
  reach: {
    summary: 'Makes four or more joints reach for a goal, folding evenly.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      joints: { kind: 'references' },
      ...REACH_KEYS,
      bias: { kind: 'amount' },
    },
  },
  spline: {
    summary: 'Lays joints along a curve through controls.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      joints: { kind: 'references' },
      controls: { kind: 'references' },
      stretch: { kind: 'blend' },
      volume: { kind: 'blend' },
    },
  },
  twist: {
    summary: 'Spreads the twist of one joint over joints along a bone.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      joints: { kind: 'references' },
      shares: { kind: 'numbers' },
      bone: { kind: 'reference' },
      tip: { kind: 'reference' },
      base: { kind: 'reference' },
      driver: { kind: 'reference' },
    },
  },
  aim: {
    summary: 'Makes one joint point at a goal.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      joint: { kind: 'reference' },
      goal: { kind: 'reference' },
      pole: { kind: 'reference', optional: true },
      blend: { kind: 'blend' },
    },
  },
  foot_roll: {
    summary: 'Rolls and banks a foot over points of its sole.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      foot: { kind: 'reference' },
      ankle: { kind: 'reference' },
      toes: { kind: 'reference' },
      heel: { kind: 'vector' },
      ball: { kind: 'vector' },
      toe: { kind: 'vector' },
      inner: { kind: 'vector' },
      outer: { kind: 'vector' },
      hinge: { kind: 'vector' },
      forward: { kind: 'vector' },
      roll: { kind: 'amount' },
      bank: { kind: 'amount' },
      break: { kind: 'amount' },
    },
  },
  skin: {
    summary: 'Says which joints deform a mesh.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      geometry: { kind: 'reference' },
      joints: { kind: 'references' },
      influences: { kind: 'number' },
    },
  },
  shape: {
    summary: 'Says what weighs a morph target of a mesh.',
    name: 'new',
    keys: {
      id: { kind: 'text' },
      geometry: { kind: 'reference' },
      morph: { kind: 'text' },
      weight: { kind: 'blend' },
    },
  },
} as const satisfies Readonly<Record<string, VerbRule>>;

export type Verb = keyof typeof VERBS;

/** The verbs that make solvers; each is the kind of the solver it makes. */
export const SOLVER_VERBS = [
  'two_bone',
  'reach',
  'spline',
  'twist',
  'aim',
  'foot_roll',
] as const satisfies Verb[];

export type SolverVerb = (typeof SOLVER_VERBS)[number];
