import fc from 'fast-check';
import { Object3D, Quaternion, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { rotationOf } from '@/compiler/math/mat4';
import { conjugateQuat, mirrorQuatX, multiplyQuat, rotate } from '@/compiler/math/quat';
import { cross, distance, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { Quat, Vec3 } from '@/compiler/rig/Rig';
import { direction } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { type Limb, limb, limbRig, sizeOf } from './limbs';
import { matrixIn, positionIn, worldOf } from './worldOf';

describe('reaching', () => {
  const move = fc.tuple(direction, fc.double({ min: 0, max: 40, noNaN: true }));

  it('keeps both lengths, and meets every goal within reach', () => {
    fc.assert(
      fc.property(limb, move, (one, [toward, far]) => {
        const rig = limbRig(one);
        const [tx, ty, tz] = rotate(conjugateQuat(one.goal.turn), scale(toward, far));
        const world = worldOf(rig, { goal: { tx, ty, tz } });
        const [start, mid, end] = (['start', 'mid', 'end'] as const).map((name) =>
          positionIn(world, name),
        ) as [Vec3, Vec3, Vec3];
        const upper = distance(one.points[0], one.points[1]);
        const lower = distance(one.points[1], one.points[2]);
        const tolerance = sizeOf(one) * 1e-9;
        expect(Math.abs(distance(start, mid) - upper)).toBeLessThan(tolerance);
        expect(Math.abs(distance(mid, end) - lower)).toBeLessThan(tolerance);
        const asked = distance(start, positionIn(world, 'goal'));
        const reached = Math.min(upper + lower, Math.max(Math.abs(upper - lower), asked));
        expect(Math.abs(distance(start, end) - reached)).toBeLessThan(tolerance);
        expect(distance(end, positionIn(world, 'goal'))).toBeLessThan(Math.abs(asked - reached) + tolerance);
      }),
    );
  });

  it('puts the joints where three.js 0.187 (MIT) measures them for the same local rotations', () => {
    fc.assert(
      fc.property(limb, move, (one, [toward, far]) => {
        const rig = limbRig(one);
        const [tx, ty, tz] = scale(toward, far);
        const world = worldOf(rig, { goal: { tx, ty, tz }, girdle: { rx: 20, tz: 3 } });
        // Local rotations are read from our world matrices; the places follow from three's own chain of objects.
        let above = new Object3D();
        const m = world.get('girdle');
        if (m === undefined) throw new Error('no girdle');
        above.position.set(m[12], m[13], m[14]);
        above.quaternion.copy(new Quaternion(...rotationOf(m)));
        const top = above;
        let aboveTurn = rotationOf(m);
        for (const name of ['start', 'mid', 'end']) {
          const node = rig.nodes.find((candidate) => candidate.name === name);
          const matrix = world.get(name);
          if (node === undefined || matrix === undefined) throw new Error(`no ${name}`);
          const object = new Object3D();
          object.name = name;
          object.position.set(...node.at);
          object.quaternion.copy(
            new Quaternion(...multiplyQuat(conjugateQuat(aboveTurn), rotationOf(matrix))),
          );
          above.add(object);
          above = object;
          aboveTurn = rotationOf(matrix);
        }
        top.updateMatrixWorld(true);
        for (const name of ['start', 'mid', 'end']) {
          const theirs = top.getObjectByName(name)?.getWorldPosition(new Vector3()).toArray() ?? [];
          expectNear(positionIn(world, name), theirs, sizeOf(one) * 1e-9);
        }
      }),
    );
  });

  it('follows the pole by as much as it stood off the plane at rest', () => {
    // Limb in the plane y = 0 bending to +z; the pole stands a quarter turn off, above it.
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
      pole: [1, 5, 0],
    });
    expectNear(positionIn(worldOf(rig), 'mid'), [1, 0, 1]);
    // The pole swings a quarter turn about x, from above to the front: so does the elbow, from the front to below.
    expectNear(positionIn(worldOf(rig, { pole: { ty: -5, tz: 5 } }), 'mid'), [1, -1, 0]);
  });

  it('bends a limb that is straight but for rounding toward the pole, not where rounding left its elbow', () => {
    const rig = limbRig({
      points: [
        [0, 0, 0],
        [1, -1e-10, 1e-10],
        [2, 0, 0],
      ],
      turns: [
        [0, 0, 0, 1],
        [0, 0, 0, 1],
        [0, 0, 0, 1],
      ],
      goal: { at: [2, 0, 0], turn: [0, 0, 0, 1] },
      pole: [1, 3, 0],
    });
    const [x, y, z] = positionIn(worldOf(rig, { goal: { tx: -0.4 } }), 'mid');
    expectNear([x, y, z], [0.8, 0.6, 0], 1e-9);
  });

  it('carries the twist of the joints along: the hinge stays at right angles to the plane', () => {
    fc.assert(
      fc.property(limb, move, (one, [toward, far]) => {
        const rig = limbRig(one);
        const rest = worldOf({ ...rig, solvers: [] });
        const [tx, ty, tz] = scale(toward, far);
        const world = worldOf(rig, { goal: { tx, ty, tz } });
        const spread = (from: typeof world): readonly [Vec3, Vec3, Vec3] => {
          const [s, m, e] = ['start', 'mid', 'end'].map((name) => positionIn(from, name)) as [
            Vec3,
            Vec3,
            Vec3,
          ];
          return [sub(m, s), sub(e, m), cross(sub(m, s), sub(e, m))];
        };
        const before = spread(rest);
        const after = spread(world);
        fc.pre(length(before[2]) > 0.5 && length(after[2]) > 0.5);
        for (const [name, index] of [
          ['start', 0],
          ['mid', 1],
        ] as const) {
          const turn = (from: typeof world): Quat => rotationOf(matrixIn(from, name));
          const delta = multiplyQuat(turn(world), conjugateQuat(turn(rest)));
          expectNear(normalise(rotate(delta, before[index])), normalise(after[index]), 1e-7);
          expectNear(normalise(rotate(delta, before[2])), normalise(after[2]), 1e-6);
        }
      }),
    );
  });

  it('gives the mirrored pose for the mirrored limb', () => {
    const mirror = ([x, y, z]: Vec3): Vec3 => [-x, y, z];
    fc.assert(
      fc.property(limb, move, (one, [toward, far]) => {
        const [a, b, c] = one.points;
        const base = one.base ?? { at: [0, 0, 0], turn: [0, 0, 0, 1] };
        const mirrored: Limb = {
          points: [mirror(a), mirror(b), mirror(c)],
          turns: [mirrorQuatX(one.turns[0]), mirrorQuatX(one.turns[1]), mirrorQuatX(one.turns[2])],
          goal: { at: mirror(one.goal.at), turn: mirrorQuatX(one.goal.turn) },
          pole: mirror(one.pole),
          base: { at: mirror(base.at), turn: mirrorQuatX(base.turn) },
        };
        const [tx, ty, tz] = scale(toward, far);
        const left = worldOf(limbRig(one), { goal: { tx, ty, tz } });
        const right = worldOf(limbRig(mirrored), { goal: { tx: -tx, ty, tz } });
        // A goal nearly on the start or a pole nearly on the line magnifies rounding.
        const line = sub(positionIn(left, 'goal'), positionIn(left, 'start'));
        fc.pre(length(line) > 0.5);
        fc.pre(length(rejectFrom(normalise(sub(one.pole, a)), normalise(line))) > 0.01);
        for (const name of ['start', 'mid', 'end']) {
          expectNear(positionIn(right, name), mirror(positionIn(left, name)), sizeOf(one) * 1e-9);
          const [l, r] = [left.get(name), right.get(name)];
          if (l && r) expectSameRotation(rotationOf(r), mirrorQuatX(rotationOf(l)), 1e-6);
        }
      }),
    );
  });
});
