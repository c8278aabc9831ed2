import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { add, cross, distance, dot, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import { type RestReach, solveTwoBone } from '@/compiler/pose/twoBone';
import type { Vec3 } from '@/compiler/rig/Rig';
import { direction } from '../math/arbitraries';
import { expectNear } from '../math/expectNear';
import { readReference } from '../math/readReference';

interface Input {
  readonly start: Vec3;
  readonly goal: Vec3;
  readonly pole: Vec3;
  readonly upper: number;
  readonly lower: number;
  readonly restReach: RestReach | null;
  readonly swivel: number;
  readonly restDirection: Vec3;
  readonly restBend: Vec3;
}

/** The solver works in place; the tests read plain tuples. */
function solve(input: Input): { readonly mid: Vec3; readonly end: Vec3; readonly normal: Vec3 } {
  const out = { mid: new Float64Array(3), end: new Float64Array(3), normal: new Float64Array(3) };
  const vec = (v: Vec3): Float64Array => Float64Array.from(v);
  solveTwoBone(
    {
      ...input,
      start: vec(input.start),
      goal: vec(input.goal),
      pole: vec(input.pole),
      restDirection: vec(input.restDirection),
      restBend: vec(input.restBend),
      asked: distance(input.start, input.goal),
    },
    out,
  );
  const tuple = (v: Float64Array): Vec3 => [v[0] as number, v[1] as number, v[2] as number];
  return { mid: tuple(out.mid), end: tuple(out.end), normal: tuple(out.normal) };
}

const plain = { swivel: 0, restReach: null, restDirection: [1, 0, 0], restBend: [0, 0, 1] } as const;

describe('against worked examples', () => {
  interface PoleCase {
    readonly root: Vec3;
    readonly target: Vec3;
    readonly pole: Vec3;
    readonly l1: number;
    readonly l2: number;
    readonly degenerate_pole: boolean;
    readonly reachable: boolean;
    readonly mid?: Vec3;
    readonly plane_normal?: Vec3;
  }
  // Source: tests/data/numeric/two_bone_pole.json, law of cosines, computed independently of this code.
  const { cases } = readReference<{ cases: readonly PoleCase[] }>('two_bone_pole.json');

  it.each(cases)('root $root, target $target, pole $pole', (one) => {
    const solution = solve({
      ...plain,
      start: one.root,
      goal: one.target,
      pole: one.pole,
      upper: one.l1,
      lower: one.l2,
    });
    expect(distance(one.root, solution.mid)).toBeCloseTo(one.l1, 9);
    expect(distance(solution.mid, solution.end)).toBeCloseTo(one.l2, 9);
    if (one.mid !== undefined) expectNear(solution.mid, one.mid, 1e-9);
    if (one.plane_normal !== undefined) expectNear(solution.normal, one.plane_normal, 1e-9);
    if (one.reachable) expectNear(solution.end, one.target, 1e-9);
    // Out of reach: stretched out on the line to the target.
    else
      expectNear(
        solution.end,
        add(one.root, scale(normalise(sub(one.target, one.root)), one.l1 + one.l2)),
        1e-9,
      );
  });

  it('falls back on the rest bend when the pole lies on the line', () => {
    const degenerate = cases.filter(({ degenerate_pole }) => degenerate_pole);
    expect(degenerate).toHaveLength(1);
    for (const one of degenerate) {
      const { mid } = solve({
        ...plain,
        start: one.root,
        goal: one.target,
        pole: one.pole,
        upper: one.l1,
        lower: one.l2,
      });
      expect(normalise(rejectFrom(sub(mid, one.root), normalise(sub(one.target, one.root))))).toEqual([
        0, 0, 1,
      ]);
    }
  });

  interface PlanarCase {
    readonly l1: number;
    readonly l2: number;
    readonly target: readonly [number, number];
    readonly reachable: boolean;
    readonly solutions: readonly { readonly theta2_deg: number; readonly elbow: readonly [number, number] }[];
  }
  // Source: tests/data/numeric/two_link_ik.json, the planar two-link arm of the robotics textbooks named there.
  const planar = readReference<{ cases: readonly PlanarCase[] }>('two_link_ik.json').cases;

  it.each(planar.filter(({ reachable }) => reachable))(
    'finds both elbows for l1 $l1, l2 $l2, target $target',
    (one) => {
      expect(one.solutions.length).toBeGreaterThan(0);
      for (const { elbow } of one.solutions) {
        const [x, y] = one.target;
        const goal: Vec3 = [x, y, 0];
        const across = rejectFrom([elbow[0], elbow[1], 0], normalise(goal));
        // A straight or folded arm has no elbow side; any pole will do.
        const side: Vec3 = length(across) > 1e-9 ? normalise(across) : normalise([-y, x, 0]);
        const input: Input = {
          ...plain,
          start: [0, 0, 0],
          goal,
          pole: add(goal, scale(side, 5)),
          upper: one.l1,
          lower: one.l2,
        };
        const solution = solve(input);
        expectNear(solution.mid, [elbow[0], elbow[1], 0], 1e-9);
        expectNear(solution.end, goal, 1e-9);
      }
    },
  );

  it('stretches toward what the table calls out of reach, or folds as far as it can', () => {
    const beyond = planar.filter(({ reachable }) => !reachable);
    for (const { l1, l2, target } of beyond) {
      const goal: Vec3 = [target[0], target[1], 0];
      const { end } = solve({
        ...plain,
        start: [0, 0, 0],
        goal,
        pole: [0, 0, 9],
        upper: l1,
        lower: l2,
      });
      const nearest = Math.min(l1 + l2, Math.max(Math.abs(l1 - l2), length(goal)));
      expect(length(end)).toBeCloseTo(nearest, 9);
    }
  });
});

const bone = fc.double({ min: 0.1, max: 100, noNaN: true });
const reachable = fc
  .record({
    start: fc.tuple(bone, bone, bone),
    upper: bone,
    lower: bone,
    toward: direction,
    share: fc.double({ min: 0, max: 1, noNaN: true }),
    poleAway: direction,
    swivel: fc.double({ min: -3, max: 3, noNaN: true }),
  })
  .map(({ start, upper, lower, toward, share, poleAway, swivel }): Input => {
    const least = Math.abs(upper - lower);
    const d = least + (upper + lower - least) * share;
    const goal = add(start, scale(normalise(toward), d));
    return { ...plain, start, goal, pole: add(start, scale(poleAway, 50)), upper, lower, swivel };
  });

/** A chain that the solver may bend freely: goal and pole well away from the singular places. */
const ordinary = reachable.filter(({ start, goal, pole, upper, lower }) => {
  const toGoal = sub(goal, start);
  return (
    length(toGoal) > 0.01 * (upper + lower) &&
    length(rejectFrom(normalise(sub(pole, start)), normalise(toGoal))) > 0.01
  );
});

describe('always', () => {
  it('keeps both lengths and meets a goal within reach', () => {
    fc.assert(
      fc.property(reachable, (input) => {
        const { mid, end } = solve(input);
        const size = input.upper + input.lower;
        expect(Math.abs(distance(input.start, mid) - input.upper)).toBeLessThan(size * 1e-9);
        expect(Math.abs(distance(mid, end) - input.lower)).toBeLessThan(size * 1e-9);
        expect(distance(end, input.goal)).toBeLessThan(size * 1e-9);
      }),
    );
  });

  it('bends into the half plane of the pole when there is no swivel', () => {
    fc.assert(
      fc.property(ordinary, (input) => {
        const { mid, normal } = solve({ ...input, swivel: 0 });
        const along = normalise(sub(input.goal, input.start));
        const bend = rejectFrom(sub(mid, input.start), along);
        const toPole = sub(input.pole, input.start);
        const size = input.upper + input.lower;
        expect(length(cross(bend, rejectFrom(toPole, along)))).toBeLessThan(size * 1e-7);
        expect(dot(bend, toPole)).toBeGreaterThanOrEqual(-size * 1e-9);
        expect(Math.abs(dot(normal, toPole))).toBeLessThan(1e-6);
      }),
    );
  });

  it('gives the mirrored answer for mirrored input', () => {
    const mirror = ([x, y, z]: Vec3): Vec3 => [-x, y, z];
    fc.assert(
      fc.property(ordinary, (input) => {
        const { start, goal, pole, swivel, restDirection, restBend } = input;
        const { mid, end } = solve(input);
        const mirrored = solve({
          ...input,
          start: mirror(start),
          goal: mirror(goal),
          pole: mirror(pole),
          swivel: -swivel,
          restDirection: mirror(restDirection),
          restBend: mirror(restBend),
        });
        expectNear(mirrored.mid, mirror(mid), 1e-9);
        expectNear(mirrored.end, mirror(end), 1e-9);
      }),
    );
  });

  it('moves little when the goal moves little, up to full reach and beyond', () => {
    const at = (x: number): Vec3 =>
      solve({ ...plain, start: [0, 0, 0], goal: [x, 0, 0], pole: [1, 0, 9], upper: 1, lower: 1 }).mid;
    for (let x = 1.9; x < 2.1; x += 0.001) {
      // The bend goes with the square root of what is left: sqrt(2 · 0.001) at most for this step.
      expect(distance(at(x), at(x + 0.001))).toBeLessThan(0.05);
    }
    expectNear(at(2), [1, 0, 0], 1e-12);
    expectNear(at(2.5), [1, 0, 0], 1e-12);
  });

  it('stays finite with the goal on the start, the pole on the line, or both', () => {
    for (const goal of [
      [0, 0, 0],
      [1e-300, 0, 0],
      [1.5, 0, 0],
    ] as const) {
      for (const pole of [
        [0, 0, 0],
        [3, 0, 0],
        [1, 1, 0],
      ] as const) {
        for (const [upper, lower] of [
          [1, 1],
          [1, 0.5],
          [0.5, 1],
        ] as const) {
          const { mid, end, normal } = solve({ ...plain, start: [0, 0, 0], goal, pole, upper, lower });
          expect(length(mid)).toBeCloseTo(upper, 9);
          expect(distance(mid, end)).toBeCloseTo(lower, 9);
          expect(length(normal)).toBeCloseTo(1, 9);
        }
      }
    }
  });

  it('finds a bend even when the rest bend lies on the line as well', () => {
    const { mid } = solve({
      ...plain,
      start: [0, 0, 0],
      goal: [0, 0, 1.5],
      pole: [0, 0, 4],
      upper: 1,
      lower: 1,
    });
    expect(mid[2]).toBeCloseTo(0.75, 12);
    expect(Math.hypot(mid[0], mid[1])).toBeCloseTo(Math.sqrt(1 - 0.75 ** 2), 12);
  });
});
