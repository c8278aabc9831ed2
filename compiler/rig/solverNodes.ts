import type { RigSolver } from './Rig';

/** Names of the nodes whose world transform a solver writes, parents before children. */
export function nodesWritten(solver: RigSolver): readonly string[] {
  switch (solver.kind) {
    case 'two_bone':
      return [solver.start, solver.mid];
    case 'reach':
      return solver.joints.slice(0, -1);
    case 'spline':
    case 'twist':
      return solver.joints;
    case 'aim':
      return [solver.joint];
    case 'foot_roll':
      return solver.ankle === solver.toes ? [solver.ankle] : [solver.ankle, solver.toes];
    default:
      return solver satisfies never;
  }
}

/** Names of the nodes that must be final before a solver is evaluated. */
export function nodesRead(solver: RigSolver): readonly string[] {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
      return [solver.goal, solver.pole];
    case 'spline':
      return solver.controls;
    case 'twist':
      return [solver.bone, solver.base, solver.driver];
    case 'aim':
      return solver.pole === null ? [solver.goal] : [solver.goal, solver.pole];
    case 'foot_roll':
      return [solver.foot];
    default:
      return solver satisfies never;
  }
}

/** Joints of a chain that a solver bends, each the parent of the next; empty for solvers of another kind. */
export function solvedRow(solver: RigSolver): readonly string[] {
  switch (solver.kind) {
    case 'two_bone':
      return [solver.start, solver.mid, solver.end];
    case 'reach':
    case 'spline':
      return solver.joints;
    default:
      return [];
  }
}
