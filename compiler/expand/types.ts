import type {
  Axis,
  Channel,
  ChannelRule,
  LengthUnit,
  LineStyle,
  RotationOrder,
  ShapeName,
  Side,
  TurnChannel,
  ValueRange,
  Vec3,
} from '../rig/Rig';
import type { Path } from '../syntax/types';

/** A point on the line between two landmarks or joints. */
export interface BetweenPlace {
  readonly from: string;
  readonly to: string;
  readonly share?: number;
}

/** A landmark or joint by name, a point in the scene's axes and unit, or a point between two. */
export type PlaceReference = string | Vec3 | BetweenPlace;

/** What every primitive carries after expansion: it stands on one side only and knows where it was written. */
export interface Specification {
  readonly id: string;
  readonly side: Side;
  /** Where the author wrote it; for what a part made, the part itself, or the entry that adjusts it. */
  readonly path: Path;
  /** The part that made it. */
  readonly part: string | null;
}

export type MirrorRule = 'behaviour' | 'orientation' | 'world';

export interface ChainSpecification extends Specification {
  readonly role: string;
  readonly points: readonly PlaceReference[];
  /** Count of joints spread by arc length, or null for one joint at each point. */
  readonly count: number | null;
  readonly curve: 'smooth' | 'straight';
  /** Full ids of the joints, in order. */
  readonly jointIds: readonly string[];
  readonly parent: string | null;
  readonly mirror: MirrorRule;
  readonly orient: {
    readonly rule: 'chain' | 'world';
    readonly aim: Axis;
    readonly up: Axis;
    readonly toward: Vec3 | null;
    /** Joint whose frame all joints take. */
    readonly like: string | null;
  };
  readonly order: RotationOrder;
  /** By the joint's name in the chain, in degrees from rest. */
  readonly limits: Readonly<Record<string, JointLimits>>;
}

/** How far a joint is meant to turn about its own axes, in degrees from rest. */
export type JointLimits = Readonly<Partial<Record<TurnChannel, ValueRange>>>;

/** Where a control stands: at a place, or where the pole of three joints belongs. */
export type ControlPlace =
  | { readonly kind: 'place'; readonly at: PlaceReference }
  | {
      readonly kind: 'pole';
      readonly joints: readonly [string, string, string];
      /** Factor on the length of both bones. */
      readonly distance: number;
      readonly bend: Vec3 | null;
    };

export interface AttributeSpecification {
  readonly name: string;
  readonly default: number;
  readonly min: number | null;
  readonly max: number | null;
  readonly labels: readonly string[] | null;
  readonly note: string | null;
}

export interface ControlSpecification extends Specification {
  readonly role: string;
  readonly place: ControlPlace;
  /** Joint or control whose rest orientation it takes; null keeps the world's. */
  readonly align: string | null;
  readonly parent: string | null;
  readonly shape: ShapeName;
  /** Factor on the computed size. */
  readonly size: number;
  readonly order: RotationOrder;
  readonly channels: Readonly<Partial<Record<Channel, ChannelRule>>>;
  readonly attributes: readonly AttributeSpecification[];
  /** Ids of what may carry it, in the order of the attribute's values; empty when there is no choice. */
  readonly spaces: readonly string[];
  readonly spaceFollow: 'all' | 'turn';
}

/** A number, or an attribute as `control.attribute`. */
export type Amount = number | string;

interface ReachSpecification extends Specification {
  readonly goal: string;
  readonly pole: string;
  readonly blend: Amount;
  readonly stretch: Amount;
  readonly stretchLimit: number;
  readonly soft: number;
  readonly swing: Amount;
}

export interface TwoBoneSpecification extends ReachSpecification {
  readonly kind: 'two_bone';
  readonly joints: readonly [string, string, string];
}

export interface ReachChainSpecification extends ReachSpecification {
  readonly kind: 'reach';
  readonly joints: readonly string[];
  readonly bias: Amount;
}

export interface SplineSpecification extends Specification {
  readonly kind: 'spline';
  readonly joints: readonly string[];
  readonly controls: readonly string[];
  readonly stretch: Amount;
  readonly volume: Amount;
}

