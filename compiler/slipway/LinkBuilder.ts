import type { FindingList } from '../findings/FindingList';
import type {
  NumberOrAttribute,
  RigConstraint,
  RigDriver,
  RigShape,
  RigSkin,
  RigSolver,
  RigSpace,
} from '../rig/Rig';
import { nodesWritten, solvedRow } from '../rig/solverNodes';
import type { Span } from '../source/SourceText';
import { constraintFault, driverFault, skinFault, solverFault } from './checkLinks';
import { slipwayFindings } from './findings';
import type { PlacedStep } from './readStep';
import type { SceneBuilder } from './SceneBuilder';
import type { SceneNames } from './SceneNames';
import type { Step, StepOf } from './Step';
import { toConstraint, toDriver, toShape, toSkin, toSolver, toSpace } from './toLink';
import { CHANNEL_NAMES, type KeyRule, SOLVER_VERBS, type SolverVerb, VERBS } from './verbs';

type NodeKind = 'joint' | 'control' | 'geometry';

/** Keys whose references must be nodes of one kind; all others take any node. */
const KINDS_OF_REFERENCES: Readonly<Record<string, NodeKind>> = {
  start: 'joint',
  mid: 'joint',
  end: 'joint',
  joint: 'joint',
  joints: 'joint',
  bone: 'joint',
  tip: 'joint',
  control: 'control',
  geometry: 'geometry',
};

/** Whether a verb makes a solver. */
export function isSolverVerb(verb: Step['verb']): verb is SolverVerb {
  return (SOLVER_VERBS as readonly string[]).includes(verb);
}

/** Where a step names a node: the key whose value is that name, or a list with it. */
function spanOfReference(placed: PlacedStep, name: string): Span {
  const values: Readonly<Record<string, unknown>> = placed.step.values;
  const key = Object.keys(values).find((one) => {
    const value = values[one];
    return one !== 'id' && (value === name || (Array.isArray(value) && value.includes(name)));
  });
  return key === undefined ? placed.span : placed.spanOf(key);
}

/** Carries out the steps that link nodes. A step that does not fit is a finding and makes nothing. */
export class LinkBuilder {
  readonly #findings: FindingList;
  readonly #names: SceneNames;
  readonly #scene: SceneBuilder;
  readonly #solverOfNode = new Map<string, string>();
  readonly constraints: RigConstraint[] = [];
  readonly solvers: RigSolver[] = [];
  readonly spaces: RigSpace[] = [];
  readonly drivers: RigDriver[] = [];
  readonly skins: RigSkin[] = [];
  readonly shapes: RigShape[] = [];

  constructor(names: SceneNames, scene: SceneBuilder, findings: FindingList) {
    this.#findings = findings;
    this.#names = names;
    this.#scene = scene;
  }

  constrain(placed: PlacedStep<StepOf<'constrain'>>): void {
    const isLinked = this.#checkLink(placed);
    const fact = constraintFault(placed.step);
    if (fact !== null) {
      this.#findings.report(slipwayFindings, 'script-sources-wrong', placed.span, { fact });
    } else if (isLinked) this.constraints.push(toConstraint(placed.step));
  }

