import type { Vec3 } from '../rig/Rig';
import type { Collection, PrimitiveEntries } from './primitives';
import { mirrorId, mirrorPoint } from './sides';

/** Keys that hold a point or direction when their value is three numbers. */
const POINT_KEYS: ReadonlySet<string> = new Set([
  'at',
  'toward',
  'bend',
  'heel',
  'ball',
  'toe',
  'inner',
  'outer',
]);
/** Keys that hold ids, points by name, or lists of them. */
const REFERENCE_KEYS: ReadonlySet<string> = new Set([
  'parent',
  'align',
  'like',
  'spaces',
  'target',
  'goal',
  'pole',
  'from',
  'to',
  'joints',
  'points',
  'at',
  'up',
  'controls',
  'bone',
  'tip',
  'base',
  'driver',
  'foot',
  'ankle',
  'toes',
  'heel',
  'ball',
  'toe',
  'inner',
  'outer',
  'geometry',
  'input',
  'blend',
  'stretch',
  'swing',
  'bias',
  'volume',
  'roll',
  'bank',
  'break',
  'weight',
]);

function isPoint(value: unknown): value is Vec3 {
  return Array.isArray(value) && value.length === 3 && value.every((item) => typeof item === 'number');
}

function mirrorValue(key: string, value: unknown, left: Vec3): unknown {
  if (typeof value === 'string') return REFERENCE_KEYS.has(key) ? mirrorId(value) : value;
  if (isPoint(value)) return POINT_KEYS.has(key) || key === 'points' ? mirrorPoint(value, left) : value;
  if (Array.isArray(value)) return value.map((item) => mirrorValue(key, item, left));
  if (typeof value === 'object' && value !== null) {
    const mirrored: Record<string, unknown> = {};
    for (const [name, item] of Object.entries(value)) {
      // Only `sources` is keyed by ids; everywhere else keys are words of the language.
      mirrored[key === 'sources' ? mirrorId(name) : name] = mirrorValue(name, item, left);
    }
    return mirrored;
  }
  return value;
}

/**
 * The right copy of an entry written for the left: references read `.right` for `.left`, points and directions
 * are mirrored. Numbers that are not points (sizes, limits, weights) stay; landmarks are looked up on the right
 * side later, by the copy's own side.
 */
export function mirrorEntry<C extends Collection>(
  entry: PrimitiveEntries[C],
  left: Vec3,
): PrimitiveEntries[C] {
  return mirrorValue('', entry, left) as PrimitiveEntries[C];
}
