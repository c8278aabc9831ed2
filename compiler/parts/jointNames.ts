import type { PlaceReference } from '../expand/types';

/** Names of a part's joints: those given, else their landmarks', else the part's own. */
export function namesFor(
  points: readonly PlaceReference[],
  given: readonly string[] | undefined,
  fallback: readonly string[],
): readonly string[] {
  return points.map((point, index) => {
    const own = given?.[index] ?? (typeof point === 'string' ? point.replaceAll('.', '_') : undefined);
    return own ?? fallback[index] ?? String(index + 1).padStart(2, '0');
  });
}
