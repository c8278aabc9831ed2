import { expect } from 'vitest';

/** Fails unless both lists are equally long and agree in every number to `tolerance`; NaN never agrees. */
export function expectNear(actual: ArrayLike<number>, expected: ArrayLike<number>, tolerance = 1e-12): void {
  expect(actual.length).toBe(expected.length);
  for (let i = 0; i < expected.length; i += 1) {
    const difference = Math.abs((actual[i] as number) - (expected[i] as number));
    if (!(difference <= tolerance)) {
      expect.fail(
        `[${Array.from(actual).join(', ')}] is not [${Array.from(expected).join(', ')}] to ${tolerance}`,
      );
    }
  }
}

/** As `expectNear`, for rotations: a quaternion and its negative are the same. */
export function expectSameRotation(
  actual: readonly number[],
  expected: readonly number[],
  tolerance = 1e-12,
): void {
  const cosine = actual.reduce((sum, value, i) => sum + value * (expected[i] ?? 0), 0);
  expectNear(cosine < 0 ? actual.map((value) => -value) : actual, expected, tolerance);
}
