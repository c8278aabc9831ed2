import { describe, expect, it } from 'vitest';
import { describePose } from '@/compiler/pose/describePose';
import { control, group, line, rigOf } from './rigParts';

const rig = rigOf([
  control('root'),
  control('hand', { parent: 'root', at: [2, 0, 0] }),
  group('parked', { at: [0, 0, 9] }),
  { ...line('leader', 'hand', 'root', { parent: 'parked' }), selectable: false },
]);

describe('describePose', () => {
  it('lists every node with its world matrix, at rest when no values are given', () => {
    const nodes = describePose(rig);
    expect(nodes.map(({ name }) => name)).toEqual(['root', 'hand', 'parked', 'leader']);
    expect(nodes[1]).toEqual({
      name: 'hand',
      id: 'hand',
      kind: 'control',
      parent: 'root',
      container: 'rig',
      role: 'part',
      side: 'centre',
      shown: true,
      selectable: true,
      world: [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 2, 0, 0, 1],
    });
  });

  it('gives a line the posed places of both its ends, though it stays parked itself', () => {
    const leader = describePose(rig, { root: { tx: 1, rz: 90 } })[3];
    expect(leader?.selectable).toBe(false);
    expect(leader?.world.slice(12, 15)).toEqual([0, 0, 9]);
    expect(leader?.ends?.[0].map((value) => Number(value.toFixed(12)))).toEqual([1, 2, 0]);
    expect(leader?.ends?.[1]).toEqual([1, 0, 0]);
  });

  it('shows no −0', () => {
    const nodes = describePose(rig, { root: { rx: 180, ry: 90, rz: -90 } });
    expect(nodes.flatMap(({ world }) => world).some((value) => Object.is(value, -0))).toBe(false);
  });
});
