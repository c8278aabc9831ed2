import type { ChainEntry } from './primitives';

/** A counted joint's name: its position from 1, padded to two or more digits so that names sort. */
export function jointNumber(index: number, count: number): string {
  return String(index + 1).padStart(Math.max(2, String(count).length), '0');
}

/** How many joints a chain entry makes. */
export function jointCount(entry: ChainEntry): number {
  return entry.joints ?? entry.points?.length ?? 0;
}

/**
 * Names of a chain's joints in order: those given, else landmarks' names where joints stand on landmarks, else
 * padded numbers.
 */
export function jointNames(entry: ChainEntry): readonly string[] {
  const count = jointCount(entry);
  const names: string[] = [];
  for (let index = 0; index < count; index += 1) {
    const point = entry.joints === undefined ? entry.points?.[index] : undefined;
    names.push(
      entry.names?.[index] ??
        (typeof point === 'string' && !point.includes('.') ? point : jointNumber(index, count)),
    );
  }
  return names;
}
