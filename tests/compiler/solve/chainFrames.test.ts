import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ChainSpecification, SceneFrame } from '@/compiler/expand/types';
import { multiplyQuat, rotate } from '@/compiler/math/quat';
import { dot, normalise, sub } from '@/compiler/math/vec3';
import type { Quat, Vec3 } from '@/compiler/rig/Rig';
import { chainFrames } from '@/compiler/solve/chainFrames';

const scene: SceneFrame = {
  upAxis: '+y',
  forwardAxis: '+z',
  unit: 'cm',
  up: [0, 1, 0],
  forward: [0, 0, 1],
  left: [1, 0, 0],
};

const chain = (over: Partial<ChainSpecification> = {}): ChainSpecification => ({
  id: 'arm',
  side: 'left',
  path: [],
  part: null,
  role: 'skin',
  points: [],
  count: null,
  curve: 'smooth',
  jointIds: [],
  parent: null,
  mirror: 'behaviour',
  orient: { rule: 'chain', aim: '+x', up: '+y', toward: null, like: null },
  order: 'xyz',
  limits: {},
  ...over,
});

const expectClose = (a: Vec3, b: Vec3, digits = 12): void => {
  for (let axis = 0; axis < 3; axis += 1) expect(a[axis]).toBeCloseTo(b[axis] as number, digits);
};

const X: Vec3 = [1, 0, 0];
const Y: Vec3 = [0, 1, 0];
const Z: Vec3 = [0, 0, 1];

describe('joint frames of a chain', () => {
  const elbow: Vec3[] = [
    [0, 0, 0],
    [10, 0, 0],
    [18, 6, 0],
    [20, 8, 0],
  ];

  it('aims each joint at the next; the last takes the frame before', () => {
    const frames = chainFrames(chain(), elbow, scene);
    expectClose(rotate(frames[0] as Quat, X), [1, 0, 0]);
    expectClose(rotate(frames[1] as Quat, X), [0.8, 0.6, 0]);
    expect(frames[3]).toEqual(frames[2]);
  });

  it('turns positively about the hinge to fold the chain', () => {
    const frames = chainFrames(chain(), elbow, scene);
    expectClose(rotate(frames[0] as Quat, Z), [0, 0, 1]);
    expectClose(rotate(frames[0] as Quat, Y), [0, 1, 0]);
  });

  it('takes other axes for aim and up when told to', () => {
    const frames = chainFrames(
      chain({ orient: { rule: 'chain', aim: '-y', up: '+z', toward: null, like: null } }),
      elbow,
      scene,
    );
    expectClose(rotate(frames[1] as Quat, [0, -1, 0]), [0.8, 0.6, 0]);
    // The third axis, aim × up, is the hinge.
    expectClose(rotate(frames[1] as Quat, [-1, 0, 0]), [0, 0, 1]);
  });

  it('leans the up axis to a given direction', () => {
    const frames = chainFrames(
      chain({ orient: { rule: 'chain', aim: '+x', up: '+y', toward: [0, 0, -2], like: null } }),
      elbow,
      scene,
    );
    expectClose(rotate(frames[0] as Quat, Y), [0, 0, -1]);
  });

  it('leans the up axis of a straight chain to the scene’s up, or forward for an upright one', () => {
    const level = chainFrames(
      chain(),
      [
        [0, 0, 0],
        [0, 0, 1],
        [0, 0, 2],
      ],
      scene,
    );
    expectClose(rotate(level[0] as Quat, Y), [0, 1, 0]);
    const upright = chainFrames(
      chain(),
      [
        [0, 0, 0],
        [0, 1, 0],
        [0, 2, 0],
      ],
      scene,
    );
    expectClose(rotate(upright[0] as Quat, Y), [0, 0, 1]);
  });

  it('keeps the scene’s axes by the rule world', () => {
    const frames = chainFrames(
      chain({ orient: { rule: 'world', aim: '+x', up: '+y', toward: null, like: null } }),
      elbow,
      scene,
    );
    expect(frames).toEqual(elbow.map(() => [0, 0, 0, 1]));
  });

  const coordinate = fc.double({ min: -50, max: 50, noNaN: true });
  const walk = fc
    .array(fc.tuple(coordinate, coordinate, coordinate), { minLength: 2, maxLength: 12 })
    .map((steps) => {
      const points: Vec3[] = [[0, 0, 0]];
      for (const [x, y, z] of steps) {
        const [px, py, pz] = points[points.length - 1] as Vec3;
        points.push([px + x, py + y, pz + z + 0.1]);
      }
      return points;
    })
    .filter((points) =>
      points.every(
        (point, index) =>
          index === 0 || normalise(sub(point, points[index - 1] as Vec3)).some((part) => part !== 0),
      ),
    );

  it('aims along the bone and never flips the hinge between neighbours less than a right angle apart', () => {
    fc.assert(
      fc.property(walk, (points) => {
        const frames = chainFrames(chain(), points, scene);
        for (let index = 0; index + 1 < points.length; index += 1) {
          const aim = normalise(sub(points[index + 1] as Vec3, points[index] as Vec3));
          expect(dot(rotate(frames[index] as Quat, X), aim)).toBeCloseTo(1, 9);
          const before = frames[index - 1];
          if (!before) continue;
          const bend = dot(rotate(before, X), aim);
          const hinges = dot(rotate(before, Z), rotate(frames[index] as Quat, Z));
          // The smallest turn moves a direction by at most the bend itself.
          expect(hinges).toBeGreaterThanOrEqual(Math.min(bend, 1) - 1e-9);
        }
      }),
    );
  });

  const mirror = ([x, y, z]: Vec3): Vec3 => [-x, y, z];
  const turn: Quat = [0.18257418583505536, 0.3651483716701107, 0.5477225575051661, 0.7302967433402214];

  it('mirrors by behaviour: the same local turn gives the mirrored pose', () => {
    fc.assert(
      fc.property(walk, (points) => {
        const left = chainFrames(chain(), points, scene);
        const right = chainFrames(chain({ side: 'right' }), points.map(mirror), scene);
        left.forEach((frame, index) => {
          const local: Vec3 = [0.3, -0.5, 0.8];
          const onLeft = rotate(multiplyQuat(frame, turn), local);
          // By behaviour the right frame's axes point the other way round, so the same thing lies at −local.
          const onRight = rotate(multiplyQuat(right[index] as Quat, turn), [-0.3, 0.5, -0.8]);
          expectClose(onRight, mirror(onLeft), 9);
        });
      }),
    );
  });

  it('mirrors by orientation: aim and up are mirror images', () => {
    const left = chainFrames(chain({ mirror: 'orientation' }), elbow, scene);
    const right = chainFrames(chain({ side: 'right', mirror: 'orientation' }), elbow.map(mirror), scene);
    left.forEach((frame, index) => {
      expectClose(rotate(right[index] as Quat, X), mirror(rotate(frame, X)));
      expectClose(rotate(right[index] as Quat, Y), mirror(rotate(frame, Y)));
    });
  });

  it('mirrors by world: both sides are turned alike', () => {
    const left = chainFrames(chain({ mirror: 'world' }), elbow, scene);
    const right = chainFrames(chain({ side: 'right', mirror: 'world' }), elbow.map(mirror), scene);
    expect(right).toEqual(left);
  });
});
