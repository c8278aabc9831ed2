import type {
  ControlNode,
  JointNode,
  Rig,
  RigConstraint,
  RigNode,
  RigScene,
  RigSolver,
  TurnChannel,
} from '../rig/Rig';
import type { Step, StepOf } from '../slipway/Step';
import { CHANNEL_NAMES, type SolverVerb } from '../slipway/verbs';

function planScene(scene: RigScene): StepOf<'scene'> {
  return {
    verb: 'scene',
    name: scene.character,
    values: {
      recipe: scene.recipe,
      house: scene.house,
      up: scene.up,
      forward: scene.forward,
      unit: scene.unit,
      recipe_hash: scene.recipeHash,
      house_hash: scene.houseHash,
      compiler: scene.compiler,
    },
  };
}

function planNode(node: RigNode): Step {
  const { kind, name, id, parent, container, role, side, at, turn } = node;
  const place = { id, parent, container, role, side, at, turn };
  switch (kind) {
    case 'group':
    case 'note':
      return { verb: kind, name, values: place };
    case 'joint':
      return { verb: kind, name, values: { ...place, order: node.order } };
    case 'control':
      return {
        verb: kind,
        name,
        values: { ...place, order: node.order, shape: node.shape, size: node.size },
      };
    case 'line':
      return { verb: kind, name, values: { ...place, from: node.from, to: node.to, style: node.style } };
    case 'geometry':
      return { verb: kind, name, values: { ...place, mesh: node.mesh } };
    default:
      return kind satisfies never;
  }
}

const TURNS: readonly TurnChannel[] = ['rx', 'ry', 'rz'];

function planJoint({ name, limits }: JointNode): Step[] {
  return TURNS.flatMap((channel): Step[] => {
    const limit = limits[channel];
    return limit === undefined ? [] : [{ verb: 'limit', name, values: { channel, ...limit } }];
  });
}

function planControl({ name, attributes, channels }: ControlNode): Step[] {
  const steps: Step[] = attributes.map((attribute) => ({ verb: 'attr', name, values: attribute }));
  const listed = CHANNEL_NAMES.filter((channel) => channels[channel] !== undefined);
  const locked = listed.filter((channel) => channels[channel]?.locked);
  if (locked.length > 0) steps.push({ verb: 'lock', name, values: { channels: locked } });
  for (const channel of listed) {
    const min = channels[channel]?.min ?? null;
    const max = channels[channel]?.max ?? null;
    if (min !== null || max !== null) steps.push({ verb: 'limit', name, values: { channel, min, max } });
  }
  return steps;
}

function planDetails(node: RigNode): Step[] {
  const { name, shown, selectable } = node;
  const steps: Step[] = node.kind === 'control' ? planControl(node) : [];
  if (node.kind === 'joint') steps.push(...planJoint(node));
  if (node.kind === 'note') {
    for (const { key, value } of node.entries) steps.push({ verb: 'entry', name, values: { key, value } });
  }
  if (!(shown && selectable)) steps.push({ verb: 'show', name, values: { shown, selectable } });
  return steps;
}

function planConstraint(constraint: RigConstraint): StepOf<'constrain'> {
  return {
    verb: 'constrain',
    name: constraint.name,
    values: {
      id: constraint.id,
      kind: constraint.kind,
      target: constraint.target,
      sources: constraint.sources.map(({ node }) => node),
      weights: constraint.sources.map(({ weight }) => weight),
      keep_offset: constraint.keepOffset,
      blend: constraint.blend,
      axis: constraint.kind === 'aim' ? constraint.axis : null,
      up_axis: constraint.kind === 'aim' ? constraint.upAxis : null,
      up: constraint.kind === 'aim' ? constraint.up : null,
    },
  };
}

function planSolver(solver: RigSolver): StepOf<SolverVerb> {
  const { kind, name, ...values } = solver;
  if (!('stretchLimit' in values)) return { verb: kind, name, values } as StepOf<SolverVerb>;
  const { stretchLimit, ...rest } = values;
  return { verb: kind, name, values: { ...rest, stretch_limit: stretchLimit } } as StepOf<SolverVerb>;
}

/** The step of a link whose keys bear the names of its fields. */
function planLink<V extends 'space' | 'drive' | 'skin' | 'shape'>(
  verb: V,
  { name, ...values }: { readonly name: string } & StepOf<V>['values'],
): Step {
  return { verb, name, values } as unknown as Step;
}

/**
 * The steps that build a rig, in an order in which nothing refers forward: scene, then every node in the rig's own
 * order with what belongs to it, then what links them. Relies on the rig's order of nodes: parents before
 * children, a line after both its ends.
 */
export function planSteps(rig: Rig): readonly Step[] {
  return [
    planScene(rig.scene),
    ...rig.nodes.flatMap((node) => [planNode(node), ...planDetails(node)]),
    ...rig.constraints.map(planConstraint),
    ...rig.spaces.map((space) => planLink('space', space)),
    ...rig.drivers.map((driver) => planLink('drive', driver)),
    ...rig.solvers.map(planSolver),
    ...rig.skins.map((skin) => planLink('skin', skin)),
    ...rig.shapes.map((shape) => planLink('shape', shape)),
  ];
}
