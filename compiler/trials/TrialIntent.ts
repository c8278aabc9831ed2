import type { Channel, ChannelRule, Vec3 } from '../rig/Rig';

/** How the axes of a right twin follow from those of the left, by the chain's mirror rule. */
export type TwinAxes =
  /** The mirror image with all three axes turned round: equal turns mirror each other. */
  | { readonly kind: 'opposed' }
  /** The mirror image with this one axis turned round, 0 to 2. */
  | { readonly kind: 'hinge'; readonly axis: 0 | 1 | 2 }
  /** The same axes on both sides. */
  | { readonly kind: 'same' };

/** Two things that one entry of the recipe makes on both sides. */
export interface Twins {
  readonly left: string;
  readonly right: string;
  readonly axes: TwinAxes;
}

/** What the recipe asks of one node. */
export interface NodeIntent {
  /** Id of the container the role belongs in. */
  readonly container: string;
  readonly carried: boolean;
  readonly shown: boolean;
}

/** A declared link by which one node brings others along. */
export interface DeclaredLink {
  readonly targets: readonly string[];
  readonly sources: readonly string[];
}

/**
 * What the recipe promises of its rig, by node id. Trials hold the rig against this and never against what the rig
 * says of itself, so that a fault anywhere between recipe and rig is seen.
 */
export interface TrialIntent {
  readonly nodes: ReadonlyMap<string, NodeIntent>;
  /** Id of the root control; null when the recipe has none. */
  readonly carrier: string | null;
  /** Unit direction of left, along an axis of the scene. */
  readonly left: Vec3;
  readonly twins: readonly Twins[];
  /** Constraints, seats, spaces at their default, solvers: what may bring a node along. */
  readonly links: readonly DeclaredLink[];
  /** Ids of nodes that a driver moves by the root's channels or attributes. */
  readonly drivenByRoot: ReadonlySet<string>;
  /** Ids of solvers whose pole the compiler put on the plane of the bend. */
  readonly computedPoles: ReadonlySet<string>;
  readonly channels: ReadonlyMap<string, Readonly<Partial<Record<Channel, ChannelRule>>>>;
  readonly lines: ReadonlyMap<string, { readonly from: string; readonly to: string }>;
  /**
   * The name of everything as the pieces between which a character's own name stands: nodes by id, links by
   * collection and id.
   */
  nameParts(): ReadonlyMap<string, readonly string[]>;
}
