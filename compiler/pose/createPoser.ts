import { invariant } from '../findings/invariant';
import { IDENTITY_MAT4 } from '../math/mat4';
import type { ControlNode, PoseValues, Rig } from '../rig/Rig';
import { readerOf } from './channelValues';
import { prepareConstraint } from './constraint';
import { readChannels, writeChannelMatrix } from './controlTransform';
import { indexNodes, orderEvaluation } from './evaluationOrder';
import type { Poser } from './Poser';
import { prepareTwoBone } from './twoBoneSolver';
import { multiplyInto, restMatrix, restWorldMatrices, writeMatrix } from './worldMatrices';

/** One thing to do on the flat array of world matrices. */
type Step = (pose: PoseValues) => void;

const NO_VALUES: PoseValues = {};

/** Everything the steps of one poser share while it evaluates. */
interface Workspace {
  readonly world: Float64Array;
  /** Rest transform of every node against its parent, flat like `world`. */
  readonly restLocal: Float64Array;
  readonly channels: Float64Array;
  readonly channelMatrix: Float64Array;
  readonly local: Float64Array;
}

function makeWorkspace(rig: Rig): Workspace {
  const restLocal = new Float64Array(rig.nodes.length * 16);
  rig.nodes.forEach((node, index) => {
    writeMatrix(restLocal, index, restMatrix(node));
  });
  return {
    world: Float64Array.from(restLocal),
    restLocal,
    channels: new Float64Array(9),
    channelMatrix: Float64Array.from(IDENTITY_MAT4),
    local: Float64Array.from(IDENTITY_MAT4),
  };
}

/** world = parent's world × rest × own channels; only controls have channels. */
function placeNode(
  space: Workspace,
  index: number,
  parent: number | null,
  control: ControlNode | null,
): Step {
  const { world, restLocal, channels, channelMatrix, local } = space;
  const o = index * 16;
  const copyRest = (): void => {
    for (let i = 0; i < 15; i += 1) world[o + i] = restLocal[o + i] as number;
  };
  return (pose) => {
    const moved = control !== null && readChannels(control, pose, channels);
    if (moved && control !== null) {
      writeChannelMatrix(control.order, channels, channelMatrix);
      if (parent === null) multiplyInto(world, o, restLocal, o, channelMatrix, 0);
      else {
        multiplyInto(local, 0, restLocal, o, channelMatrix, 0);
        multiplyInto(world, o, world, parent * 16, local, 0);
      }
    } else if (parent === null) copyRest();
    else multiplyInto(world, o, world, parent * 16, restLocal, o);
  };
}

/**
 * Makes a rig ready to be evaluated for any control values, by the definitions in `slipway/reference.md`. The rig
 * must be sound: parents first, every reference names a node, and `findEvaluationRing` gives null.
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
  const controls = new Map<string, ControlNode>();
  for (const node of rig.nodes) if (node.kind === 'control') controls.set(node.name, node);
  const restWorld = restWorldMatrices(rig);
  const space = makeWorkspace(rig);

  const constraintsOf = new Map<number, Step[]>();
  for (const constraint of rig.constraints) {
    const apply = prepareConstraint(constraint, indexOf, restWorld);
    const readBlend = constraint.blend === null ? null : readerOf(constraint.blend, controls);
    const target = indexOf(constraint.target);
    const steps = constraintsOf.get(target) ?? [];
    steps.push((pose) => apply(space.world, readBlend === null ? null : readBlend(pose)));
    constraintsOf.set(target, steps);
  }
  const solverSteps = rig.solvers.map((solver): Step => {
    const [start, end] = [rig.nodes[indexOf(solver.start)], rig.nodes[indexOf(solver.end)]];
    invariant(start !== undefined && end !== undefined, 'indices lie in the list of nodes');
    const nodes = {
      start: indexOf(solver.start),
      mid: indexOf(solver.mid),
      end: indexOf(solver.end),
      goal: indexOf(solver.goal),
      pole: indexOf(solver.pole),
      parent: start.parent === null ? null : indexOf(start.parent),
      endOffset: end.at,
    };
    const apply = prepareTwoBone(nodes, restWorld);
    const readBlend = readerOf(solver.blend, controls);
    return (pose) => apply(space.world, readBlend(pose));
  });

  const steps = order.tasks.flatMap((task): Step[] => {
    if (task.kind === 'solve') return [solverSteps[task.solver] as Step];
    const node = rig.nodes[task.node];
    invariant(node !== undefined, 'indices lie in the list of nodes');
    const parent = node.parent === null ? null : indexOf(node.parent);
    const place = placeNode(space, task.node, parent, node.kind === 'control' ? node : null);
    return [place, ...(constraintsOf.get(task.node) ?? [])];
  });
  const evaluate = (pose: PoseValues = NO_VALUES): void => {
    for (const step of steps) step(pose);
  };
  evaluate();
  return { world: space.world, evaluate };
}
