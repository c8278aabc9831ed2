import type { ChainSpecification } from '../../expand/types';
import type { Rule } from '../Rule';

/** A deforming chain that hangs on nothing stays behind when the body that it belongs to moves. */
export const skeletonInPieces: Rule = {
  code: 'skeleton-in-pieces',
  severity: 'warning',
  category: 'structure',
  summary: 'Skin joints in several pieces that are not connected.',
  message: '"{id}" hangs on nothing, apart from "{first}".',
  help: 'Give it the joint or control as parent that should carry it.',
  create({ resolved, isWhole, report }) {
    const loose: ChainSpecification[] = [];
    const placed = new Set<string>();
    return {
      chain(chain) {
        if (chain.parent === null && chain.role === 'skin') loose.push(chain);
      },
      constraint({ kind, target }) {
        if (kind === 'parent' || kind === 'point') placed.add(target);
      },
      finish() {
        if (!isWhole || resolved.chains.length < 2) return;
        const [first, ...others] = loose.filter(({ jointIds }) => !placed.has(jointIds[0] ?? ''));
        for (const { id, path } of others) report(path, { id, first: first?.id ?? '' }, { part: 'key' });
      },
    };
  },
};
