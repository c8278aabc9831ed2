import fc from 'fast-check';
import { Object3D, Quaternion, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { rotationOf, transformPoint } from '@/compiler/math/mat4';
import { conjugateQuat, mirrorQuatX, multiplyQuat, rotate } from '@/compiler/math/quat';
import { add, cross, distance, dot, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { NumberOrAttribute, Quat, Rig, Vec3 } from '@/compiler/rig/Rig';
import { direction, point, rotation } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { control, joint, rigOf } from './rigParts';
import { positionIn, worldOf } from './worldOf';

/** Where the joints and controls of one limb stand in the world at rest, and how they are turned. */
interface Limb {
  readonly points: readonly [Vec3, Vec3, Vec3];
  readonly turns: readonly [Quat, Quat, Quat];
  readonly goal: { readonly at: Vec3; readonly turn: Quat };
  readonly pole: Vec3;
  readonly blend?: NumberOrAttribute;
  readonly base?: { readonly at: Vec3; readonly turn: Quat };
}

/** A root control, a limb of three joints below a girdle, a goal, a pole, and a solver between them. */
function limbRig({ points, turns, goal, pole, blend = 1, base }: Limb): Rig {
  const [start, mid, end] = points;
  const [startTurn, midTurn, endTurn] = turns;
  const girdle = base ?? { at: [0, 0, 0], turn: [0, 0, 0, 1] };
  const below = (place: Vec3, under: Vec3, turn: Quat): Vec3 =>
    rotate(conjugateQuat(turn), sub(place, under));
  return rigOf(
    [
      control('root'),
      control('goal', {
        parent: 'root',
        ...goal,
        attributes: [{ name: 'reach', default: 1, min: 0, max: 1 }],
      }),
      control('pole', { parent: 'root', at: pole }),
      control('girdle', { parent: 'root', ...girdle }),
      joint('start', {
        parent: 'girdle',
        at: below(start, girdle.at, girdle.turn),
        turn: multiplyQuat(conjugateQuat(girdle.turn), startTurn),
      }),
      joint('mid', {
        parent: 'start',
        at: below(mid, start, startTurn),
        turn: multiplyQuat(conjugateQuat(startTurn), midTurn),
      }),
      joint('end', {
        parent: 'mid',
        at: below(end, mid, midTurn),
        turn: multiplyQuat(conjugateQuat(midTurn), endTurn),
      }),
    ],
    {
      solvers: [
        {
          kind: 'two_bone',
          id: 'arm',
          name: 'arm',
          start: 'start',
          mid: 'mid',
          end: 'end',
          goal: 'goal',
          pole: 'pole',
          blend,
        },
      ],
    },
  );
}

const bone = fc.double({ min: 1, max: 50, noNaN: true });

/** Limbs of any place, bend, joint orientation and pole, the pole off the line start–end. */
const limb: fc.Arbitrary<Limb> = fc
  .record({
    start: point,
    first: direction,
    second: direction,
    upper: bone,
    lower: bone,
    turns: fc.tuple(rotation, rotation, rotation),
    goalTurn: rotation,
    poleAway: direction,
    base: fc.record({ at: point, turn: rotation }),
  })
  .map(({ start, first, second, upper, lower, turns, goalTurn, poleAway, base }) => {
    const mid = add(start, scale(normalise(first), upper));
    const end = add(mid, scale(normalise(second), lower));
    return {
      points: [start, mid, end] as const,
      turns,
      goal: { at: end, turn: goalTurn },
      pole: add(start, scale(poleAway, 60)),
      base,
    };
  })
  .filter(({ points: [start, , end], pole }) => {
    const line = sub(end, start);
    return length(line) > 0.5 && length(rejectFrom(normalise(sub(pole, start)), normalise(line))) > 1e-3;
  });

const sizeOf = ({ points: [start, mid, end] }: Limb): number =>
  length(start) + distance(start, mid) + distance(mid, end) + 60;

/** Fails unless the solved rig stands at rest as it does without its solver. */
function expectRestKept(rig: Rig, size: number): void {
  const solved = worldOf(rig);
  for (const [name, matrix] of worldOf({ ...rig, solvers: [] })) {
    const found = solved.get(name) ?? [];
    expectNear(found.slice(12, 15), matrix.slice(12, 15), size * 1e-9);
    expectNear(found.slice(0, 12), matrix.slice(0, 12), 1e-9);
  }
}

describe('rest', () => {
  it('is a fixed point, also with the pole off the plane', () => {
    fc.assert(
      fc.property(limb, (one) => expectRestKept(limbRig(one), sizeOf(one))),
      { numRuns: 300 },
    );
  });

  it('is a fixed point of straight and nearly straight limbs, wherever they stand', () => {
    const off = fc.constantFrom(0, 1e-12, 1e-10, 3e-10, 1e-9, 1e-8, 1e-7, 1e-6, 1e-5, 1e-3);
    fc.assert(
      fc.property(limb, direction, off, (one, side, share) => {
        const [start, mid] = one.points;
        const along = normalise(sub(mid, start));
        fc.pre(length(rejectFrom(normalise(side), along)) > 0.1);
        fc.pre(length(rejectFrom(normalise(sub(one.pole, start)), along)) > 0.01);
        const upper = distance(start, mid);
        const bent = add(mid, scale(normalise(rejectFrom(side, along)), upper * share));
        const end = add(start, scale(along, upper * 2.5));
        const straight: Limb = { ...one, points: [start, bent, end], goal: { ...one.goal, at: end } };
        expectRestKept(limbRig(straight), sizeOf(straight));
      }),
      { numRuns: 300 },
    );
  });

  it('is a fixed point when the pole lies on the line, or start and end in one place', () => {
    const onLine = limbRig({
      points: [
        [0, 0, 0],
        [1, 0, 0.5],
        [2, 0, 0],
      ],
      turns: [
        [0, 0, 0, 1],
        [0, 0, 0, 1],
        [0, 0, 0, 1],
      ],
      goal: { at: [2, 0, 0], turn: [0, 0, 0, 1] },
      pole: [4, 0, 0],
    });
    expectRestKept(onLine, 4);
    const folded = limbRig({
      points: [
        [0, 0, 0],
        [1, 0, 0],
        [0, 0, 0],
      ],
      turns: [
        [0, 0, 0, 1],
        [0, 0, 0, 1],
        [0, 0, 0, 1],
      ],
      goal: { at: [0, 0, 0], turn: [0, 0, 0, 1] },
      pole: [4, 1, 0],
    });
    expectRestKept(folded, 4);
  });
});

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
          const turn = (from: typeof world): Quat =>
            rotationOf(from.get(name) ?? (Array(16).fill(0) as never));
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
      rotationOf(worldOf(rig, { goal: { ...moved, reach } }).get('start') ?? (Array(16).fill(0) as never));
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
