import fc from 'fast-check';
import { PerspectiveCamera, Vector3 } from 'three';
import { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import { describe, expect, it } from 'vitest';
import type { Vec3 } from '@/compiler';
import { CameraDesk, type Standpoint } from '@/components/viewport/CameraDesk';
import { drawRig } from '@/components/viewport/drawing';
import { pointsAround, pointsOf } from '@/components/viewport/framing';
import { pressKey } from '@/components/viewport/pressKey';
import { builtSample } from './sample';

const STANDPOINTS: readonly Standpoint[] = ['free', 'front', 'side', 'top'];
const ROOM = 1 / 1.12;

function setUp(aspect = 1.6) {
  const camera = new PerspectiveCamera(32, aspect);
  const controls = new OrbitControls(camera, document.createElement('canvas'));
  const desk = new CameraDesk(camera, controls, { up: '+y', forward: '+z' }, () => undefined);
  return { camera, controls, desk };
}

/** Where a point falls in the picture: −1 to 1 from edge to edge. */
function inPicture(camera: PerspectiveCamera, point: Vec3): Vector3 {
  camera.updateMatrixWorld();
  return new Vector3(...point).project(camera);
}

const coordinate = fc.double({ min: -500, max: 500, noNaN: true });
const point = fc.tuple(coordinate, coordinate, coordinate);
const aspect = fc.double({ min: 0.4, max: 3, noNaN: true });
const standpoint = fc.constantFrom(...STANDPOINTS);

/** How far from the middle of the picture the outermost point falls, as a share of the way to the edge. */
function widest(camera: PerspectiveCamera, points: readonly Vec3[]): number {
  const places = points.map((seen) => inPicture(camera, seen));
  return Math.max(...places.flatMap(({ x, y, z }) => [Math.abs(x), Math.abs(y), Math.abs(z) < 1 ? 0 : 2]));
}

describe('framing', () => {
  it('has every point in the picture, before the camera, and all of them in its middle', () => {
    fc.assert(
      fc.property(
        fc.array(point, { minLength: 1, maxLength: 20 }),
        standpoint,
        aspect,
        (points, from, wide) => {
          const { camera, desk } = setUp(wide);
          desk.stand(from, points);
          expect(widest(camera, points)).toBeLessThan(ROOM + 1e-6);
        },
      ),
    );
  });

  it('leaves no more room around a rig than it says', () => {
    const side = fc.double({ min: 10, max: 100, noNaN: true });
    fc.assert(
      fc.property(
        fc.tuple(side, side, side),
        point,
        standpoint,
        aspect,
        ([x, y, z], [a, b, c], from, wide) => {
          const corners = [0, 1, 2, 3, 4, 5, 6, 7].map(
            (corner): Vec3 => [a + (corner & 1 ? x : 0), b + (corner & 2 ? y : 0), c + (corner & 4 ? z : 0)],
          );
          const { camera, desk } = setUp(wide);
          desk.stand(from, corners);
          expect(widest(camera, corners)).toBeGreaterThan(ROOM - 1e-3);
        },
      ),
    );
  });

  it('shows the hare from the front with its left on the right of the picture, and its crown above', () => {
    const built = builtSample('hare');
    const drawing = drawRig(built, 'rigger');
    const { camera, desk } = setUp();
    desk.stand('front', pointsOf(drawing));
    const placeOf = (id: string) => {
      const at = built.rig.nodes.findIndex((node) => node.id === id) * 16 + 12;
      return inPicture(camera, [built.world[at] ?? 0, built.world[at + 1] ?? 0, built.world[at + 2] ?? 0]);
    };
    expect(placeOf('arm.left.wrist').x).toBeGreaterThan(placeOf('arm.right.wrist').x);
    expect(placeOf('head.head.crown').y).toBeGreaterThan(placeOf('leg.left.ankle').y);
  });

  it('comes near to a chosen thing, with room around it', () => {
    const built = builtSample('hare');
    const drawing = drawRig(built, 'rigger');
    const { camera, controls, desk } = setUp();
    desk.stand('free', pointsOf(drawing));
    const before = camera.position.distanceTo(controls.target);
    const wrist = built.rig.nodes.findIndex(({ id }) => id === 'arm.left.wrist');
    desk.frame(pointsAround(drawing, built.world, [wrist]));
    expect(camera.position.distanceTo(controls.target)).toBeLessThan(before / 3);
    const at = wrist * 16 + 12;
    const { x, y } = inPicture(camera, [
      built.world[at] ?? 0,
      built.world[at + 1] ?? 0,
      built.world[at + 2] ?? 0,
    ]);
    expect(Math.max(Math.abs(x), Math.abs(y))).toBeLessThan(0.4);
  });

  it('leaves the view to whoever moved it', () => {
    const { desk } = setUp();
    desk.stand('free', [
      [0, 0, 0],
      [1, 1, 1],
    ]);
    expect(desk.isTouched).toBe(false);
    desk.orbit(8, 0);
    expect(desk.isTouched).toBe(true);
  });
});

describe('keys in the picture', () => {
  const asked: string[] = [];
  const targets = {
    stand: (standpoint: Standpoint) => asked.push(standpoint),
    frameAll: () => asked.push('all'),
    frameChosen: () => asked.push('chosen'),
    letGo: () => asked.push('let go'),
  };
  const press = (desk: CameraDesk, key: string, withShift = false) => pressKey(key, withShift, desk, targets);

  it('ask for standpoints and frames', () => {
    const { desk } = setUp();
    asked.length = 0;
    for (const key of ['1', '2', '3', '4', 'Home', 'End', 'Escape']) expect(press(desk, key)).toBe(true);
    expect(asked).toEqual(['front', 'side', 'top', 'free', 'all', 'chosen', 'let go']);
  });

  it('leave Tab and letters to the page', () => {
    const { desk } = setUp();
    for (const key of ['Tab', 'a', 'Enter', 'F6']) expect(press(desk, key)).toBe(false);
    expect(desk.isTouched).toBe(false);
  });

  it('turn about what is looked at, and back again', () => {
    const { camera, controls, desk } = setUp();
    desk.stand('front', [
      [-1, 0, 0],
      [1, 2, 0],
    ]);
    const [before, distance] = [camera.position.clone(), camera.position.distanceTo(controls.target)];
    press(desk, 'ArrowLeft');
    expect(camera.position.distanceTo(before)).toBeGreaterThan(0.1);
    expect(camera.position.distanceTo(controls.target)).toBeCloseTo(distance, 9);
    press(desk, 'ArrowRight');
    expect(camera.position.distanceTo(before)).toBeLessThan(1e-9);
  });

  it('never turn over the top', () => {
    const { camera, controls, desk } = setUp();
    desk.stand('front', [
      [-1, 0, 0],
      [1, 2, 0],
    ]);
    for (let presses = 0; presses < 60; presses += 1) press(desk, 'ArrowUp');
    const { y } = camera.position.clone().sub(controls.target).normalize();
    expect(Math.abs(y)).toBeLessThan(1);
    expect(camera.up.toArray()).toEqual([0, 1, 0]);
  });

  it('move and come nearer', () => {
    const { camera, controls, desk } = setUp();
    desk.stand('front', [
      [-1, 0, 0],
      [1, 2, 0],
    ]);
    const distance = camera.position.distanceTo(controls.target);
    const target = controls.target.clone();
    press(desk, 'ArrowRight', true);
    expect(controls.target.distanceTo(target)).toBeGreaterThan(0.01);
    expect(camera.position.distanceTo(controls.target)).toBeCloseTo(distance, 9);
    press(desk, '+');
    expect(camera.position.distanceTo(controls.target)).toBeLessThan(distance);
    press(desk, '-');
    expect(camera.position.distanceTo(controls.target)).toBeCloseTo(distance, 9);
  });
});
