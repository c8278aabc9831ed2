import { readFileSync } from 'node:fs';

/** How far a joint turns about one of its axes, in degrees from the anatomical position. */
export interface MovementRange {
  readonly min: number;
  readonly max: number;
}

/** Movements about one axis: the first counts as positive, the second as negative. */
const OPPOSITES: readonly (readonly [axis: string, positive: string, negative: string])[] = [
  ['flexion', 'flexion', 'extension'],
  ['flexion', 'dorsiflexion', 'plantarflexion'],
  ['abduction', 'abduction', 'adduction'],
  ['abduction', 'radial_deviation', 'ulnar_deviation'],
  ['abduction', 'lateral_flexion', 'lateral_flexion'],
  ['rotation', 'internal_rotation', 'external_rotation'],
  ['rotation', 'pronation', 'supination'],
  ['rotation', 'rotation', 'rotation'],
];

type Movements = Readonly<Record<string, number>>;

/**
 * Ranges of a person's joints by joint and axis (flexion, abduction, rotation), in degrees; a movement without an
 * opposite in the table ends at zero there. Source: reference values of the American Academy of Orthopaedic Surgeons,
 * from memory, see the head of tests/data/body/joint_rom_aaos.json. Check against them loosely (a tenth), never exactly.
 */
export function readJointRanges(): Readonly<Record<string, Readonly<Record<string, MovementRange>>>> {
  const file = new URL('../data/body/joint_rom_aaos.json', import.meta.url);
  const { rom } = JSON.parse(readFileSync(file, 'utf8')) as { rom: Record<string, Movements> };
  return Object.fromEntries(
    Object.entries(rom).map(([joint, movements]) => {
      const axes = OPPOSITES.flatMap(([axis, positive, negative]) => {
        const [max, least] = [movements[positive], movements[negative]];
        if (max === undefined && least === undefined) return [];
        return [[axis, { min: 0 - (least ?? 0), max: max ?? 0 }] as const];
      });
      return [joint, Object.fromEntries(axes)];
    }),
  );
}
