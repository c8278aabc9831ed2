import fc from 'fast-check';
import { describe, it } from 'vitest';
import { add, distance, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { Rig } from '@/compiler/rig/Rig';
import { direction } from '../math/arbitraries';
import { expectNear } from '../math/expectNear';
import { type Limb, limb, limbRig, sizeOf } from './limbs';
import { worldOf } from './worldOf';

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
