import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compile, createPoser, runScript, samples } from '@/compiler';

/**
 * Source: Drillis and Contini, Body Segment Parameters, TR 1166-03, New York University 1966, as in Winter,
 * Biomechanics and Motor Control of Human Movement, fig. 4.1. Fractions are partly from memory (see the file);
 * the population was never verified, so they are proportions to start from, not truth about anyone.
 */
const fractions = JSON.parse(
  readFileSync(new URL('../data/body/segment_fractions.json', import.meta.url), 'utf8'),
) as {
  lengths: Record<string, number>;
  widths: Record<string, number>;
};

const hare = samples.find(({ id }) => id === 'hare');

function measure(stature: number) {
  const compilation = compile({
    recipe: { name: 'hare', text: hare?.text ?? '' },
    character: { name: 'hare', params: { stature } },
  });
  const { rig } = runScript({ name: 'hare.slip', text: compilation.script ?? '' });
  if (!rig) throw new Error(JSON.stringify(compilation.findings, null, 2));
  const poser = createPoser(rig);
  poser.evaluate();
  const at = (id: string) => {
    const index = rig.nodes.findIndex((node) => node.id === id);
    if (index < 0) throw new Error(`no node ${id}`);
    return [12, 13, 14].map((element) => poser.world[index * 16 + element] as number);
  };
  return (from: string, to: string) => {
    const [a, b] = [at(from), at(to)];
    return Math.sqrt(a.reduce((sum, value, axis) => sum + (value - (b[axis] as number)) ** 2, 0));
  };
}

const segments = [
  ['thigh', 'leg.left.hip', 'leg.left.knee'],
  ['shank', 'leg.left.knee', 'leg.left.ankle'],
  ['upper_arm', 'arm.left.shoulder', 'arm.left.elbow'],
  ['forearm', 'arm.left.elbow', 'arm.left.wrist'],
  ['hand', 'arm.right.wrist', 'hand.right.second.03'],
  ['head_chin_to_vertex', 'head.head.skull', 'head.head.crown'],
] as const;

describe.each([30, 96, 175.04, 260])('the upright hare at a stature of %d cm', (stature) => {
  const distance = measure(stature);

  it.each(segments)('has a %s of the tabled fraction', (segment, from, to) => {
    expect(distance(from, to) / stature).toBeCloseTo(fractions.lengths[segment] as number, 9);
  });

  it('is as wide at shoulders and hips as tabled', () => {
    expect(distance('arm.left.shoulder', 'arm.right.shoulder') / stature).toBeCloseTo(
      2 * (fractions.widths.half_shoulder as number),
      9,
    );
    expect(distance('leg.left.hip', 'leg.right.hip') / stature).toBeCloseTo(
      fractions.widths.hips as number,
      9,
    );
  });
});
