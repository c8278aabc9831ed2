import type { ChainSpecification } from '../../expand/types';
import { findsCarrier } from '../findsCarrier';
import type { Rule } from '../Rule';

/** Joints in a container that stays in the world are left behind when the root control moves. */
export const jointsInParkedContainer: Rule = {
  code: 'joints-in-parked-container',
  severity: 'warning',
  category: 'structure',
  summary: 'Joints that the root control does not carry.',
  message:
    'The joints of "{id}" lie in the container "{container}", which stays in the world, and follow nothing.',
  help: 'Give the chain a role whose container is carried, or a parent that it should follow.',
  create({ resolved, report }) {
    const parked: { readonly chain: ChainSpecification; readonly container: string }[] = [];
    const placed = new Set<string>();
    return {
      chain(chain) {
        const container = resolved.roles.get(chain.role)?.container ?? null;
        if (chain.parent !== null || container === null) return;
        if (resolved.containers.get(container)?.carried === false) parked.push({ chain, container });
      },
      constraint({ kind, target }) {
        if (kind === 'parent' || kind === 'point') placed.add(target);
      },
      finish() {
        if (!findsCarrier(resolved)) return;
        for (const { chain, container } of parked) {
          if (placed.has(chain.jointIds[0] ?? '')) continue;
          report([...chain.path, 'role'], { id: chain.id, container });
        }
      },
    };
  },
};
