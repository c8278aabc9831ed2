import { SPACE_ATTRIBUTE } from '../expand/specifyControl';
import type { Amount, ControlSpecification, SolverSpecification } from '../expand/types';
import { invariant } from '../findings/invariant';
import { type LinkCollection, linkKey, seatFollowId, spaceId } from '../resolve/ids';
import type { ResolvedRecipe } from '../resolve/types';
import type { NumberOrAttribute, Rig, RigConstraint, RigSolver, RigSpace } from '../rig/Rig';
import type { FootPoints, SolvedRecipe } from '../solve/types';

type RigLinks = Omit<Rig, 'scene' | 'nodes'>;

/** Names of nodes and links by id, and amounts that name a control's attribute. */
interface Names {
  nodeOf(id: string): string;
  linkOf(collection: LinkCollection, id: string): string;
  amountOf(amount: Amount): NumberOrAttribute;
}

function namesIn(recipe: ResolvedRecipe): Names {
  const nodeOf = (id: string): string => recipe.nodeById.get(id)?.name ?? id;
  return {
    nodeOf,
    linkOf: (collection, id) => recipe.linkNames.get(linkKey(collection, id)) ?? id,
    amountOf(amount) {
      if (typeof amount === 'number') return amount;
      const dot = amount.lastIndexOf('.');
      return { control: nodeOf(amount.slice(0, dot)), attribute: amount.slice(dot + 1) };
    },
  };
}

function assembleConstraints(recipe: ResolvedRecipe, names: Names): readonly RigConstraint[] {
  const seats = recipe.seats.map(
    ({ id, follows }): RigConstraint => ({
      id: seatFollowId(id),
      name: names.linkOf('constraints', seatFollowId(id)),
      kind: 'parent',
      target: names.nodeOf(id),
      sources: [{ node: names.nodeOf(follows), weight: 1 }],
      blend: null,
      keepOffset: true,
    }),
  );
  const written = recipe.constraints.map((constraint): RigConstraint => {
    const { id, kind, target, sources, blend, keepOffset, aim } = constraint;
    const base = {
      id,
      name: names.linkOf('constraints', id),
      target: names.nodeOf(target),
      sources: sources.map(({ node, weight }) => ({ node: names.nodeOf(node), weight })),
      blend: blend === null ? null : names.amountOf(blend),
      keepOffset,
    };
    if (kind !== 'aim') return { ...base, kind };
    const up = aim?.up ?? null;
    const axes = { axis: aim?.axis ?? '+x', upAxis: aim?.upAxis ?? '+y' } as const;
    return { ...base, kind, ...axes, up: up === null ? null : names.nodeOf(up) };
  });
  return [...seats, ...written];
}

function assembleSpace({ id, spaces, spaceFollow }: ControlSpecification, names: Names): RigSpace {
  return {
    id: spaceId(id),
    name: names.linkOf('spaces', spaceId(id)),
    control: names.nodeOf(id),
    attribute: SPACE_ATTRIBUTE,
    sources: spaces.map(names.nodeOf),
    follow: spaceFollow,
  };
}

function assembleSolver(solver: SolverSpecification, names: Names, foot: FootPoints | undefined): RigSolver {
  const { nodeOf, amountOf } = names;
  const base = { id: solver.id, name: names.linkOf('solvers', solver.id) };
  switch (solver.kind) {
    case 'two_bone':
    case 'reach': {
      const shared = {
        ...base,
        goal: nodeOf(solver.goal),
        pole: nodeOf(solver.pole),
        blend: amountOf(solver.blend),
        stretch: amountOf(solver.stretch),
        stretchLimit: solver.stretchLimit,
        soft: solver.soft,
        swing: amountOf(solver.swing),
      };
      if (solver.kind === 'reach') {
        const joints = solver.joints.map(nodeOf);
        return { ...shared, kind: solver.kind, joints, bias: amountOf(solver.bias) };
      }
      const [start, mid, end] = solver.joints;
      return { ...shared, kind: solver.kind, start: nodeOf(start), mid: nodeOf(mid), end: nodeOf(end) };
    }
    case 'spline':
      return {
        ...base,
        kind: solver.kind,
        joints: solver.joints.map(nodeOf),
        controls: solver.controls.map(nodeOf),
        stretch: amountOf(solver.stretch),
        volume: amountOf(solver.volume),
      };
    case 'twist':
      return {
        ...base,
        kind: solver.kind,
        joints: solver.joints.map(nodeOf),
        shares: solver.shares,
        bone: nodeOf(solver.bone),
        tip: nodeOf(solver.tip),
        base: nodeOf(solver.base),
        driver: nodeOf(solver.driver),
      };
    case 'aim':
      return {
        ...base,
        kind: solver.kind,
        joint: nodeOf(solver.joints[0]),
        goal: nodeOf(solver.goal),
        pole: solver.pole === null ? null : nodeOf(solver.pole),
        blend: amountOf(solver.blend),
      };
    case 'foot_roll': {
      invariant(foot !== undefined, 'a rig is assembled only when every foot roll has its points');
      return {
        ...base,
        kind: solver.kind,
        foot: nodeOf(solver.foot),
        ankle: nodeOf(solver.ankle),
        toes: nodeOf(solver.toes ?? solver.ankle),
        ...foot,
        roll: amountOf(solver.roll),
        bank: amountOf(solver.bank),
        break: amountOf(solver.break),
      };
    }
    default:
      return solver satisfies never;
  }
}

/** Joints of a skin: those listed, and all joints of the chains listed, each once. */
function skinJoints(ids: readonly string[], recipe: ResolvedRecipe): readonly string[] {
  const chains = new Map(recipe.chains.map(({ id, jointIds }) => [id, jointIds]));
  return [...new Set(ids.flatMap((id) => chains.get(id) ?? [id]))];
}

/** Everything that links the nodes of a rig, by names. */
export function assembleLinks(recipe: ResolvedRecipe, solved: SolvedRecipe): RigLinks {
  const names = namesIn(recipe);
  const { nodeOf, linkOf, amountOf } = names;
  return {
    constraints: assembleConstraints(recipe, names),
    solvers: recipe.solvers.map((solver) => assembleSolver(solver, names, solved.feet.get(solver.id))),
    spaces: recipe.controls
      .filter(({ spaces }) => spaces.length > 1)
      .map((control) => assembleSpace(control, names)),
    drivers: recipe.drivers.map(
      ({ id, control, input, target, channel, inputs, outputs, curve, beyond }) => ({
        id,
        name: linkOf('drivers', id),
        control: nodeOf(control),
        input,
        target: nodeOf(target),
        channel,
        inputs,
        outputs,
        curve,
        beyond,
      }),
    ),
    skins: recipe.skins.map(({ id, geometry, joints, influences }) => ({
      id,
      name: linkOf('skins', id),
      geometry: nodeOf(geometry),
      joints: skinJoints(joints, recipe).map(nodeOf),
      influences,
    })),
    shapes: recipe.shapes.map(({ id, geometry, morph, weight }) => ({
      id,
      name: linkOf('shapes', id),
      geometry: nodeOf(geometry),
      morph,
      weight: amountOf(weight),
    })),
  };
}
