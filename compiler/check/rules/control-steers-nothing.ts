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
    const followAttribute = (blend: number | string | null): void => {
      if (typeof blend === 'string') follow(blend.slice(0, blend.lastIndexOf('.')));
    };
    return {
      chain: ({ parent }) => follow(parent),
      control: ({ parent }) => follow(parent),
      solver(solver) {
        follow(solver.goal);
        follow(solver.pole);
        followAttribute(solver.blend);
      },
      constraint(constraint) {
        for (const { node } of constraint.sources) follow(node);
        followAttribute(constraint.blend);
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
