import fc from 'fast-check';
import { conjugateQuat, multiplyQuat, rotate } from '@/compiler/math/quat';
import { add, distance, length, normalise, rejectFrom, scale, sub } from '@/compiler/math/vec3';
import type { NumberOrAttribute, Quat, Rig, Vec3 } from '@/compiler/rig/Rig';
import { direction, point, rotation } from '../math/arbitraries';
import { control, joint, rigOf } from './rigParts';

/** Where the joints and controls of one limb stand in the world at rest, and how they are turned. */
export interface Limb {
  readonly points: readonly [Vec3, Vec3, Vec3];
  readonly turns: readonly [Quat, Quat, Quat];
  readonly goal: { readonly at: Vec3; readonly turn: Quat };
  readonly pole: Vec3;
  readonly blend?: NumberOrAttribute;
  readonly base?: { readonly at: Vec3; readonly turn: Quat };
}

/** A root control, a limb of three joints below a girdle, a goal, a pole, and a solver between them. */
export function limbRig({ points, turns, goal, pole, blend = 1, base }: Limb): Rig {
  const [start, mid, end] = points;
  const [startTurn, midTurn, endTurn] = turns;
  const girdle = base ?? { at: [0, 0, 0], turn: [0, 0, 0, 1] };
  const below = (place: Vec3, under: Vec3, turn: Quat): Vec3 =>
    rotate(conjugateQuat(turn), sub(place, under));
  return rigOf(
    [
      control('root'),
      control('goal', {
        parent: 'root',
        ...goal,
        attributes: [{ name: 'reach', default: 1, min: 0, max: 1, labels: null, note: null }],
      }),
      control('pole', { parent: 'root', at: pole }),
      control('girdle', { parent: 'root', ...girdle }),
      joint('start', {
        parent: 'girdle',
        at: below(start, girdle.at, girdle.turn),
        turn: multiplyQuat(conjugateQuat(girdle.turn), startTurn),
      }),
      joint('mid', {
        parent: 'start',
        at: below(mid, start, startTurn),
        turn: multiplyQuat(conjugateQuat(startTurn), midTurn),
      }),
      joint('end', {
        parent: 'mid',
        at: below(end, mid, midTurn),
        turn: multiplyQuat(conjugateQuat(midTurn), endTurn),
      }),
    ],
    {
      solvers: [
        {
          kind: 'two_bone',
          id: 'arm',
          name: 'arm',
          start: 'start',
          mid: 'mid',
          end: 'end',
          goal: 'goal',
          pole: 'pole',
          blend,
          stretch: 0,
          stretchLimit: 1,
          soft: 0,
          swing: 0,
        },
      ],
    },
  );
}

const bone = fc.double({ min: 1, max: 50, noNaN: true });

/** Limbs of any place, bend, joint orientation and pole, the pole off the line start–end. */
export const limb: fc.Arbitrary<Limb> = fc
  .record({
    start: point,
    first: direction,
    second: direction,
    upper: bone,
    lower: bone,
    turns: fc.tuple(rotation, rotation, rotation),
    goalTurn: rotation,
    poleAway: direction,
    base: fc.record({ at: point, turn: rotation }),
  })
  .map(({ start, first, second, upper, lower, turns, goalTurn, poleAway, base }) => {
    const mid = add(start, scale(normalise(first), upper));
    const end = add(mid, scale(normalise(second), lower));
    return {
      points: [start, mid, end] as const,
      turns,
      goal: { at: end, turn: goalTurn },
      pole: add(start, scale(poleAway, 60)),
      base,
    };
  })
  .filter(({ points: [start, , end], pole }) => {
    const line = sub(end, start);
    return length(line) > 0.5 && length(rejectFrom(normalise(sub(pole, start)), normalise(line))) > 1e-3;
  });

export const sizeOf = ({ points: [start, mid, end] }: Limb): number =>
  length(start) + distance(start, mid) + distance(mid, end) + 60;
