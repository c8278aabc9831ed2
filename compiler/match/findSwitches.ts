import type { NumberOrAttribute, ReachSolver, Rig, RigConstraint, TwoBoneSolver } from '../rig/Rig';
import { solvedRow } from '../rig/solverNodes';

/** A chain that an attribute switches between turning joint by joint (0) and following a goal (1). */
export interface ChainSwitch {
  readonly solver: TwoBoneSolver | ReachSolver;
  readonly control: string;
  readonly attribute: string;
  readonly joints: readonly string[];
  /** The control that turns each joint. */
  readonly turners: readonly string[];
  /** The control by which the goal is moved, and the pole. */
  readonly goal: string;
  readonly pole: string;
  /** Attributes of the goal control that move what it carries, to be at rest after matching. */
  readonly rolls: readonly string[];
}

function turnerOf(rig: Rig, joint: string, goal: string, controls: ReadonlySet<string>): string | undefined {
  const orients = rig.constraints.filter(
    ({ kind, target }) => kind === 'orient' && target === joint,
  ) as readonly RigConstraint[];
  for (const { sources } of orients) {
    const found = sources.find(({ node }) => controls.has(node) && node !== goal);
    if (found) return found.node;
  }
  return undefined;
}

function attributeOf(amount: NumberOrAttribute): string | undefined {
  return typeof amount === 'number' ? undefined : amount.attribute;
}

/** Lists the chains of a rig that can be switched: an attribute blends the solver, and every joint has its control. */
export function findSwitches(rig: Rig): readonly ChainSwitch[] {
  const controls = new Set(rig.nodes.filter(({ kind }) => kind === 'control').map(({ name }) => name));
  const switches: ChainSwitch[] = [];
  for (const solver of rig.solvers) {
    if ((solver.kind !== 'two_bone' && solver.kind !== 'reach') || typeof solver.blend === 'number') continue;
    // The goal may be a helper that a foot carries; then the foot's control is what one moves.
    const roll = rig.solvers.find((one) => one.kind === 'foot_roll' && one.ankle === solver.goal);
    const goal = roll?.kind === 'foot_roll' ? roll.foot : solver.goal;
    const joints = solvedRow(solver);
    const turners = joints.map((joint) => turnerOf(rig, joint, goal, controls));
    if (!controls.has(goal) || !controls.has(solver.pole) || turners.includes(undefined)) continue;
    switches.push({
      solver,
      control: solver.blend.control,
      attribute: solver.blend.attribute,
      joints,
      turners: turners as readonly string[],
      goal,
      pole: solver.pole,
      rolls:
        roll?.kind === 'foot_roll'
          ? [attributeOf(roll.roll), attributeOf(roll.bank)].filter((name) => name !== undefined)
          : [],
    });
  }
  return switches;
}