  space(placed: PlacedStep<StepOf<'space'>>): void {
    const { control, attribute, sources } = placed.step.values;
    const isLinked = this.#checkLink(placed);
    if (isLinked && !this.#checkAttribute(placed, 'attribute', control, attribute)) return;
    if (this.#reportFault(placed, sources.length === 0 ? 'There are no sources.' : null)) return;
    if (isLinked) this.spaces.push(toSpace(placed.step));
  }

  drive(placed: PlacedStep<StepOf<'drive'>>): void {
    const { control, input } = placed.step.values;
    const isLinked = this.#checkLink(placed);
    const isChannel = CHANNEL_NAMES.some((channel) => channel === input);
    if (isLinked && !isChannel && !this.#checkAttribute(placed, 'input', control, input)) return;
    if (this.#reportFault(placed, driverFault(placed.step))) return;
    if (isLinked) this.drivers.push(toDriver(placed.step));
  }

  skin(placed: PlacedStep<StepOf<'skin'>>): void {
    const isLinked = this.#checkLink(placed);
    if (this.#reportFault(placed, skinFault(placed.step))) return;
    if (isLinked) this.skins.push(toSkin(placed.step));
  }

  shape(placed: PlacedStep<StepOf<'shape'>>): void {
    if (this.#checkLink(placed)) this.shapes.push(toShape(placed.step));
  }

  solve(placed: PlacedStep<StepOf<SolverVerb>>): void {
    const isLinked = this.#checkLink(placed);
    if (this.#reportFault(placed, solverFault(placed.step)) || !isLinked) return;
    const solver = toSolver(placed.step);
    const row = solvedRow(solver);
    const inRow = row.map((joint, index) => index === 0 || this.#checkParent(placed, row[index - 1], joint));
    if (solver.kind === 'twist') {
      for (const joint of [...solver.joints, solver.tip]) {
        inRow.push(this.#checkParent(placed, solver.bone, joint));
      }
    }
    const free = nodesWritten(solver).map((node) => this.#claimNode(placed, node));
    if (![...inRow, ...free].includes(false)) this.solvers.push(solver);
  }

  /** Takes the link's name and checks every reference and attribute of it by the kinds of its keys. */
  #checkLink(placed: PlacedStep): boolean {
    const { step, line } = placed;
    const sound = [this.#names.take(placed, null)];
    const values: Readonly<Record<string, unknown>> = step.values;
    for (const [key, rule] of Object.entries(VERBS[step.verb].keys) as [string, KeyRule][]) {
      const value = values[key];
      if (value === null) continue;
      const kind = KINDS_OF_REFERENCES[key] ?? null;
      if (rule.kind === 'reference') {
        sound.push(this.#names.isNode(value as string, placed.spanOf(key), line, kind));
      } else if (rule.kind === 'references') {
        for (const name of value as readonly string[]) {
          sound.push(this.#names.isNode(name, placed.spanOf(key), line, kind));
        }
      } else if (rule.kind === 'blend' || rule.kind === 'amount') {
        sound.push(this.#checkAmount(placed, key, value as NumberOrAttribute));
      }
    }
    return !sound.includes(false);
  }

  #reportFault(placed: PlacedStep, fact: string | null): boolean {
    if (fact !== null) this.#findings.report(slipwayFindings, 'script-link-wrong', placed.span, { fact });
    return fact !== null;
  }

  #checkParent(placed: PlacedStep, parent: string | undefined, child: string): boolean {
    const node = this.#scene.findNode(child);
    if (parent === undefined || node === undefined || node.values.parent === parent) return true;
    const span = spanOfReference(placed, child);
    this.#findings.report(slipwayFindings, 'script-joints-not-in-row', span, { parent, child });
    return false;
  }

  #claimNode(placed: PlacedStep, joint: string): boolean {
    const solver = this.#solverOfNode.get(joint);
    if (solver === undefined) {
      this.#solverOfNode.set(joint, placed.step.name);
      return true;
    }
    const span = spanOfReference(placed, joint);
    this.#findings.report(slipwayFindings, 'script-joint-solved-twice', span, { joint, solver });
    return false;
  }

  #checkAmount(placed: PlacedStep, key: string, amount: NumberOrAttribute): boolean {
    if (typeof amount === 'number') return true;
    const isControl = this.#names.isNode(amount.control, placed.spanOf(key), placed.line, 'control');
    return isControl && this.#checkAttribute(placed, key, amount.control, amount.attribute);
  }

  #checkAttribute(placed: PlacedStep, key: string, control: string, attribute: string): boolean {
    // A control that has a finding of its own has lost its attributes with it.
    if (this.#scene.findNode(control) === undefined || this.#scene.hasAttribute(control, attribute))
      return true;
    const span = placed.spanOf(key);
    this.#findings.report(slipwayFindings, 'script-attribute-unknown', span, { control, attribute });
    return false;
  }
}
