import { idsWritten } from '../../expand/solverIds';
import type { Rule } from '../Rule';

/** Single bones may be rigid; a chain of several was made to bend, and nothing bends this one. */
export const chainNeverBends: Rule = {
  code: 'chain-never-bends',
  severity: 'warning',
  category: 'structure',
  summary: 'A chain of several bones that nothing turns.',
  message: 'Nothing turns any joint of "{id}".',
  help: 'Let controls or a solver turn its joints, or make it one bone.',
  create({ resolved, isWhole, report }) {
    const moved = new Set<string>();
    return {
      constraint({ target }) {
        moved.add(target);
      },
      driver({ target }) {
        moved.add(target);
      },
      solver(solver) {
        for (const id of idsWritten(solver)) moved.add(id);
      },
      finish() {
        // Where nothing turns any joint, the recipe is a bare skeleton, and meant to be one.
        if (!isWhole || moved.size === 0) return;
        for (const { id, jointIds, path } of resolved.chains) {
          if (jointIds.length < 3 || jointIds.some((joint) => moved.has(joint))) continue;
          report(path, { id }, { part: 'key' });
        }
      },
    };
  },
};
