import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { build, Refused } from '@/compiler/conformance/adapter.mjs';
import { features } from '@/compiler/conformance/features';
import { makeConformanceKit } from '@/compiler/conformance/makeConformanceKit';
import type { PoseValues } from '@/compiler/rig/Rig';
import { runScript } from '@/compiler/slipway/runScript';
import { VERBS } from '@/compiler/slipway/verbs';
import { MemoryHost } from './memoryHost';

interface Expected {
  readonly tolerance: number;
  readonly poses: readonly {
    readonly pose: PoseValues;
    readonly world: Readonly<Record<string, readonly number[]>>;
    readonly weights: Readonly<Record<string, number>>;
  }[];
}

const kit = new Map(makeConformanceKit().map(({ name, text }) => [name, text]));
const scriptOf = (id: string): string => kit.get(`features/${id}.slip`) ?? '';
const expectedOf = (id: string): Expected =>
  JSON.parse(kit.get(`features/${id}.expected.json`) ?? '') as Expected;

async function built(script: string): Promise<MemoryHost> {
  const host = new MemoryHost();
  await build(script, host);
  return host;
}

describe('the kit', () => {
  it('shows every verb of Slipway and every kind of constraint', () => {
    const scripts = features.map(({ id }) => scriptOf(id)).join('\n');
    for (const verb of Object.keys(VERBS)) expect(scripts).toMatch(new RegExp(`^${verb} "`, 'm'));
    for (const kind of ['parent', 'point', 'orient', 'scale', 'aim']) {
      expect(scripts).toMatch(new RegExp(`^constrain .* kind=${kind} `, 'm'));
    }
  });

  it('has poses in which things move', () => {
    for (const { id } of features) {
      const { poses } = expectedOf(id);
      expect(poses.length).toBeGreaterThan(1);
      const [rest, ...others] = poses.map(({ world, weights }) => JSON.stringify([world, weights]));
      for (const other of others) expect(other).not.toBe(rest);
    }
  });

  it('is the same every time', () => {
    const again = makeConformanceKit();
    expect(again.map(({ text }) => text)).toEqual([...kit.values()]);
  });
});

describe('the adapter skeleton', () => {
  it('is at most about 300 lines', () => {
    const text = readFileSync(new URL('../../../compiler/conformance/adapter.mjs', import.meta.url), 'utf8');
    expect(text.split('\n').length).toBeLessThan(300);
    expect(kit.get('adapter.mjs')).toBe(text);
  });

  it.each(features.map(({ id }) => id))('passes %s with a host in memory', async (id) => {
    const host = await built(scriptOf(id));
    expect(host.rig).toEqual(runScript({ name: `${id}.slip`, text: scriptOf(id) }).rig);
    const { poses, tolerance } = expectedOf(id);
    for (const { pose, world, weights } of poses) {
      const made = host.evaluate(pose);
      const positions = Object.values(world).flatMap((matrix) => matrix.slice(12, 15).map(Math.abs));
      const allowed = tolerance * Math.max(1, ...positions);
      expect([...made.world.keys()]).toEqual(Object.keys(world));
      for (const [name, matrix] of Object.entries(world)) {
        matrix.forEach((value, index) => {
          expect(Math.abs((made.world.get(name)?.[index] ?? Number.NaN) - value)).toBeLessThanOrEqual(
            allowed,
          );
        });
      }
      for (const [name, weight] of Object.entries(weights))
        expect(made.weights.get(name)).toBeCloseTo(weight, 9);
    }
  });

  const script = scriptOf('two_bone');

  it('refuses an altered or truncated script before its first step', async () => {
    const lines = script.split('\n');
    const wrong = [
      script.replace('slipway 1', 'slipway 2'),
      script.replace('goal', 'gaol'),
      [...lines.slice(0, 5), ...lines.slice(6)].join('\n'),
      script.slice(0, -1),
      script.slice(0, script.length / 2),
      `${script}\n`,
      '',
    ];
    for (const text of wrong) {
      const host = new MemoryHost();
      await expect(build(text, host)).rejects.toBeInstanceOf(Refused);
      expect(host.calls).toEqual([]);
    }
  });
});
