import type { ChainEntry, SolverEntry } from '../../expand/primitives';
import type { Side } from '../../rig/Rig';

/** Which bone twist joints lie along, and whose twist they share. */
export interface TwistBone {
  /** Id under which solver and chains are made, e.g. `arm.left.elbow_twist`. */
  readonly id: string;
  readonly side: Side;
  readonly bone: string;
  readonly tip: string;
  readonly base: string | undefined;
  readonly driver: string;
  readonly count: number;
  /** `out`: the bone's own twist fades out toward its root. `in`: the tip's twist fades in toward the tip. */
  readonly fades: 'out' | 'in';
  readonly role: string;
}

/**
 * Joints even along a bone, each a child of its joint, and the solver that shares the twist among them. Joint i of n
 * stands at i / (n + 1); the share it is given is that of a straight ramp along the bone. Where the bone's own twist
 * must fade out toward its root, the joints carry it wholly as children and the shares undo the rest of it.
 */
export function expandTwist({ id, side, bone, tip, base, driver, count, fades, role }: TwistBone): {
  readonly chains: Readonly<Record<string, ChainEntry>>;
  readonly solvers: Readonly<Record<string, SolverEntry>>;
} {
  const chains: Record<string, ChainEntry> = {};
  const joints: string[] = [];
  const shares: number[] = [];
  for (let index = 1; index <= count; index += 1) {
    const share = index / (count + 1);
    const number = String(index).padStart(2, '0');
    const chain = `${id}_${number}`;
    chains[chain] = {
      side,
      role,
      points: [{ from: bone, to: tip, share }],
      names: ['joint'],
      parent: bone,
      orient: { like: bone },
    };
    joints.push(`${chain}.joint`);
    shares.push(fades === 'in' ? share : share - 1);
  }
  if (count === 0) return { chains, solvers: {} };
  return {
    chains,
    solvers: {
      [id]: {
        side,
        kind: 'twist',
        joints,
        shares,
        bone,
        tip,
        ...(base === undefined ? {} : { base }),
        driver,
      },
    },
  };
}
