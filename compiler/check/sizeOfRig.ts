import type { SolvedRecipe } from '../solve/types';

/** The longest edge of the box around everything that has a place at rest, in the scene's unit. */
export function sizeOfRig({ places }: SolvedRecipe): number {
  const lowest = [Infinity, Infinity, Infinity];
  const highest = [-Infinity, -Infinity, -Infinity];
  for (const { position } of places.values()) {
    position.forEach((value, axis) => {
      lowest[axis] = Math.min(lowest[axis] ?? value, value);
      highest[axis] = Math.max(highest[axis] ?? value, value);
    });
  }
  return Math.max(0, ...highest.map((value, axis) => value - (lowest[axis] ?? value)));
}
