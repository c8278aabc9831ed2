import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eulerToQuat } from '@/compiler/math/euler';
import { decomposeMat4, rotationOf } from '@/compiler/math/mat4';
import { slerp } from '@/compiler/math/quat';
import type { FollowConstraint, Quat, Rig, RigConstraint } from '@/compiler/rig/Rig';
import { degrees, point, rotation } from '../math/arbitraries';
import { expectNear, expectSameRotation } from '../math/expectNear';
import { control, joint, rigOf } from './rigParts';
import { matrixIn, positionIn, worldOf } from './worldOf';

type Options = Partial<Omit<FollowConstraint, 'kind' | 'sources'>> & {
  readonly sources?: readonly string[];
  readonly weights?: readonly number[];
};

function constraint(kind: FollowConstraint['kind'], options: Options = {}): FollowConstraint {
  const { sources = ['a'], weights = sources.map(() => 1), ...rest } = options;
  const weighed = sources.map((node, index) => ({ node, weight: weights[index] ?? 0 }));
  return {
    id: kind,
    name: kind,
    kind,
    target: 'target',
    sources: weighed,
    blend: null,
    keepOffset: true,
    ...rest,
  };
}

const nodes = [
  control('a', { at: [1, 0, 0] }),
  control('b', {
    at: [-3, 2, 0],
    attributes: [{ name: 'mix', default: 0.25, min: 0, max: 1, labels: null, note: null }],
  }),
  control('c', { at: [0, 0, 4] }),
  joint('target', { at: [0, 5, 0] }),
  joint('child', { parent: 'target', at: [0, 1, 0] }),
];

const rig = (...constraints: readonly RigConstraint[]): Rig => rigOf(nodes, { constraints });

describe('at rest', () => {
  const kinds = fc.constantFrom<FollowConstraint['kind']>('parent', 'point', 'orient', 'scale');

  it('nothing moves when offsets are kept, whatever stands where', () => {
    fc.assert(
      fc.property(
        kinds,
        fc.array(fc.tuple(point, rotation), { minLength: 4, maxLength: 4 }),
        (kind, places) => {
          const placed = nodes.map((node, index) => {
            const place = places[index];
            return place === undefined ? node : { ...node, at: place[0], turn: place[1] };
          });
          const free = rigOf(placed);
          const bound = rigOf(placed, { constraints: [constraint(kind, { sources: ['a', 'b', 'c'] })] });
          const rest = worldOf(free);
          for (const [name, matrix] of worldOf(bound)) expectNear(matrix, rest.get(name) ?? [], 1e-8);
        },
      ),
    );
  });

  it('without kept offset the target takes the sources as they are', () => {
    const world = worldOf(rig(constraint('parent', { keepOffset: false })));
    expectNear(world.get('target') ?? [], world.get('a') ?? []);
    expectNear(
      positionIn(worldOf(rig(constraint('point', { keepOffset: false, sources: ['a', 'b'] }))), 'target'),
      [-1, 1, 0],
    );
  });
});

describe('parent', () => {
  it('of one source carries the target as if it hung below, scale and children too', () => {
    fc.assert(
      fc.property(point, degrees, (move, angles) => {
        const pose = {
          a: {
            tx: move[0],
            ty: move[1],
            tz: move[2],
            rx: angles[0],
            ry: angles[1],
            rz: angles[2],
            sx: 2,
            sy: 0.5,
            sz: 3,
          },
        };
        const hung = rigOf(
          nodes.map((node) =>
            node.name === 'target' ? { ...node, parent: 'a', at: [-1, 5, 0] as const } : node,
          ),
        );
        const expected = worldOf(hung, pose);
        const world = worldOf(rig(constraint('parent')), pose);
        for (const name of ['target', 'child'])
          expectNear(world.get(name) ?? [], expected.get(name) ?? [], 1e-8);
      }),
    );
  });

  it('of two follows each by its weight', () => {
    const bound = rig(constraint('parent', { sources: ['a', 'b'], weights: [3, 1] }));
    expectNear(positionIn(worldOf(bound, { a: { tx: 4 } }), 'target'), [3, 5, 0]);
    // A source of no weight takes no part at all.
    const one = rig(constraint('parent', { sources: ['a', 'b'], weights: [2, 0] }));
    const alone = rig(constraint('parent'));
    const pose = { a: { rx: 30, sx: 2 }, b: { tx: 9 } };
    expect(worldOf(one, pose).get('target')).toEqual(worldOf(alone, pose).get('target'));
  });

  it('with no weight at all leaves the target be', () => {
    const none = rig(constraint('parent', { sources: ['a', 'b'], weights: [0, 0] }));
    const single = rig(constraint('parent', { weights: [0] }));
    for (const bound of [none, single]) {
      expectNear(positionIn(worldOf(bound, { a: { tx: 4 }, b: { tx: 4 } }), 'target'), [0, 5, 0]);
    }
  });
});

