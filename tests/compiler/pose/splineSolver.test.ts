import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { makeVec } from '@/compiler/math/inPlace';
import { rotationOf } from '@/compiler/math/mat4';
import { add, angleBetween, distance, length, normalise, scale, sub } from '@/compiler/math/vec3';
import { doubleReflectInto, SplineCurve } from '@/compiler/pose/splineCurve';
import type { Rig, SplineSolver, Vec3 } from '@/compiler/rig/Rig';
import { point } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { readReference } from '../math/readReference';
import { control, joint, rigOf } from './rigParts';
import { solver } from './solvers';
import { matrixIn, positionIn, worldOf } from './worldOf';

const vec = (v: Vec3): Float64Array => makeVec(v);

describe('double reflection', () => {
  interface Helix {
    readonly a: number;
    readonly b: number;
    readonly t_end: number;
    readonly double_reflection_max_angle_error_rad: readonly { readonly N: number; readonly error: number }[];
  }
  // Source: tests/data/numeric/rmf_helix.json: the exact frame of a helix (Bishop 1975) and the errors of double
  // reflection (Wang, Jüttler, Zheng and Liu 2008, fourth order) computed by an independent implementation.
  const helix = readReference<Helix>('rmf_helix.json');

  /** Largest angle between the exact frame and the one that `steps` reflections give. */
  function errorFor(steps: number): number {
    const { a, b, t_end: end } = helix;
    const speed = Math.hypot(a, b);
    const at = (t: number): Vec3 => [a * Math.cos(t), a * Math.sin(t), b * t];
    const tangent = (t: number): Vec3 => [(-a * Math.sin(t)) / speed, (a * Math.cos(t)) / speed, b / speed];
    const normal = (t: number): Vec3 => [-Math.cos(t), -Math.sin(t), 0];
    const binormal = (t: number): Vec3 => [(b * Math.sin(t)) / speed, (-b * Math.cos(t)) / speed, a / speed];
    const exact = (t: number): Vec3 => {
      const angle = (-b / (a * a + b * b)) * speed * t;
      return add(scale(normal(t), Math.cos(angle)), scale(binormal(t), Math.sin(angle)));
    };
    const r = vec(normal(0));
    const out = makeVec();
    let worst = 0;
    for (let i = 1; i <= steps; i += 1) {
      const [from, to] = [((i - 1) * end) / steps, (i * end) / steps];
      doubleReflectInto(out, vec(at(from)), vec(tangent(from)), r, vec(at(to)), vec(tangent(to)));
      r.set(out);
      const got: Vec3 = [r[0] as number, r[1] as number, r[2] as number];
      worst = Math.max(worst, angleBetween(exact(to), got));
    }
    return worst;
  }

  it.each(helix.double_reflection_max_angle_error_rad)(
    'follows the exact frame of a helix as closely as listed for $N steps',
    ({ N, error }) => {
      expect(errorFor(N)).toBeLessThan(3 * error);
    },
  );

  it('divides its error by sixteen when the steps are halved', () => {
    for (const steps of [16, 32, 64]) {
      expect(errorFor(steps) / errorFor(2 * steps)).toBeGreaterThan(14);
      expect(errorFor(steps) / errorFor(2 * steps)).toBeLessThan(18);
    }
  });

  it('keeps the normal where places or tangents coincide', () => {
    const out = makeVec();
    const [x, y] = [vec([1, 0, 0]), vec([0, 1, 0])];
    doubleReflectInto(out, vec([1, 2, 3]), x, y, vec([1, 2, 3]), x);
    expectNear(out, [0, 1, 0]);
    doubleReflectInto(out, vec([0, 0, 0]), x, y, vec([5, 0, 0]), x);
    expectNear(out, [0, 1, 0]);
  });
});

describe('the curve', () => {
  it('of four control points is the cubic Bézier curve', () => {
    const points: readonly Vec3[] = [
      [0, 0, 0],
      [1, 3, 0],
      [4, 3, 1],
      [5, 0, 2],
    ];
    const curve = new SplineCurve(4);
    points.forEach((at, index) => {
      curve.points[index]?.set(at);
    });
    curve.measure(vec([0, 0, 1]));
    const place = makeVec();
    const tangent = makeVec();
    const normal = makeVec();
    // Half the way by parameter: (p0 + 3 p1 + 3 p2 + p3) / 8.
    curve.atLengthInto(0, place, tangent, normal);
    expectNear(place, points[0] as Vec3);
    let best = Number.POSITIVE_INFINITY;
    for (let share = 0.4; share < 0.6; share += 0.0005) {
      curve.atLengthInto(curve.length * share, place, tangent, normal);
      best = Math.min(
        best,
        distance([place[0] as number, place[1] as number, place[2] as number], [2.5, 2.25, 0.625]),
      );
    }
    expect(best).toBeLessThan(0.01);
  });

  it('of control points on a line is that line, at even pace along it', () => {
    for (const count of [2, 3, 4, 5, 7]) {
      const curve = new SplineCurve(count);
      curve.points.forEach((at, index) => {
        at.set([0, (10 * index) / (count - 1), 0]);
      });
      curve.measure(vec([0, 0, 1]));
      expect(curve.length).toBeCloseTo(10, 9);
      const place = makeVec();
      const [tangent, normal] = [makeVec(), makeVec()];
      for (const share of [0, 0.2, 0.5, 0.9]) {
        curve.atLengthInto(10 * share, place, tangent, normal);
        expectNear(place, [0, 10 * share, 0], 0.02);
        expectNear(tangent, [0, 1, 0]);
        expectNear(normal, [0, 0, 1]);
      }
      curve.atLengthInto(14, place, tangent, normal);
      expectNear(place, [0, 14, 0], 1e-9);
    }
  });
});

