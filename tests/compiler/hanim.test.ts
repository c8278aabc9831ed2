import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compile, createPoser, runScript } from '@/compiler';

/**
 * Source: ISO/IEC 19774:2005 Annex A, read from the Web3D Consortium's example file; see the head of
 * tests/data/hanim/loa3_joints.json. Which joints belong to level one is from memory of the Annex's tables.
 */
interface StandardJoint {
  readonly name: string;
  readonly parent: string | null;
  readonly center: readonly [number, number, number];
  readonly loa: number;
}

const read = (name: string) => readFileSync(new URL(`../data/hanim/${name}`, import.meta.url), 'utf8');
const table = (JSON.parse(read('loa3_joints.json')) as { joints: StandardJoint[] }).joints;
const byName = new Map(table.map((joint) => [joint.name, joint]));
const levelOne = table.filter(({ loa }) => loa <= 1);

/** The nearest ancestor that level one has: the standard leaves finer joints out of coarser levels. */
function parentAtLevelOne(joint: StandardJoint): string | null {
  let parent = joint.parent;
  while (parent !== null && (byName.get(parent)?.loa ?? 0) > 1) parent = byName.get(parent)?.parent ?? null;
  return parent;
}

describe('H-Anim (ISO/IEC 19774) level of articulation one', () => {
  const compilation = compile({
    recipe: { name: 'loa1.recipe.yaml', text: read('loa1.recipe.yaml') },
    houses: { 'hanim@1': { name: 'hanim.house.yaml', text: read('hanim.house.yaml') } },
  });
  const { rig } = runScript({ name: 'loa1.slip', text: compilation.script ?? '' });
  const poser = rig ? createPoser(rig) : null;
  poser?.evaluate();

  it('compiles without errors; of the trials only names fails, for the standard leaves characters out of them', () => {
    expect(compilation.findings.filter(({ severity }) => severity === 'error')).toEqual([]);
    const failed = compilation.trials.filter(({ passed }) => !passed).map(({ trial }) => trial);
    expect(failed).toEqual(['names']);
  });

  it('builds exactly the eighteen joints of the table', () => {
    const joints = rig?.nodes.filter(({ kind }) => kind === 'joint').map(({ name }) => name) ?? [];
    expect([...joints].sort()).toEqual(levelOne.map(({ name }) => name).sort());
    expect(joints).toHaveLength(18);
  });

  it.each(levelOne.map((joint) => [joint.name, joint] as const))(
    'has %s where and under what the standard says',
    (name, joint) => {
      const index = rig?.nodes.findIndex((node) => node.name === name) ?? -1;
      const node = rig?.nodes[index];
      const parent = rig?.nodes.find((candidate) => candidate.name === node?.parent);
      expect(parent?.kind === 'joint' ? parent.name : null).toBe(parentAtLevelOne(joint));
      for (let axis = 0; axis < 3; axis += 1) {
        expect(poser?.world[index * 16 + 12 + axis]).toBeCloseTo(joint.center[axis] as number, 6);
      }
    },
  );
});
