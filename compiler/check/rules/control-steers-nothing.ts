import { amountsOf, controlOfAmount, idsRead } from '../../expand/solverIds';
import { CARRIER_ROLE } from '../../resolve/findCarrier';
import type { Rule } from '../Rule';

/** A handle that moves nothing wastes the animator's time looking for what it does. */
export const controlSteersNothing: Rule = {
  code: 'control-steers-nothing',
  severity: 'warning',
  category: 'animator',
  summary: 'A control that nothing follows.',
  message: 'Nothing follows the control "{id}".',
  help: 'Make it a source of a constraint, a goal or pole of a solver, or the parent of something; or remove it.',
  create(context) {
    const followed = new Set<string>();
    const follow = (id: string | null): void => {
      if (id !== null) followed.add(id);
    };
    return {
      chain: ({ parent }) => follow(parent),
      control({ parent, spaces }) {
        follow(parent);
        for (const space of spaces) follow(space);
      },
      solver(solver) {
        for (const id of idsRead(solver)) follow(id);
        for (const [, amount] of amountsOf(solver)) follow(controlOfAmount(amount));
      },
      driver: ({ control }) => follow(control),
      shape: ({ weight }) => follow(controlOfAmount(weight)),
      constraint(constraint) {
        for (const { node } of constraint.sources) follow(node);
        follow(controlOfAmount(constraint.blend));
        follow(constraint.aim?.up ?? null);
      },
      finish() {
        if (!context.isWhole) return;
        for (const { id, role, path } of context.resolved.controls) {
          if (role !== CARRIER_ROLE && !followed.has(id)) context.report(path, { id }, { part: 'key' });
        }
      },
    };
  },
};
