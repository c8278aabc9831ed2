import type {
  AimSolver,
  FootRollSolver,
  ReachSolver,
  SplineSolver,
  TwistSolver,
  TwoBoneSolver,
} from '@/compiler/rig/Rig';

type Without<S, K extends keyof S> = Partial<S> & Pick<S, K>;

const named = (name: string) => ({ id: name, name });
const follows = { blend: 1, stretch: 0, stretchLimit: 1.5, soft: 0, swing: 0 } as const;

/** Solvers with everything at its default that a test does not speak of. */
export const solver = {
  twoBone: (given: Without<TwoBoneSolver, 'start' | 'mid' | 'end' | 'goal' | 'pole'>): TwoBoneSolver => ({
    ...named('bend'),
    ...follows,
    kind: 'two_bone',
    ...given,
  }),
  reach: (given: Without<ReachSolver, 'joints' | 'goal' | 'pole'>): ReachSolver => ({
    ...named('fold'),
    ...follows,
    kind: 'reach',
    bias: 0,
    ...given,
  }),
  spline: (given: Without<SplineSolver, 'joints' | 'controls'>): SplineSolver => ({
    ...named('curve'),
    kind: 'spline',
    stretch: 0,
    volume: 0,
    ...given,
  }),
  twist: (
    given: Without<TwistSolver, 'joints' | 'shares' | 'bone' | 'tip' | 'base' | 'driver'>,
  ): TwistSolver => ({ ...named('twist'), kind: 'twist', ...given }),
  aim: (given: Without<AimSolver, 'joint' | 'goal'>): AimSolver => ({
    ...named('aim'),
    kind: 'aim',
    pole: null,
    blend: 1,
    ...given,
  }),
  footRoll: (given: Partial<FootRollSolver>): FootRollSolver => ({
    ...named('roll'),
    kind: 'foot_roll',
    foot: 'foot',
    ankle: 'ankle',
    toes: 'toes',
    heel: [0, -8, -4],
    ball: [0, -8, 8],
    toe: [0, -8, 14],
    inner: [-4, -8, 6],
    outer: [4, -8, 6],
    hinge: [1, 0, 0],
    forward: [0, 0, -1],
    roll: { control: 'foot', attribute: 'roll' },
    bank: { control: 'foot', attribute: 'bank' },
    break: 30,
    ...given,
  }),
};
