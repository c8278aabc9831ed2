import { expect, it } from 'vitest';
import { compile, samples } from '@/compiler';
import { readJointRanges } from './jointRanges';

it('reads opposite movements as one range about one axis', () => {
  const ranges = readJointRanges();
  expect(ranges.elbow).toEqual({ flexion: { min: 0, max: 150 } });
  expect(ranges.ankle).toEqual({ flexion: { min: -50, max: 20 } });
  expect(ranges.shoulder?.abduction).toEqual({ min: 0, max: 180 });
  expect(ranges.forearm).toEqual({ rotation: { min: -80, max: 80 } });
  expect(ranges.cervical).toEqual({
    flexion: { min: -45, max: 45 },
    abduction: { min: -45, max: 45 },
    rotation: { min: -60, max: 60 },
  });
});

it.each(['elbow', 'knee'])(
  'lets the %s of the hare, which walks upright, fold as far as a person’s',
  (joint) => {
    const text = samples.find(({ id }) => id === 'hare')?.text ?? '';
    const { rig } = compile({ recipe: { name: 'hare.recipe.yaml', text }, trials: false });
    const limits = rig?.nodes.flatMap((node) =>
      node.kind === 'joint' && node.id.endsWith(`.${joint}`) ? [node.limits.rz] : [],
    );
    const { min, max } = readJointRanges()[joint]?.flexion ?? { min: 0, max: 0 };
    expect(limits).toHaveLength(2);
    for (const limit of limits ?? []) {
      const travel = (limit?.max ?? 0) - (limit?.min ?? 0);
      expect(travel / (max - min)).toBeGreaterThan(0.9);
      expect(travel / (max - min)).toBeLessThan(1.1);
    }
  },
);
