import type {
  ControlNode,
  GroupNode,
  JointNode,
  LineNode,
  Quat,
  Rig,
  RigNode,
  Vec3,
} from '@/compiler/rig/Rig';

interface NodeOptions {
  readonly parent?: string | null;
  readonly at?: Vec3;
  readonly turn?: Quat;
}

function base(name: string, { parent = null, at = [0, 0, 0], turn = [0, 0, 0, 1] }: NodeOptions) {
  const place = { id: name, name, parent, container: 'rig', role: 'part', at, turn };
  return { ...place, side: 'centre', shown: true, selectable: true } as const;
}

export function group(name: string, options: NodeOptions = {}): GroupNode {
  return { ...base(name, options), kind: 'group' };
}

export function joint(name: string, options: NodeOptions = {}): JointNode {
  return { ...base(name, options), kind: 'joint', order: 'xyz', limits: {} };
}

export function control(
  name: string,
  options: NodeOptions & Partial<Pick<ControlNode, 'order' | 'channels' | 'attributes'>> = {},
): ControlNode {
  const { order = 'xyz', channels = {}, attributes = [] } = options;
  return { ...base(name, options), kind: 'control', order, shape: 'ring', size: 1, channels, attributes };
}

export function line(name: string, from: string, to: string, options: NodeOptions = {}): LineNode {
  return { ...base(name, options), kind: 'line', from, to, style: 'dotted' };
}

/** A sound rig of the given nodes and links, in an upright scene. */
export function rigOf(nodes: readonly RigNode[], links: Partial<Omit<Rig, 'scene' | 'nodes'>> = {}): Rig {
  return {
    scene: {
      character: 'test',
      recipe: 'test@1',
      house: 'test@1',
      up: '+y',
      forward: '+z',
      unit: 'cm',
      recipeHash: '0',
      houseHash: '0',
      compiler: '0',
    },
    nodes,
    constraints: links.constraints ?? [],
    solvers: links.solvers ?? [],
    spaces: links.spaces ?? [],
    drivers: links.drivers ?? [],
    skins: links.skins ?? [],
    shapes: links.shapes ?? [],
  };
}