export interface TwistSpecification extends Specification {
  readonly kind: 'twist';
  readonly joints: readonly string[];
  readonly shares: readonly number[];
  readonly bone: string;
  readonly tip: string;
  readonly base: string;
  readonly driver: string;
}

export interface AimSpecification extends Specification {
  readonly kind: 'aim';
  readonly joints: readonly [string];
  readonly goal: string;
  readonly pole: string | null;
  readonly blend: Amount;
}

/** Names of the points of a sole. */
export const SOLE_POINTS = ['heel', 'ball', 'toe', 'inner', 'outer'] as const;
export type SolePoint = (typeof SOLE_POINTS)[number];

export interface FootRollSpecification extends Specification {
  readonly kind: 'foot_roll';
  readonly foot: string;
  readonly ankle: string;
  /** Null when the ankle alone is moved. */
  readonly toes: string | null;
  readonly sole: Readonly<Record<SolePoint, PlaceReference>>;
  readonly roll: Amount;
  readonly bank: Amount;
  readonly break: Amount;
}

export type SolverSpecification =
  | TwoBoneSpecification
  | ReachChainSpecification
  | SplineSpecification
  | TwistSpecification
  | AimSpecification
  | FootRollSpecification;

export interface ConstraintSpecification extends Specification {
  readonly kind: 'parent' | 'point' | 'orient' | 'scale' | 'aim';
  readonly target: string;
  readonly sources: readonly { readonly node: string; readonly weight: number }[];
  readonly blend: Amount | null;
  readonly keepOffset: boolean;
  /** Aim constraints only. */
  readonly aim: { readonly axis: Axis; readonly upAxis: Axis; readonly up: string | null } | null;
}

export interface DriverSpecification extends Specification {
  /** The control, and its attribute or channel. */
  readonly control: string;
  readonly input: string;
  readonly target: string;
  readonly channel: Channel;
  readonly inputs: readonly number[];
  readonly outputs: readonly number[];
  readonly curve: 'linear' | 'smooth';
  readonly beyond: 'hold' | 'extend';
}

export interface GeometrySpecification extends Specification {
  readonly mesh: string;
  readonly role: string;
}

export interface SkinSpecification extends Specification {
  readonly geometry: string;
  /** Ids of joints, or of chains for all their joints. */
  readonly joints: readonly string[];
  readonly influences: number;
}

export interface ShapeSpecification extends Specification {
  readonly geometry: string;
  readonly morph: string;
  readonly weight: Amount;
}

export interface GuideLineSpecification extends Specification {
  readonly from: string;
  readonly to: string;
  readonly style: LineStyle;
}

/** A landmark with both its points; centre landmarks have the same point twice. */
export interface LandmarkPoints {
  readonly left: Vec3;
  readonly right: Vec3;
}

/** Axes and unit of every number, with the directions the geometry needs. */
export interface SceneFrame {
  readonly upAxis: Axis;
  readonly forwardAxis: Axis;
  readonly unit: LengthUnit;
  readonly up: Vec3;
  readonly forward: Vec3;
  /** up × forward; mirroring flips this direction. */
  readonly left: Vec3;
}

/** A recipe in primitives only: sides split, defaults filled in, numbers evaluated. */
export interface ExpandedRecipe {
  readonly scene: SceneFrame;
  readonly landmarks: ReadonlyMap<string, LandmarkPoints>;
  readonly chains: readonly ChainSpecification[];
  readonly controls: readonly ControlSpecification[];
  readonly solvers: readonly SolverSpecification[];
  readonly constraints: readonly ConstraintSpecification[];
  readonly drivers: readonly DriverSpecification[];
  readonly geometry: readonly GeometrySpecification[];
  readonly skins: readonly SkinSpecification[];
  readonly shapes: readonly ShapeSpecification[];
  readonly guideLines: readonly GuideLineSpecification[];
  readonly notes: readonly { readonly key: string; readonly value: string | number | boolean }[];
}
