import type { Vec3 } from '@/compiler';
import type { Drawing } from './drawing';

/** Room kept around a chosen joint, as a share of the rig's size. */
const ROOM = 0.08;

function cornersOf([x, y, z]: Vec3, [toX, toY, toZ]: Vec3): readonly Vec3[] {
  return [x, toX].flatMap((a) => [y, toY].flatMap((b) => [z, toZ].map((c): Vec3 => [a, b, c])));
}

function endsOf(ends: readonly number[]): readonly Vec3[] {
  const points: Vec3[] = [];
  for (let at = 0; at + 2 < ends.length; at += 3) {
    points.push([ends[at] as number, ends[at + 1] as number, ends[at + 2] as number]);
  }
  return points;
}

/** Every point that must be in the picture to see the whole rig; never none. */
export function pointsOf(drawing: Drawing): readonly Vec3[] {
  const joints = drawing.joints.map(({ at }) => at);
  const controls = [...drawing.outlines.values()].flatMap(endsOf);
  const points = [...joints, ...controls];
  return points.length > 1 ? points : cornersOf(drawing.low, drawing.high);
}

/** Every point that must be in the picture to see some nodes, with room around each; never none. */
export function pointsAround(
  drawing: Drawing,
  world: Float64Array,
  nodes: readonly number[],
): readonly Vec3[] {
  const room = drawing.size * ROOM;
  const points = nodes.flatMap((node) => {
    const at: Vec3 = [world[node * 16 + 12] ?? 0, world[node * 16 + 13] ?? 0, world[node * 16 + 14] ?? 0];
    const low: Vec3 = [at[0] - room, at[1] - room, at[2] - room];
    const high: Vec3 = [at[0] + room, at[1] + room, at[2] + room];
    return [...cornersOf(low, high), ...endsOf(drawing.outlines.get(node) ?? [])];
  });
  return points.length > 0 ? points : pointsOf(drawing);
}
