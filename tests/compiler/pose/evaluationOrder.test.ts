import { describe, expect, it } from 'vitest';
import { createPoser } from '@/compiler/pose/createPoser';
import { findEvaluationRing, orderEvaluation } from '@/compiler/pose/evaluationOrder';
import type { RigConstraint, RigSolver } from '@/compiler/rig/Rig';
import { control, joint, rigOf } from './rigParts';
import { positionIn, worldOf } from './worldOf';

function follow(target: string, source: string): RigConstraint {
  const sources = [{ node: source, weight: 1 }];
  return {
    id: target,
    name: `${target}_follows`,
    kind: 'point',
    target,
    sources,
    blend: null,
    keepOffset: true,
  };
}

const solver: RigSolver = {
  kind: 'two_bone',
  id: 'arm',
  name: 'arm',
  start: 'a',
  mid: 'b',
  end: 'c',
  goal: 'goal',
  pole: 'pole',
  blend: 1,
  stretch: 0,
  stretchLimit: 1,
  soft: 0,
  swing: 0,
};

const limb = [
  control('goal', { at: [2, 0, 0] }),
  control('pole', { at: [1, 0, 5] }),
  joint('a'),
  joint('b', { parent: 'a', at: [1, 0, 0.5] }),
  joint('c', { parent: 'b', at: [1, 0, -0.5] }),
];

describe('order', () => {
  it('evaluates sources before targets wherever they stand in the list', () => {
    const rig = rigOf(
      [joint('first'), joint('second', { at: [1, 0, 0] }), control('last', { at: [2, 0, 0] })],
      {
        constraints: [follow('first', 'second'), follow('second', 'last')],
      },
    );
    expect(positionIn(worldOf(rig, { last: { ty: 3 } }), 'first')).toEqual([0, 3, 0]);
  });

  it('gives what follows a solved joint its solved place', () => {
    const rig = rigOf(
      [joint('ring', { at: [1, 0, 0.5] }), ...limb, joint('thumb', { parent: 'b', at: [0, 0, 1] })],
      {
        constraints: [follow('ring', 'b')],
        solvers: [solver],
      },
    );
    const world = worldOf(rig, { goal: { tx: -1 } });
    expect(positionIn(world, 'ring')).toEqual(positionIn(world, 'b'));
    expect(positionIn(world, 'b')[2]).toBeGreaterThan(0.9);
    const thumb = positionIn(world, 'thumb');
    const [bx, by, bz] = positionIn(world, 'b');
    expect(Math.hypot(thumb[0] - bx, thumb[1] - by, thumb[2] - bz)).toBeCloseTo(1, 12);
  });

  it('lets a goal hang below the end of another limb', () => {
    const second = ['d', 'e', 'f'].map((name, index) =>
      joint(name, {
        parent: index === 0 ? null : (['d', 'e'][index - 1] ?? null),
        at: [index === 0 ? 2 : 1, index === 2 ? -1 : 1, 0],
      }),
    );
    const rig = rigOf([...limb, ...second, control('next', { parent: 'c' })], {
      solvers: [{ ...solver, id: 'leg', name: 'leg', start: 'd', mid: 'e', end: 'f', goal: 'next' }, solver],
    });
    const order = orderEvaluation(rig);
    if (order.kind !== 'order') throw new Error('a ring');
    const solved = order.tasks.flatMap((task) => (task.kind === 'solve' ? [task.solver] : []));
    expect(solved).toEqual([1, 0]);
    expect(order.tasks).toHaveLength(rig.nodes.length + 2);
  });

  it('takes chains far deeper than any call stack', () => {
    const deep = Array.from({ length: 20_000 }, (_, index) =>
      joint(`j${index}`, { parent: index === 0 ? null : `j${index - 1}`, at: [0, 1, 0] }),
    ).reverse();
    expect(findEvaluationRing(rigOf(deep))).toBeNull();
  });
});

describe('rings', () => {
  it('are shown as a path in which each waits for the next', () => {
    const rig = rigOf([joint('a'), joint('b'), joint('c'), joint('free')], {
      constraints: [follow('a', 'b'), follow('b', 'c'), follow('c', 'a')],
    });
    expect(findEvaluationRing(rig)).toEqual(['a', 'b', 'c']);
  });

  it('are found through parents, through a thing that follows itself, and through solvers', () => {
    const throughParent = rigOf([joint('a'), joint('b', { parent: 'a' })], {
      constraints: [follow('a', 'b')],
    });
    expect(findEvaluationRing(throughParent)).toEqual(['a', 'b']);
    expect(findEvaluationRing(rigOf([joint('a')], { constraints: [follow('a', 'a')] }))).toEqual(['a']);
    const goalBelow = rigOf([...limb.slice(1), control('goal', { parent: 'c' })], { solvers: [solver] });
    expect(findEvaluationRing(goalBelow)).toEqual(['c', 'arm', 'goal']);
  });

  it('are not seen where the middle joint hangs below the start it is solved with', () => {
    expect(findEvaluationRing(rigOf(limb, { solvers: [solver] }))).toBeNull();
  });

  it('make posing refuse the rig', () => {
    const rig = rigOf([joint('a')], { constraints: [follow('a', 'a')] });
    expect(() => createPoser(rig)).toThrow(/waits for itself/);
    expect(() => createPoser(rigOf([joint('a', { parent: 'nobody' })]))).toThrow(/nobody/);
  });
});
