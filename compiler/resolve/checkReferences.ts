import { amountsOf, referencesOf, rowOf } from '../expand/solverIds';
import { CHANNELS } from '../expand/specifyControl';
import type {
  ChainSpecification,
  ConstraintSpecification,
  ControlSpecification,
  DriverSpecification,
  ExpandedRecipe,
  GuideLineSpecification,
  ShapeSpecification,
  SkinSpecification,
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
  | 'chains'
  | 'controls'
  | 'solvers'
  | 'constraints'
  | 'drivers'
  | 'geometry'
  | 'skins'
  | 'shapes'
  | 'guideLines'
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

  const reportApart = (solver: SolverSpecification, parent: string, child: string): void => {
    const span = spanOf(solver, solver.kind === 'foot_roll' ? 'ankle' : 'joints');
    context.findings.report(resolveFindings, 'solver-joints-apart', span, { parent, child });
  };

  /** Whether each joint of a solver's row is the next one's parent, and twist joints hang on their bone. */
  const isConnected = (solver: SolverSpecification): boolean => {
    const row = rowOf(solver);
    const broken = row.findIndex(
      (child, index) => index > 0 && things.joints.get(child)?.before !== row[index - 1],
    );
    if (broken > 0) reportApart(solver, row[broken - 1] ?? '', row[broken] ?? '');
    if (solver.kind !== 'twist') return broken < 0;
    const parentOf = (id: string): string | null => {
      const place = things.joints.get(id);
      return place?.before ?? place?.chain.parent ?? null;
    };
    const loose = [...solver.joints, solver.tip].find((id) => parentOf(id) !== solver.bone);
    if (loose !== undefined) reportApart(solver, solver.bone, loose);
    return loose === undefined;
  };

  const isSolverSound = (solver: SolverSpecification): boolean => {
    const found = referencesOf(solver).map(({ id, wants, keys }) =>
      wants === 'joint' ? isJoint(solver, id, keys) : isThing(solver, id, keys),
    );
    const amounts = amountsOf(solver).map(([key, amount]) => isAttribute(solver, amount, [key]));
    return found.every(Boolean) && amounts.every(Boolean) && isConnected(solver);
  };

  const isDriverSound = (driver: DriverSpecification): boolean => {
    const target = isThing(driver, driver.target, ['target']);
    const isChannel = CHANNELS.some((channel) => channel === driver.input);
    const input = isChannel
      ? isControl(driver, driver.control, ['input'])
      : isAttribute(driver, `${driver.control}.${driver.input}`, ['input']);
    return target && input;
  };

  const geometries = new Set(recipe.geometry.map(({ id }) => id));
  const isGeometry = (specification: Specification, id: string): boolean => {
    if (geometries.has(id)) return true;
    reportUnknown(context, spanOf(specification, 'geometry'), 'mesh', id, geometries);
    return false;
  };

  const chainIds = new Set(recipe.chains.map(({ id }) => id));
  const isSkinSound = (skin: SkinSpecification): boolean => {
    const joints = skin.joints.map((id, index) => {
      if (chainIds.has(id) || things.joints.has(id)) return true;
      const candidates = [...chainIds, ...things.joints.keys()];
      reportUnknown(context, spanOf(skin, 'joints', index), 'joint or chain', id, candidates);
      return false;
    });
    return isGeometry(skin, skin.geometry) && joints.every(Boolean);
  };

  const isShapeSound = (shape: ShapeSpecification): boolean => {
    const geometry = isGeometry(shape, shape.geometry);
    return isAttribute(shape, shape.weight, ['weight']) && geometry;
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
    const up = constraint.aim?.up ?? null;
    const isUpright = up === null || isThing(constraint, up, ['up']);
    return target && sources.every(Boolean) && blend && isUpright;
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
    control.spaces.forEach((id, index) => {
      if (id === control.parent) return;
      isThing(control, id, ['spaces', control.spaces[0] === control.parent ? index - 1 : index]);
    });
    if (control.place.kind === 'pole') {
      control.place.joints.forEach((id, index) => {
        isJoint(control, id, ['pole_of', 'joints', index]);
      });
    }
  };

  recipe.controls.forEach(checkPlace);
  for (const chain of recipe.chains) {
    if (chain.orient.like !== null) isJoint(chain, chain.orient.like, ['orient', 'like']);
  }
  return {
    chains: recipe.chains
      .filter((chain) => things.joints.get(chain.jointIds[0] ?? '')?.chain === chain)
      .map(withParent),
    controls: recipe.controls
      .filter((control) => things.controls.get(control.id) === control)
      .map(withParent),
    solvers: recipe.solvers.filter(isSolverSound),
    drivers: recipe.drivers.filter(isDriverSound),
    geometry: recipe.geometry,
    skins: recipe.skins.filter(isSkinSound),
    shapes: recipe.shapes.filter(isShapeSound),
    constraints: recipe.constraints.filter(isConstraintSound),
    guideLines: recipe.guideLines.filter(isGuideLineSound),
  };
}
