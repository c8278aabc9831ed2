import { axisDirection } from '../math/axisDirection';
import { add, cross, scale } from '../math/vec3';
import type { RigScene, ShapeName, Vec3 } from '../rig/Rig';

/** Points joined by straight strokes; closed when the last is the first. */
export type Polyline = readonly Vec3[];

/** Even, so that a circle meets all four axes; enough to look round at any size people draw at. */
const CIRCLE_SEGMENTS = 32;

function circle(first: Vec3, second: Vec3, radius = 1): Polyline {
  return Array.from({ length: CIRCLE_SEGMENTS + 1 }, (_, index) => {
    const angle = (2 * Math.PI * (index % CIRCLE_SEGMENTS)) / CIRCLE_SEGMENTS;
    return add(scale(first, radius * Math.cos(angle)), scale(second, radius * Math.sin(angle)));
  });
}

type Plane = (first: number, second: number) => Vec3;

function flat(first: Vec3, second: Vec3): Plane {
  return (a, b) => add(scale(first, a), scale(second, b));
}

/** Half the side of a square or cube that just fits into the circle or ball of radius one. */
const HALF_SQUARE = Math.SQRT1_2;
const HALF_CUBE = 1 / Math.sqrt(3);

function square(on: Plane, half: number): Polyline {
  return [on(half, half), on(-half, half), on(-half, -half), on(half, -half), on(half, half)];
}

function crossOutline(on: Plane): Polyline {
  const w = 0.25;
  const corners: readonly (readonly [number, number])[] = [
    [1, w],
    [w, w],
    [w, 1],
    [-w, 1],
    [-w, w],
    [-1, w],
    [-1, -w],
    [-w, -w],
    [-w, -1],
    [w, -1],
    [w, -w],
    [1, -w],
    [1, w],
  ];
  return corners.map(([a, b]) => on(a, b));
}

function arrowOutline(on: Plane): Polyline {
  const corners: readonly (readonly [number, number])[] = [
    [0, 1],
    [-0.6, 0.3],
    [-0.25, 0.3],
    [-0.25, -1],
    [0.25, -1],
    [0.25, 0.3],
    [0.6, 0.3],
    [0, 1],
  ];
  return corners.map(([a, b]) => on(a, b));
}

function boxEdges(left: Vec3, up: Vec3, forward: Vec3): readonly Polyline[] {
  const h = HALF_CUBE;
  const layer =
    (height: number): Plane =>
    (a, b) =>
      add(flat(left, forward)(a, b), scale(up, height));
  const corners: readonly (readonly [number, number])[] = [
    [h, h],
    [-h, h],
    [-h, -h],
    [h, -h],
  ];
  const posts = corners.map(([a, b]): Polyline => [layer(-h)(a, b), layer(h)(a, b)]);
  return [square(layer(h), h), square(layer(-h), h), ...posts];
}

/**
 * The drawn strokes of a control's shape for radius one, in the control's own axes; draw them times `size`. A ring
 * lies across local x, where joints aim by default. Everything else is drawn as for an upright control: "up" and
 * "forward" are the local axes that bear the names of the scene's. Compass, square, cross and arrow lie flat across
 * up; compass and arrow point forward; a pin stands up from the control; ball, box and diamond are solid figures.
 */
export function shapeLines(shape: ShapeName, scene: Pick<RigScene, 'up' | 'forward'>): readonly Polyline[] {
  const up = axisDirection(scene.up);
  const forward = axisDirection(scene.forward);
  const left = cross(up, forward);
  const floor = flat(left, forward);
  switch (shape) {
    case 'ring':
      return [circle([0, 1, 0], [0, 0, 1])];
    case 'square':
      return [square(floor, HALF_SQUARE)];
    case 'cross':
      return [crossOutline(floor)];
    case 'arrow':
      return [arrowOutline(floor)];
    case 'compass':
      return [circle(left, forward), [floor(-0.15, 1), floor(0, 1.3), floor(0.15, 1)]];
    case 'ball':
      return [circle(left, up), circle(up, forward), circle(forward, left)];
    case 'box':
      return boxEdges(left, up, forward);
    case 'diamond':
      return [flat(left, up), flat(up, forward), flat(forward, left)].map((on) => [
        on(1, 0),
        on(0, 1),
        on(-1, 0),
        on(0, -1),
        on(1, 0),
      ]);
    case 'pin': {
      const head = circle(up, left, 0.25).map((point) => add(point, scale(up, 0.75)));
      return [[[0, 0, 0], scale(up, 0.5)], head];
    }
    default:
      return shape satisfies never;
  }
}
