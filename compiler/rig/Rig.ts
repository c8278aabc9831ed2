/**
 * The compiled rig: what the compiler proves, what a Slipway script says and what the reference runner builds
 * again from that script. One type serves all three, so `run(emit(rig))` can be compared with `rig` directly.
 *
 * Conventions: right-handed; lengths in the scene's unit; angles in degrees; quaternions x y z w; matrices
 * column-major. world = parent × rest × translate × rotate × scale, and every channel reads zero (scale: one)
 * at rest. Rotation order `xyz` turns about X first, then Y, then Z, about fixed axes: R = Rz·Ry·Rx.
 */
export type Vec3 = readonly [number, number, number];
export type Quat = readonly [number, number, number, number];
export type Side = 'left' | 'right' | 'centre';
export type RotationOrder = 'xyz' | 'xzy' | 'yxz' | 'yzx' | 'zxy' | 'zyx';
export type Axis = '+x' | '-x' | '+y' | '-y' | '+z' | '-z';
export type LengthUnit = 'mm' | 'cm' | 'm';
export type Channel = 'tx' | 'ty' | 'tz' | 'rx' | 'ry' | 'rz' | 'sx' | 'sy' | 'sz';
export type ShapeName =
  | 'ring'
  | 'square'
  | 'diamond'
  | 'cross'
  | 'arrow'
  | 'ball'
  | 'box'
  | 'pin'
  | 'compass';
export type LineStyle = 'dotted' | 'dashed' | 'solid';

/** What the header of a script states about the whole rig. */
export interface RigScene {
  /** The cast member; first token of every name. */
  readonly character: string;
  /** `recipe@version`; version is `draft` for a text that was not saved. */
  readonly recipe: string;
  readonly house: string;
  readonly up: Axis;
  readonly forward: Axis;
  readonly unit: LengthUnit;
  /** SHA-256 (hex) of the canonical merged recipe and of the house rules. */
  readonly recipeHash: string;
  readonly houseHash: string;
  readonly compiler: string;
}

interface NodeBase {
  /** Stable recipe id, e.g. `arm.left.elbow`; what people select, comment on and rename by. */
  readonly id: string;
  /** Emitted name from the naming pattern; unique in the scene. All references below are names. */
  readonly name: string;
  readonly parent: string | null;
  /** Id of the container the node lies in. */
  readonly container: string;
  readonly role: string;
  readonly side: Side;
  /** Rest transform against the parent's rest. */
  readonly at: Vec3;
  readonly turn: Quat;
  /** As an animator meets it: already false when the container is hidden. */
  readonly shown: boolean;
  readonly selectable: boolean;
}

export interface GroupNode extends NodeBase {
  readonly kind: 'group';
}

export interface JointNode extends NodeBase {
  readonly kind: 'joint';
  readonly order: RotationOrder;
}

export interface ChannelRule {
  readonly locked: boolean;
  readonly min: number | null;
  readonly max: number | null;
}

export interface RigAttribute {
  readonly name: string;
  readonly default: number;
  readonly min: number | null;
  readonly max: number | null;
}

export interface ControlNode extends NodeBase {
  readonly kind: 'control';
  readonly order: RotationOrder;
  readonly shape: ShapeName;
  /** Radius of the drawn shape in scene units. */
  readonly size: number;
  /** Only channels that are locked or limited are listed. */
  readonly channels: Readonly<Partial<Record<Channel, ChannelRule>>>;
  readonly attributes: readonly RigAttribute[];
}

/** A drawn leader whose ends sit at the world positions of two other nodes, whatever their pose. */
export interface LineNode extends NodeBase {
  readonly kind: 'line';
  readonly from: string;
  readonly to: string;
  readonly style: LineStyle;
}

/** Carries the rig's notes; has a transform like any node but draws nothing. */
export interface NoteNode extends NodeBase {
  readonly kind: 'note';
  readonly entries: readonly { readonly key: string; readonly value: string | number | boolean }[];
}

export type RigNode = GroupNode | JointNode | ControlNode | LineNode | NoteNode;

/** A number, or the value of `control`.`attribute`. */
export type NumberOrAttribute = number | { readonly control: string; readonly attribute: string };

/**
 * Replaces part of the target's world transform by the weighted sources'. `parent`: everything; `point`:
 * position; `orient`: rotation; `scale`: scale. With `keepOffset` each source carries the target's rest
 * transform relative to its own, so nothing moves at rest.
 */
export interface RigConstraint {
  readonly id: string;
  readonly name: string;
  readonly kind: 'parent' | 'point' | 'orient' | 'scale';
  readonly target: string;
  readonly sources: readonly { readonly node: string; readonly weight: number }[];
  /** Two sources only: the first weighs `blend`, the second 1 − `blend`, in place of their weights. */
  readonly blend: NumberOrAttribute | null;
  readonly keepOffset: boolean;
}

/** Closed-form inverse kinematics of three joints in a row. */
export interface TwoBoneSolver {
  readonly kind: 'two_bone';
  readonly id: string;
  readonly name: string;
  readonly start: string;
  readonly mid: string;
  readonly end: string;
  readonly goal: string;
  readonly pole: string;
  /** 0: the joints' own rotations; 1: the solved ones; between: shortest arc on local rotations. */
  readonly blend: NumberOrAttribute;
}

export type RigSolver = TwoBoneSolver;

export interface Rig {
  readonly scene: RigScene;
  /** Parents come before children, and a line after the nodes at both its ends. */
  readonly nodes: readonly RigNode[];
  readonly constraints: readonly RigConstraint[];
  readonly solvers: readonly RigSolver[];
}

/** Control values by control name: degrees, scene units, attribute values. Missing ones read their default. */
export type PoseValues = Readonly<Record<string, Readonly<Record<string, number>>>>;
