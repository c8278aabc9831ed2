import type { FindingList } from '../findings/FindingList';
import type { NumberOrAttribute, RigConstraint, RigSolver } from '../rig/Rig';
import { slipwayFindings } from './findings';
import type { PlacedStep } from './readStep';
import type { SceneBuilder } from './SceneBuilder';
import type { SceneNames } from './SceneNames';
import type { StepOf } from './Step';

/** Carries out the steps that link nodes: constraints and solvers. A step that does not fit is a finding. */
export class LinkBuilder {
  readonly #findings: FindingList;
  readonly #names: SceneNames;
  readonly #scene: SceneBuilder;
  readonly #solverOfJoint = new Map<string, string>();
  readonly constraints: RigConstraint[] = [];
  readonly solvers: RigSolver[] = [];

  constructor(names: SceneNames, scene: SceneBuilder, findings: FindingList) {
    this.#names = names;
    this.#scene = scene;
    this.#findings = findings;
  }

  constrain(placed: PlacedStep<StepOf<'constrain'>>): void {
    const { step, line } = placed;
    const { id, kind, target, sources, weights, keep_offset: keepOffset, blend } = step.values;
    const isNamed = this.#names.take(placed, null);
    const known = [
      this.#names.isNode(target, placed.spanOf('target'), line),
      ...sources.map((name) => this.#names.isNode(name, placed.spanOf('sources'), line)),
      blend === null || this.#checkBlend(placed, blend),
    ];
    const fact = sourcesFault(sources, weights, blend);
    if (fact !== null) {
      this.#findings.report(slipwayFindings, 'script-sources-wrong', placed.span, { fact });
      return;
    }
    if (!isNamed || known.includes(false)) return;
    const weighed = sources.map((node, index) => ({ node, weight: weights[index] ?? 0 }));
    this.constraints.push({ id, name: step.name, kind, target, sources: weighed, blend, keepOffset });
  }

  solve(placed: PlacedStep<StepOf<'solve'>>): void {
    const { name, values } = placed.step;
    const isNamed = this.#names.take(placed, null);
    const isJoint = (key: 'start' | 'mid' | 'end'): boolean =>
      this.#names.isNode(values[key], placed.spanOf(key), placed.line, 'joint');
    const isNode = (key: 'goal' | 'pole'): boolean =>
      this.#names.isNode(values[key], placed.spanOf(key), placed.line);
    const joints = [isJoint('start'), isJoint('mid'), isJoint('end')];
    const known = [isNode('goal'), isNode('pole'), this.#checkBlend(placed, values.blend)];
    if (joints.includes(false)) return;
    const inRow = [this.#checkRow(placed, 'start', 'mid'), this.#checkRow(placed, 'mid', 'end')];
    const free = [this.#claimJoint(placed, 'start'), this.#claimJoint(placed, 'mid')];
    if (isNamed && ![...known, ...inRow, ...free].includes(false)) this.solvers.push({ name, ...values });
  }

  #checkRow(placed: PlacedStep<StepOf<'solve'>>, upper: 'start' | 'mid', lower: 'mid' | 'end'): boolean {
    const { [upper]: parent, [lower]: child } = placed.step.values;
    const node = this.#scene.findNode(child);
    if (node === undefined || node.values.parent === parent) return true;
    const span = placed.spanOf(lower);
    this.#findings.report(slipwayFindings, 'script-joints-not-in-row', span, { parent, child });
    return false;
  }

  #claimJoint(placed: PlacedStep<StepOf<'solve'>>, key: 'start' | 'mid'): boolean {
    const joint = placed.step.values[key];
    const solver = this.#solverOfJoint.get(joint);
    if (solver === undefined) {
      this.#solverOfJoint.set(joint, placed.step.name);
      return true;
    }
    const span = placed.spanOf(key);
    this.#findings.report(slipwayFindings, 'script-joint-solved-twice', span, { joint, solver });
    return false;
  }

  #checkBlend(placed: PlacedStep<StepOf<'constrain' | 'solve'>>, blend: NumberOrAttribute): boolean {
    if (typeof blend === 'number') return true;
    const { control, attribute } = blend;
    const span = placed.spanOf('blend');
    if (!this.#names.isNode(control, span, placed.line, 'control')) return false;
    // A control that has a finding of its own has lost its attributes with it.
    if (this.#scene.findNode(control) === undefined || this.#scene.hasAttribute(control, attribute))
      return true;
    this.#findings.report(slipwayFindings, 'script-attribute-unknown', span, { control, attribute });
    return false;
  }
}

function sourcesFault(
  sources: readonly string[],
  weights: readonly number[],
  blend: NumberOrAttribute | null,
): string | null {
  if (sources.length === 0) return 'There are no sources.';
  if (sources.length !== weights.length) {
    return `There are ${sources.length} sources and ${weights.length} weights.`;
  }
  if (weights.some((weight) => weight < 0)) return 'A weight is below 0.';
  if (blend !== null && sources.length !== 2) return `There is a blend, and ${sources.length} sources.`;
  return null;
}
