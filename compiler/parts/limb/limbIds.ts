import type { PartEntry } from '../../expand/primitives';
import { namesFor } from '../jointNames';

type Leg = Extract<PartEntry, { readonly kind: 'limb' | 'leg_three' }>;

/** Ids of everything that other parts may build on in a limb. */
export interface LimbIds {
  /** Joints from root to end, and the control that turns each. */
  readonly joints: readonly string[];
  readonly turners: readonly string[];
  readonly goal: string;
  readonly pole: string;
  /** The solver, and the constraint that turns the last joint. */
  readonly solver: string;
  readonly endTurn: string;
  /** The attribute that blends between turning joint by joint (0) and following the goal (1). */
  readonly reach: string;
}

const FALLBACK = {
  limb: ['upper', 'lower', 'end'],
  leg_three: ['upper', 'middle', 'lower', 'end'],
} as const;

/** The ids that a limb or three-segment leg makes under its own id, e.g. `arm.left`. */
export function limbIds(id: string, part: Leg): LimbIds {
  const joints = namesFor(part.points, part.names, FALLBACK[part.kind]).map((name) => `${id}.${name}`);
  const goal = `${id}.${part.goal ?? 'goal'}`;
  return {
    joints,
    turners: joints.map((joint) => `${joint}_fk`),
    goal,
    pole: `${id}.pole`,
    solver: `${id}.bend`,
    endTurn: `${joints[joints.length - 1] ?? id}_turn`,
    reach: `${goal}.reach`,
  };
}
