import { idsWritten } from '../../expand/solverIds';
import type { ConstraintSpecification, SolverSpecification } from '../../expand/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** Solvers that turn joints wholly at all times; where the blend is an attribute, both may be seen in turn. */
function turnsWholly(solver: SolverSpecification): boolean {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
    case 'aim':
      return solver.blend === 1;
    case 'spline':
      return true;
    case 'twist':
    case 'foot_roll':
      return false;
    default:
      return solver satisfies never;
  }
}

/** Solvers run after constraints: what turns a joint before its solver does is never seen. */
export const constraintOverwritten: Rule = {
  code: 'constraint-overwritten',
  severity: 'warning',
  category: 'motion',
  summary: 'A constraint that turns a joint which a solver then turns wholly.',
  message: '"{id}" turns "{target}", but the solver "{solver}" turns it anew at all times.',
  help: 'Remove the constraint, or give the solver a blend that an attribute sets.',
  create({ stage, report }) {
    const solverOf = new Map<string, SolverSpecification>();
    const turning: ConstraintSpecification[] = [];
    return {
      solver(solver) {
        if (turnsWholly(solver)) for (const id of idsWritten(solver)) solverOf.set(id, solver);
      },
      constraint(constraint) {
        if (constraint.kind === 'orient' || constraint.kind === 'aim') turning.push(constraint);
      },
      finish() {
        for (const { id, target, path, part } of turning) {
          const solver = solverOf.get(target);
          if (!solver) continue;
          const span = stage.document.spanAt(solver.path, 'key');
          report(
            path,
            { id, target, solver: solver.id },
            {
              part: 'key',
              related: [{ span, label: `"${solver.id}"` }],
              ...(part === null
                ? fixWith('Remove the constraint', 'asks', [removeEntry(stage.document, path)])
                : {}),
            },
          );
        }
      },
    };
  },
};
