import type { ChainSpecification } from '../../expand/types';
import type { Rule } from '../Rule';

/** More places than this help nobody to see what is loose. */
const MOST_PLACES = 10;

/** A deforming chain that hangs on nothing stays behind when the body that it belongs to moves. */
export const skeletonInPieces: Rule = {
  code: 'skeleton-in-pieces',
  severity: 'warning',
  category: 'structure',
  summary: 'Skin joints in several pieces that are not connected.',
  message: '"{id}" hangs on nothing, apart from "{first}": the skeleton is in {count} pieces.',
  help: 'Give it the joint or control as parent that should carry it.',
  create({ resolved, solved, stage, isWhole, report }) {
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
        // What could not be placed has a finding already that says why.
        const pieces = loose.filter(
          ({ jointIds: [first = ''] }) => !placed.has(first) && solved.places.has(first),
        );
        const [first, second, ...others] = pieces;
        if (!first || !second) return;
        const related = [first, ...others].slice(0, MOST_PLACES).map(({ id, path }) => ({
          span: stage.document.spanAt(path, 'key'),
          label: `"${id}"`,
        }));
        const parameters = { id: second.id, first: first.id, count: pieces.length };
        report(second.path, parameters, { part: 'key', related });
      },
    };
  },
};
