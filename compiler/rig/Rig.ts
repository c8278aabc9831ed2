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

export type TurnChannel = 'rx' | 'ry' | 'rz';

export interface ValueRange {
  readonly min: number | null;
  readonly max: number | null;
}

export interface JointNode extends NodeBase {
  readonly kind: 'joint';
  readonly order: RotationOrder;
  /** How far the joint is meant to turn from rest, in degrees; controls enforce it, evaluation does not. */
  readonly limits: Readonly<Partial<Record<TurnChannel, ValueRange>>>;
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
  /** Words for the values 0, 1, 2 …; null for a plain number. */
  readonly labels: readonly string[] | null;
  /** What it does, for the animator. */
  readonly note: string | null;
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

/** Stands for a mesh of the model; draws nothing by itself. */
export interface GeometryNode extends NodeBase {
  readonly kind: 'geometry';
  /** Name of the mesh in the model's file. */
  readonly mesh: string;
}

export type RigNode = GroupNode | JointNode | ControlNode | LineNode | NoteNode | GeometryNode;

/** A number, or the value of `control`.`attribute`. */
export type NumberOrAttribute = number | { readonly control: string; readonly attribute: string };

interface ConstraintBase {
  readonly id: string;
  readonly name: string;
  readonly target: string;
  readonly sources: readonly { readonly node: string; readonly weight: number }[];
  /** Two sources only: the first weighs `blend`, the second 1 − `blend`, in place of their weights. */
  readonly blend: NumberOrAttribute | null;
  readonly keepOffset: boolean;
}

/**
 * Replaces part of the target's world transform by the weighted sources'. `parent`: everything; `point`:
 * position; `orient`: rotation; `scale`: scale. With `keepOffset` each source carries the target's rest
 * transform relative to its own, so nothing moves at rest.
 */
export interface FollowConstraint extends ConstraintBase {
  readonly kind: 'parent' | 'point' | 'orient' | 'scale';
}

/** Turns the target so that one of its axes points at the weighted sources. */
export interface AimConstraint extends ConstraintBase {
  readonly kind: 'aim';
  /** Axis of the target that points; with `keepOffset`, the direction that it has at rest is used instead. */
  readonly axis: Axis;
  readonly upAxis: Axis;
  /** Node whose rotation carries the up axis; null turns the target along the shortest arc. */
  readonly up: string | null;
}

export type RigConstraint = FollowConstraint | AimConstraint;

interface SolverBase {
  readonly id: string;
  readonly name: string;
}

/** What solvers share that make a chain's end meet a goal. */
interface ReachBase extends SolverBase {
  readonly goal: string;
  readonly pole: string;
  /** 0: the joints' own rotations; 1: the solved ones; between: shortest arc on local rotations. */
  readonly blend: NumberOrAttribute;
  /** 0: bones keep their lengths; 1: they grow until the end meets the goal, up to `stretchLimit`. */
  readonly stretch: NumberOrAttribute;
  /** Greatest factor on the bones' length; 1 or more. */
  readonly stretchLimit: number;
  /** Part of the chain's length over which the end slows down before full reach; 0 to 1. */
  readonly soft: number;
  /** Degrees by which the bend is swung about the line from start to goal. */
  readonly swing: NumberOrAttribute;
}

/** Closed-form inverse kinematics of three joints in a row. */
export interface TwoBoneSolver extends ReachBase {
  readonly kind: 'two_bone';
  readonly start: string;
  readonly mid: string;
  readonly end: string;
}

/** Folds four or more joints in a row evenly until the last meets the goal. */
export interface ReachSolver extends ReachBase {
  readonly kind: 'reach';
  readonly joints: readonly string[];
  /** −1 to 1: moves the fold from the last bends to the first. */
  readonly bias: NumberOrAttribute;
}

/** Lays joints along a curve through controls. */
export interface SplineSolver extends SolverBase {
  readonly kind: 'spline';
  readonly joints: readonly string[];
  readonly controls: readonly string[];
  /** 0: joints keep their distances; 1: they spread over the whole curve. */
  readonly stretch: NumberOrAttribute;
  /** 0 to 1: how far joints thicken and thin to keep the volume. */
  readonly volume: NumberOrAttribute;
}

/** Spreads the twist of `driver` against `base` about a bone over joints that lie along it. */
export interface TwistSolver extends SolverBase {
  readonly kind: 'twist';
  readonly joints: readonly string[];
  /** Share of the twist that each joint takes. */
  readonly shares: readonly number[];
  /** The bone's joint, parent of every twist joint, and the joint at its other end. */
  readonly bone: string;
  readonly tip: string;
  readonly base: string;
  readonly driver: string;
}

/** Turns one joint so that it points at a goal. */
export interface AimSolver extends SolverBase {
  readonly kind: 'aim';
  readonly joint: string;
  readonly goal: string;
  /** Node whose position says which way is up; null turns the joint along the shortest arc. */
  readonly pole: string | null;
  readonly blend: NumberOrAttribute;
}

/** Rolls and banks a foot over points of its sole. */
export interface FootRollSolver extends SolverBase {
  readonly kind: 'foot_roll';
  readonly foot: string;
  /** Moved by every pivot. */
  readonly ankle: string;
  /** Moved by every pivot but the ball. */
  readonly toes: string;
  /** Points in the rest frame of `foot`. */
  readonly heel: Vec3;
  readonly ball: Vec3;
  readonly toe: Vec3;
  readonly inner: Vec3;
  readonly outer: Vec3;
  /** Unit directions in the rest frame of `foot`: positive roll turns about `hinge`, positive bank about `forward`. */
  readonly hinge: Vec3;
  readonly forward: Vec3;
  /** Degrees. */
  readonly roll: NumberOrAttribute;
  readonly bank: NumberOrAttribute;
  readonly break: NumberOrAttribute;
}

export type RigSolver = TwoBoneSolver | ReachSolver | SplineSolver | TwistSolver | AimSolver | FootRollSolver;

/** Lets the animator choose what carries a control. */
export interface RigSpace {
  readonly id: string;
  readonly name: string;
  readonly control: string;
  /** Attribute of the control whose value, rounded, picks a source by its place in the list. */
  readonly attribute: string;
  readonly sources: readonly string[];
  /** `all`: the source carries the control; `turn`: it only turns it. */
  readonly follow: 'all' | 'turn';
}

/** Adds a value that follows an attribute or channel of a control to a channel of any node. */
export interface RigDriver {
  readonly id: string;
  readonly name: string;
  readonly control: string;
  /** An attribute or a channel of the control. */
  readonly input: string;
  readonly target: string;
  readonly channel: Channel;
  /** Keys of the curve, inputs ascending. */
  readonly inputs: readonly number[];
  readonly outputs: readonly number[];
  readonly curve: 'linear' | 'smooth';
  /** `hold`: the end keys' outputs beyond them; `extend`: the end pieces run on straight. */
  readonly beyond: 'hold' | 'extend';
}

/** Which joints deform a mesh. */
export interface RigSkin {
  readonly id: string;
  readonly name: string;
  readonly geometry: string;
  readonly joints: readonly string[];
  /** Joints that a vertex may follow at most. */
  readonly influences: number;
}

/** A morph target of a mesh with its weight. */
export interface RigShape {
  readonly id: string;
  readonly name: string;
  readonly geometry: string;
  /** Name of the morph target in the model's file. */
  readonly morph: string;
  readonly weight: NumberOrAttribute;
}

export interface Rig {
  readonly scene: RigScene;
  /** Parents come before children, and a line after the nodes at both its ends. */
  readonly nodes: readonly RigNode[];
  readonly constraints: readonly RigConstraint[];
  readonly solvers: readonly RigSolver[];
  readonly spaces: readonly RigSpace[];
  readonly drivers: readonly RigDriver[];
  readonly skins: readonly RigSkin[];
  readonly shapes: readonly RigShape[];
}

/** Control values by control name: degrees, scene units, attribute values. Missing ones read their default. */
export type PoseValues = Readonly<Record<string, Readonly<Record<string, number>>>>;
