import type { ExpandedRecipe } from '../expand/types';
import type { MergedDocument } from '../merge/types';
import type { Side } from '../rig/Rig';
import type { HouseRules } from '../schema/generated/houseTypes';
import type { Path } from '../syntax/types';

/** House rules with the document they were written in. */
export interface HouseDocument {
  readonly document: MergedDocument;
  readonly rules: HouseRules;
}

export interface ResolvedContainer {
  readonly id: string;
  /** Null for one that lies directly in the rig. */
  readonly parent: string | null;
  readonly carried: boolean;
  /** False also when a container around it is hidden. */
  readonly shown: boolean;
}

export interface ResolvedRole {
  readonly token: string;
  /** Null for roles of the structure itself, which lie wherever their contents lie. */
  readonly container: string | null;
  readonly shown: boolean;
  readonly selectable: boolean;
}

/** A node of the rig with its place in the tree; geometry comes with the solve stage. */
export interface ResolvedNode {
  readonly id: string;
  readonly name: string;
  readonly kind: 'group' | 'joint' | 'control' | 'line' | 'note' | 'geometry';
  /** Node id; null for the rig's own group. */
  readonly parent: string | null;
  readonly container: string;
  readonly role: string;
  readonly side: Side;
  readonly shown: boolean;
  readonly selectable: boolean;
  /** Where it was written, for findings. */
  readonly path: Path;
}

/** A group that stands where a thing hangs and follows another that lies in a different container. */
export interface Seat {
  readonly id: string;
  /** The chain's first joint or the control that sits in it. */
  readonly occupant: string;
  readonly follows: string;
}

/** An expanded recipe whose references all lead somewhere, with the tree of nodes it makes. */
export interface ResolvedRecipe extends ExpandedRecipe {
  readonly containers: ReadonlyMap<string, ResolvedContainer>;
  readonly roles: ReadonlyMap<string, ResolvedRole>;
  readonly seats: readonly Seat[];
  /** Parents come before children. */
  readonly nodes: readonly ResolvedNode[];
  readonly nodeById: ReadonlyMap<string, ResolvedNode>;
  /** Names of what links nodes (constraints, spaces, drivers, solvers, skins, shapes), by `linkKey`. */
  readonly linkNames: ReadonlyMap<string, string>;
}
