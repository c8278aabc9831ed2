import { describe, expect, it } from 'vitest';
import { buildFiles, compile, createPoser, type Rig, runScript, samples } from '@/compiler';

const compiled = samples.map((sample) => ({
  ...sample,
  compilation: compile({ recipe: { name: `${sample.id}.recipe.yaml`, text: sample.text } }),
}));

function matricesOf(rig: Rig, pose = {}): readonly (readonly number[])[] {
  const poser = createPoser(rig);
  poser.evaluate(pose);
  return rig.nodes.map((_, index) => [...poser.world.subarray(index * 16, index * 16 + 16)]);
}

function expectMatrix(actual: readonly number[], expected: readonly number[], size: number): void {
  for (const [element, value] of expected.entries()) {
    expect(Math.abs((actual[element] ?? Number.NaN) - value)).toBeLessThanOrEqual(1e-9 * size);
  }
}

/** Largest distance from the origin, a measure of the rig's size for tolerances. */
const sizeOf = (rig: Rig): number =>
  Math.max(...matricesOf(rig).flatMap((matrix) => matrix.slice(12, 15).map(Math.abs)));

/** The container ids that hang beneath the carrier, told from the tree itself. */
function isBeneath(rig: Rig, name: string, ancestor: string): boolean {
  const byName = new Map(rig.nodes.map((node) => [node.name, node]));
  for (let node = byName.get(name); node; node = node.parent === null ? undefined : byName.get(node.parent)) {
    if (node.name === ancestor) return true;
  }
  return false;
}

describe.each(compiled.map((item) => [item.id, item] as const))('the sample %s', (_, { compilation }) => {
  const rig = compilation.rig as Rig;

  it('compiles without findings', () => expect(compilation.findings).toEqual([]));

  it('gives the same rig when its script is run', () => {
    const run = runScript({ name: 'sample.slip', text: compilation.script ?? '' });
    expect(run.findings).toEqual([]);
    expect(run.rig).toEqual(rig);
  });

  it('moves nothing at rest, with every constraint and solver at work', () => {
    const bare = matricesOf({ ...rig, constraints: [], solvers: [] });
    for (const [index, matrix] of matricesOf(rig).entries()) {
      expectMatrix(matrix, bare[index] ?? [], sizeOf(rig));
    }
  });

  it('keeps every thing in the container of its role', () => {
    for (const node of rig.nodes) {
      if (node.role === 'container' || node.role === 'seat') continue;
      const group = rig.nodes.find(({ id }) => id === `container.${node.container}`);
      expect(isBeneath(rig, node.name, group?.name ?? '')).toBe(true);
    }
  });

  it('passes every trial', () => {
    expect(compilation.trials.length).toBeGreaterThanOrEqual(12);
    for (const { trial, passed, checked } of compilation.trials) {
      expect([trial, passed]).toEqual([trial, true]);
      expect([trial, checked >= 0]).toEqual([trial, true]);
    }
  });

  it('draws guide lines parked, shown and never selectable', () => {
    const lines = rig.nodes.filter(({ kind }) => kind === 'line');
    for (const line of lines) {
      expect(line.selectable).toBe(false);
      expect(line.shown).toBe(true);
      expect(isBeneath(rig, line.name, rig.nodes.find(({ role }) => role === 'carrier')?.name ?? '')).toBe(
        false,
      );
    }
  });

  it('gives the same bytes every time, and a manifest that names them', async () => {
    const again = compile({
      recipe: { name: 'again', text: samples.find(({ id }) => id === rig.scene.character)?.text ?? '' },
    });
    expect(again.script).toBe(compilation.script);
    const files = await buildFiles(compilation);
    const manifest = JSON.parse(files.at(-1)?.text ?? '') as {
      files: { name: string; bytes: number; sha256: string }[];
    };
    expect(manifest.files.map(({ name }) => name)).toEqual(files.slice(0, -1).map(({ name }) => name));
    expect(manifest.files.length).toBeGreaterThanOrEqual(5);
  });
});

describe('the upright hare posed on both sides', () => {
  const rig = compiled.find(({ id }) => id === 'hare')?.compilation.rig as Rig;
  const nameOf = (id: string): string => rig.nodes.find((node) => node.id === id)?.name ?? '';

  it('bends both arms alike when both shoulders are turned by the same values', () => {
    const turn = { rx: 12, ry: -25, rz: 40 };
    const pose = Object.fromEntries(
      ['left', 'right'].flatMap((side) => [
        [nameOf(`arm.${side}.hand`), { reach: 0 }],
        [nameOf(`arm.${side}.shoulder_fk`), turn],
        [nameOf(`arm.${side}.elbow_fk`), { rz: 30 }],
      ]),
    );
    const posed = matricesOf(rig, pose);
    for (const joint of ['shoulder', 'elbow', 'wrist']) {
      const at = (side: string) =>
        posed[rig.nodes.findIndex(({ id }) => id === `arm.${side}.${joint}`)]?.slice(12, 15) ?? [];
      const [left, right] = [at('left'), at('right')];
      expect(right[0]).toBeCloseTo(-(left[0] ?? Number.NaN), 9);
      expect(right[1]).toBeCloseTo(left[1] ?? Number.NaN, 9);
      expect(right[2]).toBeCloseTo(left[2] ?? Number.NaN, 9);
    }
  });

  it('brings the hand to its goal and keeps the lengths of the arm', () => {
    const hand = nameOf('arm.left.hand');
    const posed = matricesOf(rig, { [hand]: { tx: -6, ty: 8, tz: 5 } });
    const at = (id: string) => posed[rig.nodes.findIndex((node) => node.id === id)]?.slice(12, 15) ?? [];
    const distance = (a: readonly number[], b: readonly number[]) =>
      Math.hypot(...a.map((value, axis) => value - (b[axis] ?? Number.NaN)));
    expect(distance(at('arm.left.wrist'), at('arm.left.hand'))).toBeLessThan(1e-9);
    expect(distance(at('arm.left.shoulder'), at('arm.left.elbow'))).toBeCloseTo(0.186 * 96, 9);
    expect(distance(at('arm.left.elbow'), at('arm.left.wrist'))).toBeCloseTo(0.146 * 96, 9);
  });
});