const spine: readonly Vec3[] = [
  [0, 50, 0],
  [0, 58, 3],
  [0, 66, 4],
  [0, 74, 3],
  [0, 82, 0],
];
const JOINTS = ['a', 'b', 'c', 'd', 'e'];

function spineRig(given: Partial<SplineSolver> = {}, points: readonly Vec3[] = spine): Rig {
  return rigOf(
    [
      control('root'),
      control('low', { parent: 'root', at: points[0] as Vec3 }),
      control('middle', { parent: 'root', at: points[2] as Vec3 }),
      control('high', { parent: 'root', at: points[4] as Vec3 }),
      ...points.map((at, index) =>
        joint(JOINTS[index] as string, {
          parent: index === 0 ? 'root' : (JOINTS[index - 1] as string),
          at: index === 0 ? at : sub(at, points[index - 1] as Vec3),
        }),
      ),
    ],
    { solvers: [solver.spline({ joints: JOINTS, controls: ['low', 'middle', 'high'], ...given })] },
  );
}
const placesOf = (rig: Rig, pose = {}): readonly Vec3[] => {
  const world = worldOf(rig, pose);
  return JOINTS.map((name) => positionIn(world, name));
};

describe('a spline chain', () => {
  it('keeps rest, wherever its points lie', () => {
    fc.assert(
      fc.property(fc.array(point, { minLength: 5, maxLength: 5 }), (points) => {
        points.forEach((at, index) => {
          fc.pre(index === 0 || distance(at, points[index - 1] as Vec3) > 1);
        });
        placesOf(spineRig({}, points)).forEach((at, index) => {
          expectNear(at, points[index] as Vec3, 1e-8);
        });
      }),
    );
  });

  it('moves as a whole with all of its controls', () => {
    const shift = { tx: 5, ty: -3, tz: 8 };
    const moved = placesOf(spineRig(), { low: shift, middle: shift, high: shift });
    moved.forEach((at, index) => {
      expectNear(at, add(spine[index] as Vec3, [5, -3, 8]), 1e-9);
    });
  });

  it('keeps the distances of its joints without stretch, and spreads them with it', () => {
    const lengths = (places: readonly Vec3[]): number =>
      places.slice(1).reduce((sum, at, index) => sum + distance(at, places[index] as Vec3), 0);
    const rest = lengths(spine);
    const pulled = { high: { ty: 20 } };
    expect(lengths(placesOf(spineRig(), pulled)) / rest).toBeLessThan(1.03);
    expect(lengths(placesOf(spineRig({ stretch: 1 }), pulled)) / rest).toBeGreaterThan(1.4);
  });

  it('spreads the twist of its ends evenly', () => {
    const straight = spine.map(([, y]): Vec3 => [0, y, 0]);
    const world = worldOf(spineRig({}, straight), { high: { ry: 80 } });
    JOINTS.forEach((name, index) => {
      const half = (((80 * index) / 4) * Math.PI) / 360;
      expectSameRotation(rotationOf(matrixIn(world, name)), [0, Math.sin(half), 0, Math.cos(half)], 1e-9);
    });
  });

  it('thins when it stretches and keeps its volume', () => {
    const world = worldOf(spineRig({ stretch: 1, volume: 1 }), { high: { ty: 30 } });
    const matrix = matrixIn(world, 'c');
    const across = length([matrix[0], matrix[1], matrix[2]]);
    expect(across).toBeLessThan(0.95);
    const rest = placesOf(spineRig());
    const places = placesOf(spineRig({ stretch: 1, volume: 1 }), { high: { ty: 30 } });
    const along = distance(places[3] as Vec3, places[1] as Vec3) / distance(rest[3] as Vec3, rest[1] as Vec3);
    expect(across * across * along).toBeGreaterThan(0.9);
    expect(across * across * along).toBeLessThan(1.1);
  });

  it('never flips a frame along the curve', () => {
    fc.assert(
      fc.property(fc.tuple(point, point), ([middle, high]) => {
        const pose = {
          middle: { tx: middle[0] / 20, ty: middle[1] / 20, tz: middle[2] / 20 },
          high: { tx: high[0] / 20, ty: high[1] / 20, tz: high[2] / 20 },
        };
        const world = worldOf(spineRig({ stretch: 1 }), pose);
        for (const name of JOINTS) {
          const q = rotationOf(matrixIn(world, name));
          expect(q.every(Number.isFinite)).toBe(true);
        }
        expect(normalise(sub(positionIn(world, 'b'), positionIn(world, 'a'))).every(Number.isFinite)).toBe(
          true,
        );
      }),
    );
  });
});
