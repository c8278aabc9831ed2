import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eulerToQuat } from '@/compiler/math/euler';
import { rotationOf } from '@/compiler/math/mat4';
import { createPoser } from '@/compiler/pose/createPoser';
import type { PoseValues, Rig, RigDriver } from '@/compiler/rig/Rig';
import { degrees, point } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { control, joint, rigOf } from './rigParts';
import { matrixIn, positionIn, worldOf } from './worldOf';

const space = (value = 0) => ({
  name: 'space',
  default: value,
  min: 0,
  max: 2,
  labels: ['root', 'chest', 'hips'],
  note: null,
});

function spaceRig(follow: 'all' | 'turn'): Rig {
  return rigOf(
    [
      control('root'),
      control('chest', { parent: 'root', at: [0, 80, 0] }),
      control('hips', { parent: 'root', at: [0, 50, 2] }),
      control('hand', { parent: 'root', at: [40, 70, 5], attributes: [space()] }),
    ],
    {
      spaces: [
        {
          id: 'hand_space',
          name: 'hand_space',
          control: 'hand',
          attribute: 'space',
          sources: ['root', 'chest', 'hips'],
          follow,
        },
      ],
    },
  );
}

describe('spaces', () => {
  it('give the same at rest, whichever is chosen', () => {
    for (const follow of ['all', 'turn'] as const) {
      const rest = worldOf(spaceRig(follow));
      for (const chosen of [0, 1, 2, 1.4, 9]) {
        const world = worldOf(spaceRig(follow), { hand: { space: chosen } });
        for (const [name, matrix] of world) expectNear(matrix, rest.get(name) ?? [], 1e-12);
      }
    }
  });

  it('all: the chosen source carries the control, the others do not', () => {
    const rig = spaceRig('all');
    fc.assert(
      fc.property(point, degrees, ([tx, ty, tz], [rx, ry, rz]) => {
        const moved = { tx, ty, tz, rx, ry, rz };
        const still = positionIn(worldOf(rig, { hand: { space: 2 }, chest: moved }), 'hand');
        expectNear(still, [40, 70, 5], 1e-12);
        const world = worldOf(rig, { hand: { space: 1 }, chest: moved });
        const chest = matrixIn(world, 'chest');
        const expected = [0, 1, 2].map(
          (row) =>
            (chest[row] as number) * 40 +
            (chest[row + 4] as number) * -10 +
            (chest[row + 8] as number) * 5 +
            (chest[row + 12] as number),
        );
        expectNear(positionIn(world, 'hand'), expected, 1e-9);
      }),
    );
  });

  it('turn: the chosen source turns the control and leaves its place to the parent', () => {
    const rig = spaceRig('turn');
    const world = worldOf(rig, { hand: { space: 1 }, chest: { tx: 30, ry: 50 } });
    expectNear(positionIn(world, 'hand'), [40, 70, 5], 1e-9);
    expectSameRotation(rotationOf(matrixIn(world, 'hand')), eulerToQuat([0, 50, 0], 'xyz'), 1e-9);
  });
});

function driven(given: Partial<RigDriver>): Rig {
  const driver: RigDriver = {
    id: 'd',
    name: 'd',
    control: 'grip',
    input: 'open',
    target: 'jaw',
    channel: 'tx',
    inputs: [0, 1, 3],
    outputs: [0, 10, -10],
    curve: 'linear',
    beyond: 'hold',
    ...given,
  };
  const open = { name: 'open', default: 0, min: null, max: null, labels: null, note: null };
  return rigOf([control('grip', { attributes: [open] }), joint('jaw')], { drivers: [driver] });
}
const out = (rig: Rig, open: number): number => positionIn(worldOf(rig, { grip: { open } }), 'jaw')[0];

describe('drivers', () => {
  it('meet their keys and run straight between them', () => {
    const rig = driven({});
    for (const [open, x] of [
      [0, 0],
      [0.25, 2.5],
      [1, 10],
      [2, 0],
      [3, -10],
    ] as const) {
      expect(out(rig, open)).toBeCloseTo(x, 12);
    }
  });

  it('hold or extend beyond the ends', () => {
    expect(out(driven({}), -5)).toBe(0);
    expect(out(driven({}), 9)).toBe(-10);
    expect(out(driven({ beyond: 'extend' }), -1)).toBeCloseTo(-10, 12);
    expect(out(driven({ beyond: 'extend' }), 4)).toBeCloseTo(-20, 12);
  });

  it('smooth: level at each key, 3t² − 2t³ between', () => {
    const rig = driven({ curve: 'smooth' });
    expect(out(rig, 0.25)).toBeCloseTo(10 * (3 * 0.0625 - 2 * 0.015625), 12);
    expect(Math.abs(out(rig, 1 - 1e-5) - 10)).toBeLessThan(1e-8);
  });

  it('read channels as well, within their limits', () => {
    const rig = driven({ input: 'rz', inputs: [0, 90], outputs: [0, 9] });
    expect(positionIn(worldOf(rig, { grip: { rz: 30 } }), 'jaw')[0]).toBeCloseTo(3, 12);
  });

  it('add up on one channel, and turn controls beside what the animator sets', () => {
    const turn = {
      name: 'a',
      input: 'open',
      target: 'grip',
      channel: 'rz',
      inputs: [0, 1],
      outputs: [0, 20],
    } as const;
    const rig = driven(turn);
    const twice: Rig = { ...rig, drivers: [...rig.drivers, { ...(rig.drivers[0] as RigDriver), name: 'b' }] };
    const world = worldOf(twice, { grip: { open: 0.5, rz: 5 } });
    expectSameRotation(rotationOf(matrixIn(world, 'grip')), eulerToQuat([0, 0, 25], 'xyz'), 1e-12);
  });
});

describe('evaluating', () => {
  it('forgets the pose before', () => {
    const rig = spaceRig('all');
    const poser = createPoser(rig);
    const rest = [...poser.world];
    const pose: PoseValues = { chest: { tx: 5, ry: 40 }, hand: { space: 1, tx: 3 } };
    poser.evaluate(pose);
    const posed = [...poser.world];
    expect(posed).not.toEqual(rest);
    poser.evaluate({});
    expect([...poser.world]).toEqual(rest);
    poser.evaluate(pose);
    expect([...poser.world]).toEqual(posed);
  });
});
