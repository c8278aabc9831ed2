import { type Rig, type RigNode, type Side, shapeLines, type Vec3 } from '@/compiler';
import type { BuiltRig } from '@/components/worker/messages';

/** Who is looking: an animator sees what is shown; a rigger sees everything. */
export type Audience = 'rigger' | 'animator';

/** Line ends in pairs, three numbers each, of one side. */
export type Segments = Readonly<Record<Side, readonly number[]>>;

export interface JointMark {
  readonly node: number;
  readonly side: Side;
  /** False for what animators do not see; drawn faintly. */
  readonly isShown: boolean;
  readonly at: Vec3;
}

export interface BoneStroke {
  readonly side: Side;
  readonly isShown: boolean;
  readonly from: Vec3;
  readonly to: Vec3;
}

/** A rig as strokes in world space: what a draughtsman would put on paper. */
export interface Drawing {
  readonly joints: readonly JointMark[];
  readonly bones: readonly BoneStroke[];
  readonly controls: Segments;
  readonly leaders: readonly { readonly node: number; readonly from: Vec3; readonly to: Vec3 }[];
  /** Line ends of each control by node index, for choosing and for marking the chosen one. */
  readonly outlines: ReadonlyMap<number, readonly number[]>;
  readonly low: Vec3;
  readonly high: Vec3;
  /** Diagonal of the box around everything; never zero. */
  readonly size: number;
}

function positionAt(world: Float64Array, node: number): Vec3 {
  const at = node * 16 + 12;
  return [world[at] ?? 0, world[at + 1] ?? 0, world[at + 2] ?? 0];
}

function transform(world: Float64Array, node: number, [x, y, z]: Vec3): Vec3 {
  const m = (index: number): number => world[node * 16 + index] ?? 0;
  return [
    m(0) * x + m(4) * y + m(8) * z + m(12),
    m(1) * x + m(5) * y + m(9) * z + m(13),
    m(2) * x + m(6) * y + m(10) * z + m(14),
  ];
}

function outlineOf(
  rig: Rig,
  node: RigNode & { readonly kind: 'control' },
  world: Float64Array,
  index: number,
): number[] {
  const ends: number[] = [];
  for (const line of shapeLines(node.shape, rig.scene)) {
    for (let point = 0; point + 1 < line.length; point += 1) {
      for (const [x, y, z] of [line[point] as Vec3, line[point + 1] as Vec3]) {
        ends.push(...transform(world, index, [x * node.size, y * node.size, z * node.size]));
      }
    }
  }
  return ends;
}

/** Draws a rig in world space for an audience. */
export function drawRig({ rig, world }: Pick<BuiltRig, 'rig' | 'world'>, audience: Audience): Drawing {
  const indexOf = new Map(rig.nodes.map((node, index) => [node.name, index]));
  const joints: JointMark[] = [];
  const bones: BoneStroke[] = [];
  const controls: Record<Side, number[]> = { left: [], right: [], centre: [] };
  const leaders: { node: number; from: Vec3; to: Vec3 }[] = [];
  const outlines = new Map<number, readonly number[]>();
  const low: [number, number, number] = [Infinity, Infinity, Infinity];
  const high: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  const grow = (point: Vec3): void => {
    for (let axis = 0; axis < 3; axis += 1) {
      low[axis] = Math.min(low[axis] as number, point[axis] as number);
      high[axis] = Math.max(high[axis] as number, point[axis] as number);
    }
  };

  rig.nodes.forEach((node, index) => {
    const at = positionAt(world, index);
    if (node.kind === 'joint' || node.kind === 'control') grow(at);
    if (audience === 'animator' && !node.shown) return;
    if (node.kind === 'joint') {
      joints.push({ node: index, side: node.side, isShown: node.shown, at });
      const parent = node.parent === null ? undefined : indexOf.get(node.parent);
      if (parent !== undefined && rig.nodes[parent]?.kind === 'joint') {
        bones.push({ side: node.side, isShown: node.shown, from: positionAt(world, parent), to: at });
      }
    } else if (node.kind === 'control') {
      const ends = outlineOf(rig, node, world, index);
      controls[node.side].push(...ends);
      outlines.set(index, ends);
      for (let end = 0; end + 2 < ends.length; end += 3) {
        grow([ends[end] as number, ends[end + 1] as number, ends[end + 2] as number]);
      }
    } else if (node.kind === 'line') {
      const from = indexOf.get(node.from);
      const to = indexOf.get(node.to);
      if (from === undefined || to === undefined) return;
      leaders.push({ node: index, from: positionAt(world, from), to: positionAt(world, to) });
    }
  });

  const isEmpty = low[0] === Infinity;
  const from: Vec3 = isEmpty ? [-1, 0, -1] : low;
  const to: Vec3 = isEmpty ? [1, 1, 1] : high;
  const size = Math.hypot(to[0] - from[0], to[1] - from[1], to[2] - from[2]) || 1;
  return { joints, bones, controls, leaders, outlines, low: from, high: to, size };
}
