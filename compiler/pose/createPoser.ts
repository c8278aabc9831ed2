import { invariant } from '../findings/invariant';
import type { NumberOrAttribute, PoseValues, Rig, RigNode, RigSolver } from '../rig/Rig';
import { solvedRow } from '../rig/solverNodes';
import { prepareAim } from './aimSolver';
import { prepareConstraint } from './constraint';
import { type Drive, prepareDriver } from './driver';
import { indexNodes, orderEvaluation } from './evaluationOrder';
import { prepareFootRoll } from './footRollSolver';
import type { Poser } from './Poser';
import { isPlain, makePlacingMemory, type NodePlacing, placeNode, placePlainNodes } from './placeNode';
import { makeRigMemory, type RigMemory, type Step } from './RigMemory';
import { prepareReach } from './reachSolver';
import { prepareSpace, type ReadBase } from './space';
import { prepareSpline } from './splineSolver';
import { prepareTwist } from './twistSolver';
import { prepareTwoBone } from './twoBoneSolver';
import { ValueTable } from './ValueTable';

const NO_VALUES: PoseValues = {};

/** Every plain number that stands where an attribute could. */
function constantsOf(rig: Rig): readonly number[] {
  const constants: number[] = [0];
  const add = (amount: NumberOrAttribute | null): void => {
    if (typeof amount === 'number') constants.push(amount);
  };
  for (const { blend } of rig.constraints) add(blend);
  for (const solver of rig.solvers) {
    for (const value of Object.values(solver)) if (typeof value === 'number') constants.push(value);
  }
  for (const { weight } of rig.shapes) add(weight);
  return constants;
}

/** Prepares any solver; the one place that knows which kinds there are. */
function prepareSolver(
  solver: RigSolver,
  rig: Rig,
  memory: RigMemory,
  slotOf: (amount: NumberOrAttribute) => number,
): Step {
  const [first] = solvedRow(solver);
  const parentName = first === undefined ? null : rig.nodes[memory.indexOf(first)]?.parent;
  const parent = parentName === null || parentName === undefined ? null : memory.indexOf(parentName);
  switch (solver.kind) {
    case 'two_bone':
    case 'reach': {
      const slots = {
        blend: slotOf(solver.blend),
        stretch: slotOf(solver.stretch),
        swing: slotOf(solver.swing),
      };
      return solver.kind === 'two_bone'
        ? prepareTwoBone(solver, memory, parent, slots)
        : prepareReach(solver, memory, parent, { ...slots, bias: slotOf(solver.bias) });
    }
    case 'spline':
      return prepareSpline(solver, memory, parent, {
        stretch: slotOf(solver.stretch),
        volume: slotOf(solver.volume),
      });
    case 'twist':
      return prepareTwist(solver, memory);
    case 'aim':
      return prepareAim(solver, memory, slotOf(solver.blend));
    case 'foot_roll':
      return prepareFootRoll(solver, memory, {
        roll: slotOf(solver.roll),
        bank: slotOf(solver.bank),
        break: slotOf(solver.break),
      });
    default:
      return solver satisfies never;
  }
}

/** For each node the one whose stretch multiplies its offset: joints of solved rows, and twist joints their bone's tip. */
function stretchedNodes(rig: Rig, indexOf: (name: string) => number): ReadonlyMap<number, number> {
  const stretched = new Map<number, number>();
  for (const solver of rig.solvers) {
    if (solver.kind !== 'two_bone' && solver.kind !== 'reach') continue;
    const row = solvedRow(solver);
    const end = indexOf(row[row.length - 1] ?? '');
    stretched.set(end, end);
  }
  for (const solver of rig.solvers) {
    if (solver.kind !== 'twist') continue;
    for (const joint of solver.joints) stretched.set(indexOf(joint), indexOf(solver.tip));
  }
  return stretched;
}

function groupBy<T>(items: readonly T[], keyOf: (item: T) => number): ReadonlyMap<number, readonly T[]> {
  const groups = new Map<number, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}

/**
 * Makes a rig ready to be evaluated for any control values, by the definitions in `slipway/reference.md`. The rig
 * must be sound: parents first, every reference names a node, and `findEvaluationRing` gives null. Evaluating
 * allocates nothing.
 */
export function createPoser(rig: Rig): Poser {
  const order = orderEvaluation(rig);
  invariant(order.kind === 'order', 'a rig is posed only when nothing in it waits for itself');
  const byName = indexNodes(rig);
  const indexOf = (name: string): number => {
    const index = byName.get(name);
    invariant(index !== undefined, `every reference of a rig names a node ("${name}")`);
    return index;
  };
  const table = new ValueTable(rig, constantsOf(rig));
  const slotOf = (amount: NumberOrAttribute): number => table.amountSlot(amount);
  const memory = makeRigMemory(rig, table.values, indexOf);

  const constraintsOf = groupBy(rig.constraints, ({ target }) => indexOf(target));
  const driversOf = groupBy(rig.drivers, ({ target }) => indexOf(target));
  const spaceOf = new Map(rig.spaces.map((space) => [indexOf(space.control), space]));
  const stretchedBy = stretchedNodes(rig, indexOf);

  const placingOf = (index: number, node: RigNode): NodePlacing => {
    const parent = node.parent === null ? null : indexOf(node.parent);
    const space = spaceOf.get(index);
    const readBase: ReadBase | null =
      space === undefined || parent === null
        ? null
        : prepareSpace(space, memory, parent, table.inputSlot(space.control, space.attribute) ?? -1);
    const drives = (driversOf.get(index) ?? []).flatMap((driver): Drive[] => {
      const slot = table.inputSlot(driver.control, driver.input);
      return slot === undefined ? [] : [prepareDriver(driver, table.values, slot)];
    });
    return {
      node: index,
      parent,
      order: 'order' in node ? node.order : 'xyz',
      channelSlot: node.kind === 'control' ? table.channelSlot(node.name) : -1,
      drives,
      space: readBase,
      stretchedBy: stretchedBy.get(index) ?? -1,
    };
  };

  const scratch = makePlacingMemory();
  const steps: Step[] = [];
  let plain: NodePlacing[] = [];
  const placePlain = (): void => {
    if (plain.length > 0) steps.push(placePlainNodes(plain, memory));
    plain = [];
  };
  for (const task of order.tasks) {
    if (task.kind === 'solve') {
      placePlain();
      steps.push(prepareSolver(rig.solvers[task.solver] as RigSolver, rig, memory, slotOf));
      continue;
    }
    const placing = placingOf(task.node, rig.nodes[task.node] as RigNode);
    const constraints = constraintsOf.get(task.node) ?? [];
    if (isPlain(placing)) plain.push(placing);
    else {
      placePlain();
      steps.push(placeNode(placing, memory, scratch, table));
    }
    if (constraints.length > 0) placePlain();
    for (const constraint of constraints) {
      const blendSlot = constraint.blend === null ? null : slotOf(constraint.blend);
      steps.push(prepareConstraint(constraint, memory, blendSlot));
    }
  }
  placePlain();

  const weightSlots = Int32Array.from(rig.shapes, ({ weight }) => slotOf(weight));
  const weights = new Float64Array(rig.shapes.length);
  const evaluate = (pose: PoseValues = NO_VALUES): void => {
    table.read(pose);
    memory.stretch.fill(1);
    for (let i = 0; i < steps.length; i += 1) (steps[i] as Step)();
    for (let i = 0; i < weights.length; i += 1) {
      weights[i] = Math.min(1, Math.max(0, table.values[weightSlots[i] as number] as number));
    }
  };
  evaluate();
  return { world: memory.world, weights, evaluate };
}
