import fc from 'fast-check';
import { expect, it } from 'vitest';
import { rotate } from '@/compiler/math/quat';
import { add, cross, distance, dot, length, normalise, scale, sub } from '@/compiler/math/vec3';
import type { Vec3 } from '@/compiler/rig/Rig';
import { polePosition } from '@/compiler/solve/polePosition';
import { point, rotation } from '../math/arbitraries';
import { expectNear } from '../math/expectNear';

/** Three points that are plainly bent, so that rounding decides nothing. */
const bent = fc.tuple(point, point, point).filter(([start, mid, end]) => {
  const [first, second] = [sub(mid, start), sub(end, start)];
  if (length(first) < 1 || length(second) < 1 || distance(mid, end) < 1) return false;
  return length(cross(normalise(first), normalise(second))) > 0.01;
});
const factor = fc.double({ min: 0.1, max: 5, noNaN: true });

function poleOf(start: Vec3, mid: Vec3, end: Vec3, share: number): Vec3 {
  const pole = polePosition(start, mid, end, share, null);
  if (typeof pole === 'string') return expect.fail(pole);
  return pole;
}

it('stands in the plane, square to the line, on the side of the middle, as far out as asked', () => {
  fc.assert(
    fc.property(bent, factor, ([start, mid, end], share) => {
      const pole = poleOf(start, mid, end, share);
      const line = normalise(sub(end, start));
      const size = distance(start, mid) + distance(mid, end);
      const foot = add(start, scale(line, dot(sub(mid, start), line)));
      const out = sub(pole, foot);
      const normal = normalise(cross(line, sub(mid, start)));
      expect(length(out) / (share * size)).toBeCloseTo(1, 9);
      expect(dot(out, line) / size).toBeCloseTo(0, 9);
      expect(dot(out, normal) / size).toBeCloseTo(0, 9);
      expect(dot(out, sub(mid, foot))).toBeGreaterThan(0);
    }),
  );
});

it('moves, turns, grows and is mirrored with its points', () => {
  fc.assert(
    fc.property(
      bent,
      factor,
      rotation,
      point,
      fc.double({ min: 0.1, max: 10, noNaN: true }),
      ([start, mid, end], share, turn, shift, size) => {
        const pole = poleOf(start, mid, end, share);
        const moved = (p: Vec3): Vec3 => add(scale(rotate(turn, p), size), shift);
        expectNear(poleOf(moved(start), moved(mid), moved(end), share), moved(pole), 1e-5);
        const mirrored = ([x, y, z]: Vec3): Vec3 => [-x, y, z];
        expectNear(poleOf(mirrored(start), mirrored(mid), mirrored(end), share), mirrored(pole), 1e-9);
      },
    ),
  );
});

it('is the same from either end', () => {
  fc.assert(
    fc.property(bent, factor, ([start, mid, end], share) => {
      expectNear(poleOf(end, mid, start, share), poleOf(start, mid, end, share), 1e-6);
    }),
  );
});
