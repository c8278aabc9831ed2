import { describe, expect, it } from 'vitest';
import { dot, length } from '@/compiler/math/vec3';
import { shapeLines } from '@/compiler/slipway/shapes';
import { SHAPE_NAMES } from '@/compiler/slipway/verbs';

const UPRIGHT = { up: '+y', forward: '+z' } as const;
const TALL = { up: '+z', forward: '-y' } as const;

describe('shapes', () => {
  it.each(SHAPE_NAMES)('%s is a figure of radius one, give or take a tip', (shape) => {
    const points = shapeLines(shape, UPRIGHT).flat();
    expect(points.length).toBeGreaterThan(3);
    const farthest = Math.max(...points.map(length));
    expect(farthest).toBeGreaterThan(0.9);
    expect(farthest).toBeLessThanOrEqual(1.3);
  });

  it.each(['compass', 'square', 'cross', 'arrow'] as const)(
    '%s lies flat across up, whichever axis that is',
    (shape) => {
      for (const point of shapeLines(shape, UPRIGHT).flat()) expect(dot(point, [0, 1, 0])).toBeCloseTo(0, 12);
      for (const point of shapeLines(shape, TALL).flat()) expect(dot(point, [0, 0, 1])).toBeCloseTo(0, 12);
    },
  );

  it.each(['compass', 'arrow'] as const)('%s points forward', (shape) => {
    const tip = shapeLines(shape, TALL)
      .flat()
      .reduce((best, point) => (dot(point, [0, -1, 0]) > dot(best, [0, -1, 0]) ? point : best));
    expect(dot(tip, [0, -1, 0])).toBeCloseTo(length(tip), 12);
  });

  it('a ring lies across the axis joints aim along', () => {
    for (const [x] of shapeLines('ring', TALL).flat()) expect(x).toBeCloseTo(0, 15);
  });
});
