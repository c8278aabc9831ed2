import { describe, expect, it } from 'vitest';
import { rotationOf } from '@/compiler/math/mat4';
import { quatFromAxisAngle } from '@/compiler/math/quat';
import { scale } from '@/compiler/math/vec3';
import type { Quat, Vec3 } from '@/compiler/rig/Rig';
import { expectSameRotation } from '../math/expectNear';
import { readReference } from '../math/readReference';
import { control, joint, rigOf } from './rigParts';
import { solver } from './solvers';
import { matrixIn, worldOf } from './worldOf';

interface TwistCase {
  readonly twist_axis: Vec3;
  readonly q_xyzw: Quat;
  readonly twist_xyzw: Quat;
  readonly swing_deg: number;
  readonly twist_deg: number;
}

/**
 * Source: tests/data/numeric/swing_twist.json: rotations put together from a known swing and a known twist, so that the
 * split is exact; the definition (swing · twist, Dobrowolski 2015) is from memory.
 */
const { cases, tolerance } = readReference<{ cases: readonly TwistCase[]; tolerance: number }>(
  'swing_twist.json',
);

/** What a twist joint with the whole share turns when `driver` turns by `turn` and the bone runs along `axis`. */
function twistFor(axis: Vec3, turn: Quat, share = 1): Quat {
  const rig = rigOf(
    [
      joint('fore'),
      joint('one', { parent: 'fore', at: scale(axis, 5) }),
      control('turn', { parent: 'fore', at: scale(axis, 15), turn }),
      joint('hand', { parent: 'fore', at: scale(axis, 15) }),
    ],
    {
      constraints: [
        {
          id: 'c',
          name: 'c',
          kind: 'orient',
          target: 'hand',
          sources: [{ node: 'turn', weight: 1 }],
          blend: null,
          keepOffset: false,
        },
      ],
      solvers: [
        solver.twist({
          joints: ['one'],
          shares: [share],
          bone: 'fore',
          tip: 'hand',
          base: 'fore',
          driver: 'hand',
        }),
      ],
    },
  );
  return rotationOf(matrixIn(worldOf(rig), 'one'));
}

describe('twist joints against known swings and twists', () => {
  it.each(cases.map((item) => [item.twist_deg, item.swing_deg, item] as const))(
    'find a twist of %d° under a swing of %d°, and its half',
    (degrees, _, { twist_axis: axis, q_xyzw: turn, twist_xyzw: twist }) => {
      expectSameRotation(twistFor(axis, turn), twist, tolerance);
      const half = quatFromAxisAngle(axis, (degrees * Math.PI) / 360);
      expectSameRotation(twistFor(axis, turn, 0.5), half, tolerance);
    },
  );

  it('stay still under a swing of exactly half a turn, which has no twist', () => {
    expect(twistFor([1, 0, 0], [0, 1, 0, 0])).toEqual([0, 0, 0, 1]);
    expectSameRotation(twistFor([0, 0, 1], [0.6, 0.8, 0, 0]), [0, 0, 0, 1], tolerance);
  });
});
