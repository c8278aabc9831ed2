import { idsWritten } from '../expand/solverIds';
import { declareFindings } from '../findings/catalogue';
import { findEvaluationRing } from '../pose/evaluationOrder';
import type { ResolveContext } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import type { Rig } from '../rig/Rig';

/** What can be wrong with the order in which a rig is evaluated. */
export const evaluationFindings = declareFindings({
  'evaluation-ring': {
    severity: 'error',
    summary: 'Things follow one another in a ring through constraints, solvers and parents.',
    message: 'These follow one another in a ring: {ring}.',
    help: 'Remove one of the links between them, so that something can be moved first.',
  },
});

/** Reports a ring over parents, constraints and solvers together, by the ids people know. */
export function checkEvaluationRing(rig: Rig, recipe: ResolvedRecipe, context: ResolveContext): void {
  const ring = findEvaluationRing(rig);
  if (!ring) return;
  const idOf = new Map(rig.nodes.map(({ name, id }) => [name, id]));
  const ids = ring.map((name) => idOf.get(name) ?? name);
  const on = new Set(ids);
  // The link an author can cut: a constraint or solver whose target lies on the ring.
  const link =
    recipe.constraints.find(
      ({ target, sources }) => on.has(target) && sources.some(({ node }) => on.has(node)),
    ) ?? recipe.solvers.find((solver) => idsWritten(solver).some((id) => on.has(id)));
  context.findings.report(
    evaluationFindings,
    'evaluation-ring',
    context.document.spanAt(link?.path ?? ['recipe'], link ? 'key' : 'value'),
    { ring: ids.map((id) => `"${id}"`).join(' → ') },
  );
}
