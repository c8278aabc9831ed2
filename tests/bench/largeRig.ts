import type {
  ControlNode,
  JointNode,
  PoseValues,
  Rig,
  RigConstraint,
  RigNode,
  RigSolver,
  Vec3,
} from '@/compiler/rig/Rig';

const LIMBS = 12;
const STRAND_JOINTS = 22;
const STRANDS = 12;

function base(name: string, parent: string | null, at: Vec3) {
  const place = { id: name, name, parent, container: 'rig', role: 'part', at } as const;
  return { ...place, turn: [0, 0, 0, 1], side: 'centre', shown: true, selectable: true } as const;
}

function joint(name: string, parent: string | null, at: Vec3): JointNode {
  return { ...base(name, parent, at), kind: 'joint', order: 'xyz', limits: {} };
}

function control(name: string, parent: string | null, at: Vec3): ControlNode {
  return {
    ...base(name, parent, at),
    kind: 'control',
    order: 'xyz',
    shape: 'ring',
    size: 1,
    channels: {},
    attributes: [],
  };
}

function follow(target: string, node: string): RigConstraint {
  const sources = [{ node, weight: 1 }];
  return {
    id: `${target}.follow`,
    name: `${target}_follow`,
    kind: 'parent',
    target,
    sources,
    blend: null,
    keepOffset: true,
  };
}

/**
 * A rig of 300 joints as a character has them: twelve strands whose every joint follows a control of its own, and twelve
 * limbs solved by two-bone inverse kinematics; with a pose that moves every control.
 */
export function makeLargeRig(): { readonly rig: Rig; readonly pose: PoseValues } {
  const nodes: RigNode[] = [control('root', null, [0, 0, 0])];
  const constraints: RigConstraint[] = [];
  const solvers: RigSolver[] = [];
  for (let strand = 0; strand < STRANDS; strand += 1) {
    for (let index = 0; index < STRAND_JOINTS; index += 1) {
      const at: Vec3 = index === 0 ? [strand * 10, 50, 0] : [0, 2, 0];
      const name = `strand_${strand}_${index}`;
      const above = index === 0 ? 'root' : `strand_${strand}_${index - 1}`;
      nodes.push(control(`${name}_ctl`, index === 0 ? 'root' : `${above}_ctl`, at), joint(name, above, at));
      constraints.push(follow(name, `${name}_ctl`));
    }
  }
  for (let limb = 0; limb < LIMBS; limb += 1) {
    const [start, mid, end] = ['start', 'mid', 'end'].map((part) => `limb_${limb}_${part}`) as [
      string,
      string,
      string,
    ];
    nodes.push(
      control(`limb_${limb}_goal`, 'root', [limb * 12, 0, 0]),
      control(`limb_${limb}_pole`, 'root', [limb * 12, 20, 40]),
      joint(start, 'root', [limb * 12, 40, 0]),
      joint(mid, start, [0, -20, 3]),
      joint(end, mid, [0, -20, -3]),
    );
    const [goal, pole] = [`limb_${limb}_goal`, `limb_${limb}_pole`];
    solvers.push({
      kind: 'two_bone',
      id: start,
      name: `${start}_ik`,
      start,
      mid,
      end,
      goal,
      pole,
      blend: 1,
      stretch: 0,
      stretchLimit: 1,
      soft: 0,
      swing: 0,
    });
  }
  const scene = {
    character: 'bench',
    recipe: 'bench@1',
    house: 'bench@1',
    up: '+y',
    forward: '+z',
    unit: 'cm',
    recipeHash: '0',
    houseHash: '0',
    compiler: '0',
  } as const;
  const pose = Object.fromEntries(
    nodes
      .filter(({ kind }) => kind === 'control')
      .map(({ name }, index) => [name, { ty: 1 + (index % 3), rx: index % 30, rz: 5 }]),
  );
  return {
    rig: { scene, nodes, constraints, solvers, spaces: [], drivers: [], skins: [], shapes: [] },
    pose,
  };
}
