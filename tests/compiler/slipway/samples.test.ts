import { describe, expect, it } from 'vitest';
import { compile, samples } from '@/compiler';
import { createPoser } from '@/compiler/pose/createPoser';
import { runScript } from '@/compiler/slipway/runScript';
import { expectNear } from '../math/expectNear';

describe('scripts of the samples', () => {
  it.each(samples)(
    '$id: run gives the compiled rig, and its links leave rest where it is',
    ({ id, text }) => {
      const { rig, script } = compile({ recipe: { name: `${id}.recipe.yaml`, text } });
      if (rig === null || script === null) throw new Error(`${id} does not compile`);
      const run = runScript({ name: `${id}.slip`, text: script });
      expect(run.findings).toEqual([]);
      expect(run.rig).toEqual(rig);
      const free = createPoser({ ...rig, constraints: [], solvers: [] }).world;
      const extent = Math.max(...Array.from(free, Math.abs));
      expectNear(createPoser(rig).world, free, extent * 1e-9);
    },
  );
});
