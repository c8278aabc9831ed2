import type { ReachChainSpecification, TwoBoneSpecification } from '../../expand/types';
import { chainsByJoint } from '../chainsByJoint';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Joints turned like the world have no axis along the bone and none about which the limb folds. */
export const worldOrientedLimb: Rule = {
  code: 'world-oriented-limb',
  severity: 'warning',
  category: 'motion',
  summary: 'A limb whose joints are turned like the world.',
  message: 'The solver "{solver}" folds "{chain}", whose joints are turned like the world.',
  help: 'Let the joints be turned along the chain (orient rule chain), so that one axis is the hinge.',
  create({ resolved, stage, report }) {
    const limbs: (TwoBoneSpecification | ReachChainSpecification)[] = [];
    return {
      solver(solver) {
        if (solver.kind === 'two_bone' || solver.kind === 'reach') limbs.push(solver);
      },
      finish() {
        const chainOf = limbs.length > 0 ? chainsByJoint(resolved) : null;
        for (const solver of limbs) {
          const chain = chainOf?.get(solver.joints[0] ?? '');
          if (chain?.orient.rule !== 'world' || chain.orient.like !== null) continue;
          const path = [...chain.path, 'orient', 'rule'];
          const fix = rewrite(stage.document, 'Turn the joints along the chain', [
            { path, newText: 'chain' },
          ]);
          report(path, { solver: solver.id, chain: chain.id }, fix);
        }
      },
    };
  },
};
