import type {
  ChainSpecification,
  ConstraintSpecification,
  ControlSpecification,
  ExpandedRecipe,
  GuideLineSpecification,
  SolverSpecification,
  Specification,
} from '../expand/types';
import type { Path } from '../syntax/types';
import { resolveFindings } from './findings';
import { isPoisonedReference, type ResolveContext, reportUnknown } from './Reporter';
import type { Things } from './things';

/** The parts of an expanded recipe whose references all lead somewhere. */
export type LinkedRecipe = Pick<
  ExpandedRecipe,
  'chains' | 'controls' | 'solvers' | 'constraints' | 'guideLines'
>;

/**
 * Checks every reference and leaves out links (solvers, constraints, guide lines) that lead nowhere. Chains and
 * controls stay, without the parent that is missing, so that later findings about them still show.
 */
export function checkReferences(
  recipe: ExpandedRecipe,
  things: Things,
  context: ResolveContext,
): LinkedRecipe {
  const spanOf = (specification: Specification, ...keys: Path) =>
    context.document.spanAt([...specification.path, ...keys]);

  const isThing = (
    specification: Specification,
    id: string,
    keys: Path,
    what = 'joint or control',
  ): boolean => {
    if (things.joints.has(id) || things.controls.has(id)) return true;
    reportUnknown(context, spanOf(specification, ...keys), what, id, things.nodeIds());
    return false;
  };

  const isJoint = (specification: Specification, id: string, keys: Path): boolean => {
    if (things.joints.has(id)) return true;
    reportUnknown(context, spanOf(specification, ...keys), 'joint', id, things.joints.keys());
    return false;
  };

  const isControl = (specification: Specification, id: string, keys: Path): boolean => {
    if (things.controls.has(id)) return true;
    reportUnknown(context, spanOf(specification, ...keys), 'control', id, things.controls.keys());
    return false;
  };

  const isAttribute = (
    specification: Specification,
    reference: number | string | null,
    keys: Path,
  ): boolean => {
    if (typeof reference !== 'string') return true;
    const dot = reference.lastIndexOf('.');
    const controlId = reference.slice(0, dot);
    const attribute = reference.slice(dot + 1);
    if (!isControl(specification, controlId, keys)) return false;
    const control = things.controls.get(controlId);
    if (control?.attributes.some(({ name }) => name === attribute)) return true;
    const span = spanOf(specification, ...keys);
    context.findings.report(resolveFindings, 'unknown-attribute', span, { control: controlId, attribute });
    return false;
  };

  const withParent = <S extends ChainSpecification | ControlSpecification>(specification: S): S =>
    specification.parent === null || isThing(specification, specification.parent, ['parent'])
      ? specification
      : { ...specification, parent: null };

  const isSolverSound = (solver: SolverSpecification): boolean => {
    const found = solver.joints.map((id, index) => isJoint(solver, id, ['joints', index]));
    const goal = isControl(solver, solver.goal, ['goal']);
    const pole = isControl(solver, solver.pole, ['pole']);
    const blend = isAttribute(solver, solver.blend, ['blend']);
    if (!found.every(Boolean) || !goal || !pole || !blend) return false;
    const [start, mid, end] = solver.joints;
    const broken = [
      [start, mid],
      [mid, end],
    ].find(([parent, child]) => things.joints.get(child ?? '')?.before !== parent);
    if (!broken) return true;
    context.findings.report(resolveFindings, 'solver-joints-apart', spanOf(solver, 'joints'), {
      parent: broken[0] ?? '',
      child: broken[1] ?? '',
    });
    return false;
  };

  const isConstraintSound = (constraint: ConstraintSpecification): boolean => {
    const target = isThing(constraint, constraint.target, ['target']);
    const sources = constraint.sources.map(({ node }) => {
      if (node !== constraint.target) return isThing(constraint, node, ['sources', node]);
      context.findings.report(resolveFindings, 'follows-itself', spanOf(constraint, 'sources', node), {
        id: node,
      });
      return false;
    });
    const blend = isAttribute(constraint, constraint.blend, ['blend']);
    if (constraint.blend !== null && constraint.sources.length !== 2) {
      context.findings.report(resolveFindings, 'constraint-blend-sources', spanOf(constraint, 'blend'), {
        id: constraint.id,
        count: constraint.sources.length,
      });
      return false;
    }
    const total = constraint.sources.reduce((sum, { weight }) => sum + weight, 0);
    if (total <= 0 || constraint.sources.some(({ weight }) => weight < 0)) {
      context.findings.report(resolveFindings, 'constraint-weights', spanOf(constraint, 'sources'), {
        id: constraint.id,
      });
      return false;
    }
    return target && sources.every(Boolean) && blend;
  };

  const isGuideLineSound = (line: GuideLineSpecification): boolean => {
    const from = isControl(line, line.from, ['from']);
    const to = isThing(line, line.to, ['to']);
    return from && to;
  };

  const checkPlace = (control: ControlSpecification): void => {
    if (control.align !== null && !isPoisonedReference(context, control.align)) {
      isThing(control, control.align, ['align']);
    }
    if (control.place.kind === 'pole') {
      control.place.joints.forEach((id, index) => {
        isJoint(control, id, ['pole_of', 'joints', index]);
      });
    }
  };

  recipe.controls.forEach(checkPlace);
  return {
    chains: recipe.chains
      .filter((chain) => things.joints.get(chain.jointIds[0] ?? '')?.chain === chain)
      .map(withParent),
    controls: recipe.controls
      .filter((control) => things.controls.get(control.id) === control)
      .map(withParent),
    solvers: recipe.solvers.filter(isSolverSound),
    constraints: recipe.constraints.filter(isConstraintSound),
    guideLines: recipe.guideLines.filter(isGuideLineSound),
  };
}
