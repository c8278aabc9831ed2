import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rotationOf, transformPoint } from '@/compiler/math/mat4';
import { dot, length, normalise, rejectFrom, sub } from '@/compiler/math/vec3';
import type { Quat, Rig, Vec3 } from '@/compiler/rig/Rig';
import { direction } from '../math/arbitraries';
import { expectNear } from '../math/expectNear';
import { type Limb, limb, limbRig, sizeOf } from './limbs';
import { control } from './rigParts';
import { matrixIn, positionIn, worldOf } from './worldOf';

describe('blend', () => {
  const bent: Limb = {
    points: [
      [0, 0, 0],
      [1, 0, 1],
      [2, 0, 0],
    ],
    turns: [
      [0, 0, 0, 1],
      [0, 0, 0, 1],
      [0, 0, 0, 1],
    ],
    goal: { at: [2, 0, 0], turn: [0, 0, 0, 1] },
    pole: [1, 0, 5],
    blend: { control: 'goal', attribute: 'reach' },
  };
  const moved = { tx: -0.5, ty: 0.5 };

  it('0 leaves the joints their own pose, 1 solves in full, the default counts when none is given', () => {
    const rig = limbRig(bent);
    const own = worldOf({ ...rig, solvers: [] }, { goal: moved });
    expect(worldOf(rig, { goal: { ...moved, reach: 0 } })).toEqual(own);
    const solved = worldOf(rig, { goal: { ...moved, reach: 1 } });
    expectNear(positionIn(solved, 'end'), [1.5, 0.5, 0]);
    expect(worldOf(rig, { goal: moved })).toEqual(solved);
    expect(worldOf(rig, { goal: { ...moved, reach: 7 } })).toEqual(solved);
  });

  it('between, turns each joint half-way on the shorter arc', () => {
    const rig = limbRig(bent);
    const local = (reach: number): Quat =>
      rotationOf(matrixIn(worldOf(rig, { goal: { ...moved, reach } }), 'start'));
    const angleTo = (a: Quat, b: Quat): number =>
      2 * Math.acos(Math.min(1, Math.abs(a.reduce((sum, v, i) => sum + v * (b[i] ?? 0), 0))));
    const [own, half, full] = [local(0), local(0.5), local(1)];
    expect(angleTo(own, half)).toBeCloseTo(angleTo(half, full), 9);
    expect(angleTo(own, half) + angleTo(half, full)).toBeCloseTo(angleTo(own, full), 9);
  });

  it('does not depend on how the joints were turned when it solves in full', () => {
    const rig = limbRig(bent);
    const twisted: Rig = {
      ...rig,
      nodes: [...rig.nodes.slice(0, 4), control('fk', { parent: 'root' }), ...rig.nodes.slice(4)],
      constraints: ['start', 'mid'].map((target) => ({
        id: target,
        name: `${target}_fk`,
        kind: 'orient',
        target,
        sources: [{ node: 'fk', weight: 1 }],
        blend: null,
        keepOffset: true,
      })),
    };
    const plain = worldOf(rig, { goal: moved });
    const after = worldOf(twisted, { goal: moved, fk: { rx: 40, ry: -30, rz: 70 } });
    for (const name of ['start', 'mid', 'end'])
      expectNear(after.get(name) ?? [], plain.get(name) ?? [], 1e-12);
  });
});

describe('the root', () => {
  it('carries the whole limb exactly once, turned, moved and scaled alike', () => {
    const pose = { root: { tx: 30, ty: -4, tz: 7, rx: 25, ry: 130, rz: -60, sx: 1.5, sy: 1.5, sz: 1.5 } };
    fc.assert(
      fc.property(limb, direction, (one, toward) => {
        const rig = limbRig(one);
        const [tx, ty, tz] = toward;
        const still = worldOf(rig, { goal: { tx, ty, tz } });
        const carried = worldOf(rig, { ...pose, goal: { tx, ty, tz } });
        const root = carried.get('root');
        if (root === undefined) throw new Error('no root');
        const line = sub(positionIn(still, 'goal'), positionIn(still, 'start'));
        fc.pre(length(line) > 0.5);
        fc.pre(Math.abs(dot(normalise(sub(one.pole, one.points[0])), normalise(line))) < 0.999);
        // Near full reach and near the closest fold the bend goes with a square root, which magnifies rounding.
        const joints = (['start', 'mid', 'end'] as const).map((name) => positionIn(still, name));
        const [shoulder, elbow] = joints as [Vec3, Vec3, Vec3];
        fc.pre(length(rejectFrom(sub(elbow, shoulder), normalise(line))) > 0.1);
        for (const name of ['start', 'mid', 'end']) {
          const expected = transformPoint(root, positionIn(still, name));
          expectNear(positionIn(carried, name), expected, sizeOf(one) * 1e-8);
        }
      }),
    );
  });

  it('does not break the solver when it is scaled to nothing', () => {
    const rig = limbRig({
      points: [
        [0, 0, 0],
        [1, 0, 1],
        [2, 0, 0],
      ],
      turns: [
        [0, 0, 0, 1],
        [0, 0, 0, 1],
        [0, 0, 0, 1],
      ],
      goal: { at: [2, 0, 0], turn: [0, 0, 0, 1] },
      pole: [1, 0, 5],
    });
    const world = worldOf(rig, { root: { sx: 0, sy: 0, sz: 0 } });
    for (const matrix of world.values()) expect(matrix.every(Number.isFinite)).toBe(true);
  });

  it('scaled unevenly, still lets the hand meet its goal', () => {
    const rig = limbRig({
      points: [
        [0, 0, 0],
        [1, 0, 1],
        [2, 0, 0],
      ],
      turns: [
        [0, 0, 0, 1],
        [0, 0, 0, 1],
        [0, 0, 0, 1],
      ],
      goal: { at: [2, 0, 0], turn: [0, 0, 0, 1] },
      pole: [1, 0, 5],
    });
    const world = worldOf(rig, { root: { sx: 2, sy: 1, sz: 1 }, goal: { tx: -0.4, ty: 0.5 } });
    expectNear(positionIn(world, 'end'), positionIn(world, 'goal'), 1e-12);
  });
});
