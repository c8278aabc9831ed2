import type {
  Axis,
  Channel,
  ChannelRule,
  LengthUnit,
  LineStyle,
  RotationOrder,
  ShapeName,
  Side,
  Vec3,
} from '../rig/Rig';
import type { Path } from '../syntax/types';

/** A landmark or joint by name, or a point in the scene's axes and unit. */
export type PlaceReference = string | Vec3;

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
  };
  readonly order: RotationOrder;
}

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
}

export interface SolverSpecification extends Specification {
  readonly kind: 'two_bone';
  readonly joints: readonly [string, string, string];
  readonly goal: string;
  readonly pole: string;
  readonly blend: number | string;
}

export interface ConstraintSpecification extends Specification {
  readonly kind: 'parent' | 'point' | 'orient' | 'scale';
  readonly target: string;
  readonly sources: readonly { readonly node: string; readonly weight: number }[];
  readonly blend: number | string | null;
  readonly keepOffset: boolean;
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
  readonly guideLines: readonly GuideLineSpecification[];
  readonly notes: readonly { readonly key: string; readonly value: string | number | boolean }[];
}
