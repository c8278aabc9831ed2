import { referencesOf } from '../../expand/solverIds';
import { areOpposite, referToOtherSide } from '../crossSides';
import type { Rule } from '../Rule';

/** A solver whose joints and handles stand on both sides makes one arm follow the other hand. */
export const solverCrossesSides: Rule = {
  code: 'solver-crosses-sides',
  severity: 'warning',
  category: 'motion',
  summary: 'A solver that names things on both sides of the body.',
  message: 'The solver "{solver}" names "{first}" and "{second}", which are on opposite sides.',
  help: 'Name joints and handles of one side, or of the centre.',
  create({ resolved, stage, report }) {
    const sideOf = (id: string) => resolved.nodeById.get(id)?.side;
    return {
      solver(solver) {
        const references = referencesOf(solver);
        const first = references.find(({ id }) => sideOf(id) !== 'centre');
        const second = references.find(({ id }) => areOpposite(sideOf(first?.id ?? ''), sideOf(id)));
        if (!first || !second) return;
        const place = [...solver.path, ...second.keys];
        const fix = referToOtherSide(stage.document, place, 'value', (id) => resolved.nodeById.has(id));
        report(place, { solver: solver.id, first: first.id, second: second.id }, fix);
      },
    };
  },
};