describe('blend', () => {
  it('weighs the first source, and 1 − blend the second', () => {
    const bound = (blend: RigConstraint['blend']): Rig =>
      rig(constraint('point', { sources: ['a', 'b'], blend }));
    const pose = { a: { tx: 4 } };
    expectNear(positionIn(worldOf(bound(0.75), pose), 'target'), [3, 5, 0]);
    const byAttribute = bound({ control: 'b', attribute: 'mix' });
    expectNear(positionIn(worldOf(byAttribute, pose), 'target'), [1, 5, 0]);
    expectNear(positionIn(worldOf(byAttribute, { ...pose, b: { mix: 0.5 } }), 'target'), [2, 5, 0]);
    expectNear(positionIn(worldOf(byAttribute, { ...pose, b: { mix: 8 } }), 'target'), [4, 5, 0]);
  });

  it('turns along the shorter arc between the two', () => {
    const bound = rig(constraint('orient', { sources: ['a', 'b'], blend: 0.25 }));
    const pose = { a: { rx: 100, rz: 20 }, b: { ry: -80 } };
    const expected = slerp(eulerToQuat([0, -80, 0], 'xyz'), eulerToQuat([100, 0, 20], 'xyz'), 0.25);
    expectSameRotation(rotationOf(matrixIn(worldOf(bound, pose), 'target')), expected, 1e-12);
  });
});

describe('parts', () => {
  const pose = { a: { tx: 4, ty: 1, rx: 30, ry: 20, sx: 2, sy: 3, sz: 4 } };
  const target = (kind: FollowConstraint['kind'], own: Readonly<Record<string, number>> = {}) => {
    const bound = rigOf(
      [
        control('holder', {}),
        ...nodes.map((node) => (node.name === 'target' ? { ...node, parent: 'holder' } : node)),
      ],
      {
        constraints: [constraint(kind)],
      },
    );
    return decomposeMat4(matrixIn(worldOf(bound, { ...pose, holder: own }), 'target'));
  };

  it('point moves only the position, with the source’s turn and scale acting on the kept offset', () => {
    const { at, turn, scale } = target('point', { rz: 10 });
    const hung = worldOf(
      rigOf(
        nodes.map((node) =>
          node.name === 'target' ? { ...node, parent: 'a', at: [-1, 5, 0] as const } : node,
        ),
      ),
      pose,
    );
    expectNear(at, positionIn(hung, 'target'), 1e-12);
    expectSameRotation(turn, eulerToQuat([0, 0, 10], 'xyz'));
    expectNear(scale, [1, 1, 1]);
  });

  it('orient turns only', () => {
    const { at, turn, scale } = target('orient', { ty: 1, sx: 2, sy: 2, sz: 2 });
    expectNear(at, [0, 11, 0]);
    expectSameRotation(turn, eulerToQuat([30, 20, 0], 'xyz'));
    expectNear(scale, [2, 2, 2]);
  });

  it('scale scales only, along the target’s own axes', () => {
    const { at, turn, scale } = target('scale', { rz: 40 });
    expectNear(at, [-5 * Math.sin((40 * Math.PI) / 180), 5 * Math.cos((40 * Math.PI) / 180), 0]);
    expectSameRotation(turn, eulerToQuat([0, 0, 40], 'xyz'));
    expectNear(scale, [2, 3, 4]);
  });

  it('several on one target act in their order', () => {
    const both = rig(constraint('point', { sources: ['a'] }), {
      ...constraint('orient', { sources: ['b'] }),
      name: 'second',
    });
    const world = worldOf(both, { a: { tx: 2 }, b: { rz: 90 } });
    expectNear(positionIn(world, 'target'), [2, 5, 0]);
    expectNear(positionIn(world, 'child'), [1, 5, 0]);
  });
});

/** Rotation of a node that follows nodes of the given rotations without offset, by the given weights. */
function averageOf(turns: readonly Quat[], weights: readonly number[]): Quat {
  const names = turns.map((_, index) => `source_${index}`);
  const sources = turns.map((turn, index) => joint(names[index] ?? '', { turn }));
  const orient = constraint('orient', { sources: names, weights, keepOffset: false });
  const averaged = rigOf([...sources, joint('target')], { constraints: [orient] });
  return rotationOf(matrixIn(worldOf(averaged), 'target'));
}

describe('average of rotations', () => {
  const turns = fc.array(rotation, { minLength: 3, maxLength: 6 });

  it('of equal ones is that one, whatever their signs', () => {
    fc.assert(
      fc.property(rotation, (q) => {
        const flipped = q.map((value) => -value) as unknown as Quat;
        expectSameRotation(averageOf([q, flipped, q], [0.2, 0.5, 0.3]), q, 1e-9);
      }),
    );
  });

  it('is always a rotation', () => {
    fc.assert(
      fc.property(turns, (list) => {
        const result = averageOf(
          list,
          list.map(() => 1 / list.length),
        );
        expect(Math.hypot(...result)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('of three evenly spread about one axis is the middle one', () => {
    const about = (angle: number): Quat => eulerToQuat([0, angle, 0], 'xyz');
    const third = 1 / 3;
    expectSameRotation(averageOf([about(10), about(40), about(70)], [third, third, third]), about(40), 1e-12);
  });
});
