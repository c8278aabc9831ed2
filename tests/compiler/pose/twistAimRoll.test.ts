import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eulerToQuat, quatToEuler } from '@/compiler/math/euler';
import { rotationOf } from '@/compiler/math/mat4';
import { multiplyQuat, quatFromAxisAngle, rotate } from '@/compiler/math/quat';
import { distance, dot, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { Rig, Vec3 } from '@/compiler/rig/Rig';
import { degrees, direction, point } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { control, joint, rigOf } from './rigParts';
import { solver } from './solvers';
import { matrixIn, positionIn, worldOf } from './worldOf';

const angle = fc.double({ min: -179, max: 179, noNaN: true });
const number = (name: string, value = 0) => ({
  name,
  default: value,
  min: null,
  max: null,
  labels: null,
  note: null,
});

describe('twist joints', () => {
  const rig = rigOf(
    [
      control('turn', {}),
      joint('fore', { at: [0, 10, 0] }),
      joint('one', { parent: 'fore', at: [5, 0, 0] }),
      joint('two', { parent: 'fore', at: [10, 0, 0] }),
      joint('hand', { parent: 'fore', at: [15, 0, 0] }),
    ],
    {
      constraints: [
        {
          id: 'c',
          name: 'c',
          kind: 'orient',
          target: 'hand',
          sources: [{ node: 'turn', weight: 1 }],
          blend: null,
          keepOffset: true,
        },
      ],
      solvers: [
        solver.twist({
          joints: ['one', 'two'],
          shares: [1 / 3, 2 / 3],
          bone: 'fore',
          tip: 'hand',
          base: 'fore',
          driver: 'hand',
        }),
      ],
    },
  );

  it('take their share of a pure twist', () => {
    fc.assert(
      fc.property(angle, (rx) => {
        const world = worldOf(rig, { turn: { rx } });
        expectSameRotation(rotationOf(matrixIn(world, 'one')), eulerToQuat([rx / 3, 0, 0], 'xyz'), 1e-9);
        expectSameRotation(
          rotationOf(matrixIn(world, 'two')),
          eulerToQuat([(2 * rx) / 3, 0, 0], 'xyz'),
          1e-9,
        );
      }),
    );
  });

  it('take nothing of a swing, and the twist alone of both together', () => {
    fc.assert(
      fc.property(angle, fc.double({ min: -170, max: 170, noNaN: true }), direction, (rx, bend, [, y, z]) => {
        fc.pre(Math.hypot(y, z) > 0.1);
        // swing · twist, the twist about the bone first; the swing's axis lies across it.
        const swing = quatFromAxisAngle([0, y, z], (bend * Math.PI) / 180);
        const turned: Rig = {
          ...rig,
          nodes: rig.nodes.map((node) =>
            node.name === 'turn'
              ? { ...node, turn: multiplyQuat(swing, eulerToQuat([rx, 0, 0], 'xyz')) }
              : node,
          ),
        };
        const bare: Rig = {
          ...turned,
          constraints: turned.constraints.map((constraint) => ({ ...constraint, keepOffset: false })),
        };
        const world = worldOf(bare);
        const expected = eulerToQuat([rx / 3, 0, 0], 'xyz');
        // The rest of hand against fore is identity, so the turn of the control is the whole rotation.
        expectSameRotation(rotationOf(matrixIn(world, 'one')), expected, 1e-6);
      }),
    );
  });
});

describe('a swing of half a turn', () => {
  it('leaves no twist, however the bone lies', () => {
    const bone: Vec3 = normalise([0.3, 0.7, -0.2]);
    const foreTurn = quatFromAxisAngle([1, 2, 3], 0.7);
    for (let step = 0; step < 8; step += 1) {
      const across = normalise(rejectFrom([Math.cos(step), Math.sin(step), 0.4], bone));
      const half = quatFromAxisAngle(rotate(foreTurn, across), Math.PI);
      const rig = rigOf(
        [
          control('turn'),
          joint('fore', { turn: foreTurn }),
          joint('one', { parent: 'fore', at: scale(bone, 5) }),
          joint('hand', { parent: 'fore', at: scale(bone, 10) }),
        ],
        {
          constraints: [
            {
              id: 'c',
              name: 'c',
              kind: 'orient',
              target: 'hand',
              sources: [{ node: 'turn', weight: 1 }],
              blend: null,
              keepOffset: true,
            },
          ],
          solvers: [
            solver.twist({
              joints: ['one'],
              shares: [0.5],
              bone: 'fore',
              tip: 'hand',
              base: 'fore',
              driver: 'hand',
            }),
          ],
        },
      );
      const [rx, ry, rz] = quatToEuler(half, 'xyz');
      const world = worldOf(rig, { turn: { rx, ry, rz } });
      expectSameRotation(rotationOf(matrixIn(world, 'one')), foreTurn, 1e-9);
    }
  });
});

describe('an aim solver', () => {
  const nodes = [
    control('goal', { at: [0, 5, 30] }),
    control('up', { at: [0, 40, 0] }),
    joint('eye', { at: [0, 5, 0] }),
  ];
  const free = rigOf(nodes, { solvers: [solver.aim({ joint: 'eye', goal: 'goal' })] });
  const upright = rigOf(nodes, { solvers: [solver.aim({ joint: 'eye', goal: 'goal', pole: 'up' })] });

  it.each([
    ['free', free],
    ['upright', upright],
  ])('%s: points at its goal and keeps rest', (_, rig) => {
    expectSameRotation(rotationOf(matrixIn(worldOf(rig), 'eye')), [0, 0, 0, 1], 1e-12);
    fc.assert(
      fc.property(point, (to) => {
        fc.pre(distance(to, [0, 5, 0]) > 0.1);
        const world = worldOf(rig, { goal: { tx: to[0], ty: to[1] - 5, tz: to[2] - 30 } });
        const ahead = rotate(rotationOf(matrixIn(world, 'eye')), [0, 0, 1]);
        expectNear(ahead, normalise(sub(to, [0, 5, 0])), 1e-9);
      }),
    );
  });

  it('upright: keeps the pole in its plane', () => {
    fc.assert(
      fc.property(direction, (toward) => {
        fc.pre(Math.hypot(toward[0], toward[2]) > 0.05);
        const [x, y, z] = normalise(toward);
        const world = worldOf(upright, { goal: { tx: 20 * x, ty: 20 * y, tz: 20 * z - 30 } });
        const side = rotate(rotationOf(matrixIn(world, 'eye')), [1, 0, 0]);
        expect(Math.abs(dot(side, [0, 1, 0]))).toBeLessThan(1e-9);
      }),
    );
  });
});

describe('a foot', () => {
  const nodes = [
    control('foot', { at: [6, 8, 0], attributes: [number('roll'), number('bank')] }),
    joint('ankle', { parent: 'foot', at: [0, 0, 0] }),
    joint('toes', { parent: 'foot', at: [0, -8, 8] }),
  ];
  const rig = rigOf(nodes, { solvers: [solver.footRoll({})] });
  const world = (pose: Readonly<Record<string, number>>) => worldOf(rig, { foot: pose });

  it('keeps rest', () => {
    expectNear(positionIn(world({}), 'ankle'), [6, 8, 0]);
    expectNear(positionIn(world({}), 'toes'), [6, 0, 8]);
  });

  it('rolls over the ball up to the break angle: the toes stay, the heel rises', () => {
    const rolled = world({ roll: 20 });
    expectNear(positionIn(rolled, 'toes'), [6, 0, 8]);
    expectSameRotation(rotationOf(matrixIn(rolled, 'toes')), [0, 0, 0, 1]);
    expect(positionIn(rolled, 'ankle')[1]).toBeGreaterThan(8.5);
    // The ankle stays as far from the ball as it was.
    expect(distance(positionIn(rolled, 'ankle'), [6, 0, 8])).toBeCloseTo(Math.hypot(8, 8), 12);
    expectSameRotation(rotationOf(matrixIn(rolled, 'ankle')), eulerToQuat([20, 0, 0], 'xyz'));
  });

  it('beyond it lifts the toes about their tip', () => {
    const rolled = world({ roll: 50 });
    expectSameRotation(rotationOf(matrixIn(rolled, 'toes')), eulerToQuat([20, 0, 0], 'xyz'));
    expect(distance(positionIn(rolled, 'toes'), [6, 0, 14])).toBeCloseTo(6, 12);
    expectSameRotation(rotationOf(matrixIn(rolled, 'ankle')), eulerToQuat([50, 0, 0], 'xyz'));
  });

  it('rolls back over the heel', () => {
    const rolled = world({ roll: -25 });
    const heel: Vec3 = [6, 0, -4];
    expect(distance(positionIn(rolled, 'ankle'), heel)).toBeCloseTo(Math.hypot(8, 4), 12);
    expect(positionIn(rolled, 'toes')[1]).toBeGreaterThan(1);
  });

  it('banks over its outer and inner edges, the other one rising', () => {
    const out = world({ bank: 15 });
    expect(distance(positionIn(out, 'ankle'), [10, 0, 6])).toBeCloseTo(Math.hypot(4, 8, 6), 12);
    const inward = world({ bank: -15 });
    expect(distance(positionIn(inward, 'ankle'), [2, 0, 6])).toBeCloseTo(Math.hypot(4, 8, 6), 12);
    // Positive bank leans outward: the ankle moves to the outer side.
    expect(positionIn(out, 'ankle')[0]).toBeGreaterThan(6);
    expect(positionIn(inward, 'ankle')[0]).toBeLessThan(6);
  });

  it('is carried by its control, once', () => {
    fc.assert(
      fc.property(
        point,
        degrees,
        fc.double({ min: -40, max: 80, noNaN: true }),
        ([tx, ty, tz], [rx, ry, rz], roll) => {
          const plain = world({ roll });
          const carried = world({ roll, tx, ty, tz, rx, ry, rz });
          const [from, to] = [matrixIn(plain, 'foot'), matrixIn(carried, 'foot')];
          for (const name of ['ankle', 'toes']) {
            const local = sub(positionIn(plain, name), [from[12], from[13], from[14]]);
            const expected = [0, 1, 2].map(
              (row) =>
                (to[row] as number) * local[0] +
                (to[row + 4] as number) * local[1] +
                (to[row + 8] as number) * local[2] +
                (to[row + 12] as number),
            );
            expectNear(positionIn(carried, name), expected, 1e-9);
          }
        },
      ),
    );
  });
});
