import { type Camera, Vector3 } from 'three';
import type { Drawing } from './drawing';

/** How near the pointer must be, in pixels. */
const REACH = 12;
/** A joint wins over a control that runs past it by this many pixels, because it is the smaller mark. */
const JOINT_FAVOUR = 5;

function distanceToSegment(px: number, py: number, ax: number, ay: number, bx: number, by: number): number {
  const dx = bx - ax;
  const dy = by - ay;
  const square = dx * dx + dy * dy;
  const t = square > 0 ? Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / square)) : 0;
  return Math.hypot(px - ax - t * dx, py - ay - t * dy);
}

/** The joint or control drawn nearest to a place on the screen, by index; null when none is near. */
export function nearestNode(
  drawing: Drawing,
  camera: Camera,
  width: number,
  height: number,
  x: number,
  y: number,
): number | null {
  const point = new Vector3();
  const project = (a: number, b: number, c: number): readonly [number, number] => {
    point.set(a, b, c).project(camera);
    return [((point.x + 1) / 2) * width, ((1 - point.y) / 2) * height];
  };
  let best: number | null = null;
  let least = REACH;
  for (const { node, at } of drawing.joints) {
    const [jx, jy] = project(...at);
    const distance = Math.hypot(jx - x, jy - y) - JOINT_FAVOUR;
    if (distance < least) {
      least = distance;
      best = node;
    }
  }
  for (const [node, ends] of drawing.outlines) {
    for (let index = 0; index + 5 < ends.length; index += 6) {
      const [ax, ay] = project(ends[index] as number, ends[index + 1] as number, ends[index + 2] as number);
      const [bx, by] = project(
        ends[index + 3] as number,
        ends[index + 4] as number,
        ends[index + 5] as number,
      );
      const distance = distanceToSegment(x, y, ax, ay, bx, by);
      if (distance < least) {
        least = distance;
        best = node;
      }
    }
  }
  return best;
}
