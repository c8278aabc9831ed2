import { describe, expect, it } from 'vitest';
import { samples, shapeLines } from '@/compiler';
import { drawRig } from '@/components/viewport/drawing';
import { builtSample, builtText } from './sample';

const SIDES = ['left', 'right', 'centre'] as const;

describe('a rig as strokes', () => {
  it.each(samples.map(({ id }) => id))(
    '%s: a rigger sees every joint, bone, control and guide line',
    (id) => {
      const built = builtSample(id);
      const { nodes, scene } = built.rig;
      const drawing = drawRig(built, 'rigger');
      const byName = new Map(nodes.map((node) => [node.name, node]));
      const joints = nodes.filter(({ kind }) => kind === 'joint');
      const bones = joints.filter(({ parent }) => parent !== null && byName.get(parent)?.kind === 'joint');
      expect(drawing.joints).toHaveLength(joints.length);
      expect(drawing.bones).toHaveLength(bones.length);
      expect(drawing.leaders).toHaveLength(nodes.filter(({ kind }) => kind === 'line').length);
      expect(drawing.outlines.size).toBe(nodes.filter(({ kind }) => kind === 'control').length);
      for (const side of SIDES) {
        expect(drawing.joints.filter((mark) => mark.side === side)).toHaveLength(
          joints.filter((node) => node.side === side).length,
        );
        const numbers = nodes.flatMap((node) =>
          node.kind === 'control' && node.side === side
            ? shapeLines(node.shape, scene).map((line) => (line.length - 1) * 6)
            : [],
        );
        expect(drawing.controls[side]).toHaveLength(numbers.reduce((sum, count) => sum + count, 0));
      }
    },
  );

  it('is the same on both sides of the hare', () => {
    const drawing = drawRig(builtSample('hare'), 'rigger');
    const of = (side: string) => drawing.joints.filter((mark) => mark.side === side);
    expect(of('left').length).toBeGreaterThan(0);
    expect(of('right')).toHaveLength(of('left').length);
    expect(drawing.controls.right).toHaveLength(drawing.controls.left.length);
    // Left is +x in the scene of the sample; twins lie opposite one another.
    for (const { at } of of('left')) {
      expect(at[0]).toBeGreaterThan(0);
      const twin = of('right').find(({ at: other }) =>
        [other[0] + at[0], other[1] - at[1], other[2] - at[2]].every((gap) => Math.abs(gap) < 1e-6),
      );
      expect(twin).toBeDefined();
    }
  });

  it('hides from an animator what roles and containers hide: skin joints', () => {
    const built = builtSample('hare');
    const { joints, bones, outlines, low, high } = drawRig(built, 'animator');
    expect(joints).toEqual([]);
    expect(bones).toEqual([]);
    const shown = built.rig.nodes.flatMap((node, index) =>
      node.kind === 'control' && node.shown ? [index] : [],
    );
    expect([...outlines.keys()]).toEqual(shown);
    expect(shown.length).toBeGreaterThan(0);
    // The page must not jump when the audience changes.
    const rigger = drawRig(built, 'rigger');
    expect([low, high]).toEqual([rigger.low, rigger.high]);
  });

  it('puts a control where it stands, as large as it is', () => {
    const built = builtText(
      'format: 1\nrecipe: a\nparts: { root: { kind: root } }\ncontrols: { c: { at: [10, 20, 30], shape: ring, parent: root } }\n',
    );
    const index = built.rig.nodes.findIndex(({ id }) => id === 'c');
    const node = built.rig.nodes[index];
    const ends = drawRig(built, 'rigger').outlines.get(index) ?? [];
    if (node?.kind !== 'control') throw new Error('no control');
    const radii: number[] = [];
    for (let at = 0; at < ends.length; at += 3) {
      radii.push(Math.hypot((ends[at] ?? 0) - 10, (ends[at + 1] ?? 0) - 20, (ends[at + 2] ?? 0) - 30));
    }
    const lines = shapeLines('ring', built.rig.scene).flat();
    const widest = Math.max(...lines.map(([x, y, z]) => Math.hypot(x, y, z))) * node.size;
    expect(Math.max(...radii)).toBeCloseTo(widest, 9);
  });

  it.each(samples.map(({ id }) => id))('%s: is boxed with the whole of every control', (id) => {
    const { low, high, size, outlines, joints } = drawRig(builtSample(id), 'rigger');
    const [outside, flat] = [[...outlines.values()].flat(), joints.flatMap(({ at }) => at)].map((numbers) =>
      numbers.filter((value, index) => {
        const axis = index % 3;
        return value < (low[axis] ?? 0) || value > (high[axis] ?? 0);
      }),
    );
    expect([outside, flat]).toEqual([[], []]);
    expect(size).toBeCloseTo(Math.hypot(high[0] - low[0], high[1] - low[1], high[2] - low[2]), 12);
  });

  it('has a size even with one joint alone, or with nothing', () => {
    const { rig, world } = builtText('format: 1\nrecipe: a\nchains: { c: { points: [[1, 2, 3]] } }\n');
    const nodes = rig.nodes.filter(({ kind }) => kind === 'joint');
    expect(nodes).toHaveLength(1);
    expect(drawRig({ rig: { ...rig, nodes }, world }, 'rigger').size).toBe(1);
    expect(drawRig({ rig: { ...rig, nodes: [] }, world }, 'rigger').size).toBeGreaterThan(0);
  });
});
