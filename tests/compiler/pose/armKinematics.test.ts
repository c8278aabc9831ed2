import { describe, expect, it } from 'vitest';
import { quatFromAxisAngle } from '@/compiler/math/quat';
import type { ControlNode, PoseValues } from '@/compiler/rig/Rig';
import { expectNear } from '../math/expectNear';
import { readReference } from '../math/readReference';
import { control, rigOf } from './rigParts';
import { matrixIn, worldOf } from './worldOf';

/** Twist of the link before in degrees, its length, and the offset along the joint's own axis. */
type LinkRow = readonly [alpha: number, a: number, d: number];
type Rows = readonly (readonly number[])[];

/**
 * Source: tests/data/numeric/dh_forward_kinematics.json. One pose of a six-axis arm is printed in a course on robot
 * mechanics, after Paul and Zhang 1986 (one of its entries from the page's formula); the others were computed
 * independently from Craig's table, which is from memory. Convention: T = Rx(alpha) Tx(a) Rz(theta) Tz(d).
 */
const { published, computed, tolerance } = readReference<{
  readonly tolerance: number;
  readonly published: readonly {
    readonly theta_deg: readonly number[];
    readonly modified_dh_table_alpha_a_d: readonly LinkRow[];
    readonly T60: Rows;
  }[];
  readonly computed: readonly {
    readonly theta_deg: readonly number[];
    readonly rows: readonly LinkRow[];
    readonly T: Rows;
  }[];
}>('dh_forward_kinematics.json');

const arms = [
  ...published.map((arm) => ({
    title: 'as printed',
    angles: arm.theta_deg,
    rows: arm.modified_dh_table_alpha_a_d,
    matrix: arm.T60,
  })),
  ...computed.map((arm) => ({ title: 'as computed', angles: arm.theta_deg, rows: arm.rows, matrix: arm.T })),
];

/** The arm as controls in a row: the link is each one's rest, the joint its turn about Z. */
function armOf(rows: readonly LinkRow[]): readonly ControlNode[] {
  return rows.map(([degrees, a, d], index) => {
    const alpha = (degrees * Math.PI) / 180;
    return control(`axis_${index + 1}`, {
      parent: index === 0 ? null : `axis_${index}`,
      at: [a, -Math.sin(alpha) * d, Math.cos(alpha) * d],
      turn: quatFromAxisAngle([1, 0, 0], alpha),
    });
  });
}

describe('a six-axis arm', () => {
  it('has a printed pose and others to compare with', () => {
    expect(published.length).toBe(1);
    expect(computed.length).toBe(3);
  });

  it.each(arms.map((arm) => [arm.title, arm.angles.join(' '), arm] as const))(
    'reaches the matrix %s for the angles %s',
    (_, __, { rows, angles, matrix }) => {
      const pose: PoseValues = Object.fromEntries(angles.map((rz, index) => [`axis_${index + 1}`, { rz }]));
      const world = matrixIn(worldOf(rigOf(armOf(rows)), pose), `axis_${rows.length}`);
      const byRows = [0, 1, 2, 3].flatMap((row) => [0, 4, 8, 12].map((column) => world[row + column] ?? 0));
      expectNear(byRows, matrix.flat(), tolerance);
    },
  );
});
