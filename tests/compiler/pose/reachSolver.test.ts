import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rotationOf } from '@/compiler/math/mat4';
import { add, cross, distance, dot, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { PoseValues, ReachSolver, Rig, Vec3 } from '@/compiler/rig/Rig';
import { direction, point, rotation } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { control, joint, rigOf } from './rigParts';
import { solver } from './solvers';
import { matrixIn, positionIn, worldOf } from './worldOf';

const NAMES = ['a', 'b', 'c', 'd', 'e', 'f'];

/** A chain through the given points beneath a girdle, with a goal at its end and a pole. */
function chainRig(points: readonly Vec3[], pole: Vec3, given: Partial<ReachSolver> = {}): Rig {
  const names = NAMES.slice(0, points.length);
  const end = points[points.length - 1] as Vec3;
  return rigOf(
    [
      control('root'),
      control('goal', {
        parent: 'root',
        at: end,
        attributes: [
          { name: 'bias', default: 0, min: -1, max: 1, labels: null, note: null },
          { name: 'blend', default: 1, min: 0, max: 1, labels: null, note: null },
        ],
      }),
      control('pole', { parent: 'root', at: pole }),
      ...points.map((at, index) =>
        joint(names[index] as string, {
          parent: index === 0 ? 'root' : (names[index - 1] as string),
          at: index === 0 ? at : sub(at, points[index - 1] as Vec3),
        }),
      ),
    ],
    {
      solvers: [
        solver.reach({
          joints: names,
          goal: 'goal',
          pole: 'pole',
          bias: { control: 'goal', attribute: 'bias' },
          blend: { control: 'goal', attribute: 'blend' },
          ...given,
        }),
      ],
    },
  );
}

const leg: readonly Vec3[] = [
  [0, 100, 0],
  [0, 60, 12],
  [0, 25, -14],
  [0, 0, 0],
];
const move = (to: Vec3, from: Vec3 = leg[3] as Vec3): Readonly<Record<string, number>> => {
  const [tx, ty, tz] = sub(to, from);
  return { tx, ty, tz };
};
const lengthsOf = (points: readonly Vec3[]): readonly number[] =>
  points.slice(1).map((at, index) => distance(at, points[index] as Vec3));
const placesOf = (rig: Rig, pose: PoseValues, count: number): readonly Vec3[] => {
  const world = worldOf(rig, pose);
  return NAMES.slice(0, count).map((name) => positionIn(world, name));
};

describe('a reach chain', () => {
  it('keeps rest, whatever its bends', () => {
    fc.assert(
      fc.property(
        fc.array(direction, { minLength: 3, maxLength: 5 }),
        point,
        direction,
        (steps, start, away) => {
          const points = [start];
          for (const step of steps) {
            points.push(add(points[points.length - 1] as Vec3, scale(normalise(step), 20)));
          }
          fc.pre(distance(start, points[points.length - 1] as Vec3) > 1);
          const rig = chainRig(points, add(start, scale(normalise(away), 80)));
          placesOf(rig, {}, points.length).forEach((at, index) => {
            expectNear(at, points[index] as Vec3, 1e-9 * (length(start) + 100));
          });
        },
      ),
    );
  });

  it('meets every goal between its rest and full reach, bones as long as before', () => {
    const rig = chainRig(leg, [0, 60, 60]);
    const bones = lengthsOf(leg);
    const full = bones.reduce((sum, bone) => sum + bone, 0);
    fc.assert(
      fc.property(direction, fc.double({ min: 0.35, max: 0.999, noNaN: true }), (toward, share) => {
        const goal = add(leg[0] as Vec3, scale(normalise(toward), share * full));
        const places = placesOf(rig, { goal: move(goal) }, 4);
        expectNear(places[3] as Vec3, goal, 1e-9 * full);
        expectNear(lengthsOf(places), bones, 1e-9 * full);
      }),
    );
  });

  it('lies straight toward a goal out of reach', () => {
    const rig = chainRig(leg, [0, 60, 60]);
    const full = lengthsOf(leg).reduce((sum, bone) => sum + bone, 0);
    const places = placesOf(rig, { goal: move([500, 100, 0]) }, 4);
    expectNear(places[3] as Vec3, [full, 100, 0], 1e-5);
    expect(length(rejectFrom(sub(places[1] as Vec3, [0, 100, 0]), [1, 0, 0]))).toBeLessThan(1e-5);
  });

  it('folds all bends in proportion when the goal comes nearer', () => {
    const rig = chainRig(leg, [0, 60, 60]);
    const bendsOf = (places: readonly Vec3[]): readonly number[] => {
      const bones = places.slice(1).map((at, index) => normalise(sub(at, places[index] as Vec3)));
      return bones.slice(1).map((bone, index) => {
        const before = bones[index] as Vec3;
        return Math.atan2(length(cross(before, bone)), dot(before, bone));
      });
    };
    const [kneeAtRest = 0, hockAtRest = 0] = bendsOf(leg);
    const [knee = 0, hock = 0] = bendsOf(placesOf(rig, { goal: move([0, 25, 0]) }, 4));
    expect(knee).toBeGreaterThan(kneeAtRest);
    expect(knee / kneeAtRest).toBeCloseTo(hock / hockAtRest, 9);
    const led = bendsOf(placesOf(rig, { goal: { ...move([0, 25, 0]), bias: 0.5 } }, 4));
    expect((led[0] as number) / kneeAtRest).toBeGreaterThan((led[1] as number) / hockAtRest);
  });

  it('agrees with the closed form where there are three joints’ worth of bends', () => {
    // A bone whose second half is a straight continuation has one bend; two_bone solves the same triangle.
    const points: readonly Vec3[] = [
      [0, 30, 0],
      [0, 20, 5],
      [0, 10, 10],
      [0, -10, 0],
    ];
    const reach = chainRig(points, [0, 10, 60]);
    const [a, , c, d] = points as [Vec3, Vec3, Vec3, Vec3];
    const closed = rigOf(
      [
        control('root'),
        control('goal', { parent: 'root', at: d }),
        control('pole', { parent: 'root', at: [0, 10, 60] }),
        joint('a', { parent: 'root', at: a }),
        joint('c', { parent: 'a', at: sub(c, a) }),
        joint('d', { parent: 'c', at: sub(d, c) }),
      ],
      { solvers: [solver.twoBone({ start: 'a', mid: 'c', end: 'd', goal: 'goal', pole: 'pole' })] },
    );
    fc.assert(
      fc.property(direction, fc.double({ min: 16, max: 44, noNaN: true }), (toward, size) => {
        const pose = { goal: move(add(a, scale(normalise(toward), size)), d) };
        // On the line to the pole neither has a plane.
        const line = normalise(toward);
        fc.pre(length(rejectFrom(normalise(sub([0, 10, 60], a)), line)) > 0.01);
        const world = worldOf(reach, pose);
        const expected = worldOf(closed, pose);
        for (const name of ['c', 'd']) expectNear(positionIn(world, name), positionIn(expected, name), 1e-7);
      }),
    );
  });

  it('turns with what carries the whole rig', () => {
    fc.assert(
      fc.property(rotation, point, (turn, at) => {
        const rig = chainRig(leg, [0, 60, 60]);
        const turned: Rig = {
          ...rig,
          nodes: rig.nodes.map((node) => (node.name === 'root' ? { ...node, at, turn } : node)),
        };
        const pose = { goal: { tx: 12, ty: 20, tz: -5 } };
        const plain = worldOf(rig, pose);
        const carried = worldOf(turned, pose);
        const root = matrixIn(carried, 'root');
        for (const name of ['b', 'c', 'd']) {
          const [x, y, z] = positionIn(plain, name);
          const expected = [0, 1, 2].map(
            (row) =>
              (root[row] as number) * x +
              (root[row + 4] as number) * y +
              (root[row + 8] as number) * z +
              (root[row + 12] as number),
          );
          expectNear(positionIn(carried, name), expected, 1e-8);
        }
      }),
    );
  });

  it('at blend 0 leaves every joint as it is', () => {
    const rig = chainRig(leg, [0, 60, 60]);
    const world = worldOf(rig, { goal: { tx: 30, blend: 0 } });
    for (const name of ['a', 'b', 'c', 'd']) {
      expectSameRotation(rotationOf(matrixIn(world, name)), [0, 0, 0, 1], 1e-12);
    }
  });

  it('lets a straight chain bend to its pole', () => {
    const straight: readonly Vec3[] = [
      [0, 90, 0],
      [0, 60, 0],
      [0, 30, 0],
      [0, 0, 0],
    ];
    const rig = chainRig(straight, [0, 45, 60]);
    expectNear(placesOf(rig, {}, 4).flat(), straight.flat(), 1e-9);
    const places = placesOf(rig, { goal: { ty: 30 } }, 4);
    expectNear(places[3] as Vec3, [0, 30, 0], 1e-9);
    for (const at of places.slice(1, 3)) expect(at[2]).toBeGreaterThan(1);
  });

  it('stretches to a goal out of reach, within its limit', () => {
    const rig = chainRig(leg, [0, 60, 60], { stretch: 1, stretchLimit: 1.25 });
    const full = lengthsOf(leg).reduce((sum, bone) => sum + bone, 0);
    const near: Vec3 = [0, 100 - full * 1.2, 0];
    expectNear(placesOf(rig, { goal: move(near) }, 4)[3] as Vec3, near, 1e-6);
    const far = placesOf(rig, { goal: move([0, 100 - full * 3, 0]) }, 4);
    expect(distance(far[0] as Vec3, far[3] as Vec3)).toBeCloseTo(full * 1.25, 6);
  });
});

describe('soft reach', () => {
  const rig = chainRig(leg, [0, 60, 60], { soft: 0.2 });
  const full = lengthsOf(leg).reduce((sum, bone) => sum + bone, 0);

  it('is monotone and never quite at full reach', () => {
    let before = 0;
    for (let share = 0.5; share < 3; share += 0.05) {
      const places = placesOf(rig, { goal: move([0, 100 - share * full, 0]) }, 4);
      const reached = distance(places[0] as Vec3, places[3] as Vec3);
      expect(reached).toBeGreaterThanOrEqual(before - 1e-9);
      expect(reached).toBeLessThan(full + 1e-9);
      before = reached;
    }
  });

  it('follows its formula', () => {
    // b + z (1 − e^((b − D) / z)): the common exponential ease, common practice.
    const rest = distance(leg[0] as Vec3, leg[3] as Vec3) / full;
    const zone = Math.min(0.2, 1 - rest) * full;
    const begin = full - zone;
    const asked = full * 1.05;
    const places = placesOf(rig, { goal: move([0, 100 - asked, 0]) }, 4);
    const expected = begin + zone * (1 - Math.exp((begin - asked) / zone));
    expect(distance(places[0] as Vec3, places[3] as Vec3)).toBeCloseTo(expected, 8);
  });
});
