import { idsWritten } from '../../expand/solverIds';
import type { SolverSpecification } from '../../expand/types';
import type { Rule } from '../Rule';

/** Two solvers that turn one joint fight; only the later one is seen. */
export const solversShareJoint: Rule = {
  code: 'solvers-share-joint',
  severity: 'error',
  category: 'motion',
  summary: 'Two solvers that turn the same joint.',
  message: '"{first}" and "{second}" both turn the joint "{joint}".',
  help: 'Give each solver joints of its own.',
  create(context) {
    const solverOf = new Map<string, SolverSpecification>();
    return {
      solver(solver) {
        for (const joint of idsWritten(solver)) {
          const other = solverOf.get(joint);
          if (other) {
            context.report(
              solver.path,
              { first: other.id, second: solver.id, joint },
              {
                part: 'key',
                related: [{ span: context.stage.document.spanAt(other.path, 'key'), label: `"${other.id}"` }],
              },
            );
            return;
          }
          solverOf.set(joint, solver);
        }
      },
    };
  },
};
