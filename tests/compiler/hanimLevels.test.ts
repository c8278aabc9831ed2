import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compile, createPoser, runScript } from '@/compiler';
import { hanimRecipe, type StandardJoint } from './hanimRecipe';

/**
 * Sources: ISO/IEC 19774:2005 Annex A (levels one to three) and ISO/IEC 19774-1:2019 (level four), both read from
 * example files and not from the standards' own text; see the heads of the two files under tests/data/hanim. Which
 * joints belong to which of the levels one to three is from memory of the Annex's tables.
 */
interface TableJoint {
  readonly name: string;
  readonly parent: string | null;
  readonly center: readonly [number, number, number] | null;
  readonly loa?: number;
}

const read = (name: string) => readFileSync(new URL(`../data/hanim/${name}`, import.meta.url), 'utf8');
const tableOf = (name: string) => (JSON.parse(read(name)) as { joints: readonly TableJoint[] }).joints;
const fineTable = tableOf('loa3_joints.json') as readonly (StandardJoint & { loa: number })[];
const finestTable = tableOf('loa4_hierarchy.json');

/** A level's joints, each under its nearest ancestor there: the standard leaves finer joints out of coarser levels. */
function levelOf(level: number): readonly StandardJoint[] {
  const byName = new Map(fineTable.map((joint) => [joint.name, joint]));
  return fineTable
    .filter(({ loa }) => loa <= level)
    .map((joint) => {
      let { parent } = joint;
      while (parent !== null && (byName.get(parent)?.loa ?? 0) > level)
        parent = byName.get(parent)?.parent ?? null;
      return { ...joint, parent };
    });
}

/**
 * Level four with a place for the joints whose centres the table leaves out: a centimetre below the parent and, so
 * that brothers and sisters differ, a centimetre further outward for each. Names and hierarchy alone are checked there.
 */
function levelFour(): readonly StandardJoint[] {
  const placed = new Map<string, StandardJoint>();
  const children = new Map<string | null, number>();
  for (const { name, parent, center } of finestTable) {
    const count = children.get(parent) ?? 0;
    children.set(parent, count + 1);
    const [x, y, z] = placed.get(parent ?? '')?.center ?? [0, 0, 0];
    const outward = (name.startsWith('r_') ? -0.01 : 0.01) * count;
    placed.set(name, { name, parent, center: center ?? [x + outward, y - 0.01, z] });
  }
  return [...placed.values()];
}

function build(name: string, joints: readonly StandardJoint[]) {
  const compilation = compile({
    recipe: { name: `${name}.recipe.yaml`, text: hanimRecipe(name, joints) },
    houses: { 'hanim@1': { name: 'hanim.house.yaml', text: read('hanim.house.yaml') } },
  });
  const { rig } = runScript({ name: `${name}.slip`, text: compilation.script ?? '' });
  const kinds = new Map(rig?.nodes.map((node) => [node.name, node.kind]) ?? []);
  const made = rig?.nodes.flatMap((node, index) => {
    const parent = node.parent !== null && kinds.get(node.parent) === 'joint' ? node.parent : null;
    return node.kind === 'joint' ? [{ name: node.name, parent, index }] : [];
  });
  const poser = rig ? createPoser(rig) : null;
  poser?.evaluate();
  const placeOf = (index: number) => [12, 13, 14].map((cell) => poser?.world[index * 16 + cell]);
  return { compilation, made: made ?? [], placeOf };
}

const byName = (a: { name: string }, b: { name: string }) => (a.name < b.name ? -1 : 1);
const hierarchy = (joints: readonly { name: string; parent: string | null }[]) =>
  joints.map(({ name, parent }) => ({ name, parent })).sort(byName);

describe.each([
  { level: 1, count: 18, joints: levelOf(1), unplaced: [] as readonly string[] },
  { level: 2, count: 71, joints: levelOf(2), unplaced: [] },
  { level: 3, count: 94, joints: levelOf(3), unplaced: [] },
  {
    level: 4,
    count: 146,
    joints: levelFour(),
    unplaced: finestTable.filter(({ center }) => center === null).map(({ name }) => name),
  },
])('H-Anim (ISO/IEC 19774) level of articulation $level', ({ level, count, joints, unplaced }) => {
  const { compilation, made, placeOf } = build(`loa${level}`, joints);

  it('compiles without errors', () => {
    expect(compilation.findings.filter(({ severity }) => severity === 'error')).toEqual([]);
  });

  it(`builds exactly the ${count} joints of the table, each under its parent`, () => {
    expect(made).toHaveLength(count);
    expect(hierarchy(made)).toEqual(hierarchy(joints));
  });

  it('puts every joint that has a centre in the table there, to a micrometre', () => {
    const centres = new Map(joints.map(({ name, center }) => [name, center]));
    const compared = made.filter(({ name }) => !unplaced.includes(name));
    expect(compared).toHaveLength(count - unplaced.length);
    for (const { name, index } of compared) {
      const wanted = centres.get(name) ?? [];
      placeOf(index).forEach((value, axis) => {
        expect(Math.abs((value ?? Number.NaN) - (wanted[axis] ?? Number.NaN)), name).toBeLessThan(1e-6);
      });
    }
  });
});

it('leaves out 58 centres of level four, as its table does', () => {
  expect(finestTable.filter(({ center }) => center === null)).toHaveLength(58);
});
