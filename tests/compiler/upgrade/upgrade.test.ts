import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile, emitUpgrade, planUpgrade, type Rig, runUpgrade, samples } from '@/compiler';
import { sha256Hex } from '@/compiler/hash/sha256Hex';
import { findEvaluationRing } from '@/compiler/pose/evaluationOrder';
import type { PoseValues } from '@/compiler/rig/Rig';
import { UPGRADE_HEAD } from '@/compiler/upgrade/emitUpgrade';
import { arbitraryRig } from '../slipway/arbitraryRig';

const HEAD = `format: 1
recipe: demo
title: Demonstration
landmarks:
  a: { at: [0, 10, 0] }
  b: { at: [0, 20, 1] }
  c: { at: [0, 30, 0] }
  d: { at: [4, 30, 0] }
parts:
  root: { kind: root }
`;
const BASE = `${HEAD}chains:
  neck: { points: [a, b, c], parent: root }
controls:
  nod: { at: c, align: neck.a, parent: root, attributes: { sway: { min: 0, max: 1 } } }
  turn: { at: d, parent: root }
constraints:
  nod_turn: { kind: orient, target: neck.a, sources: { nod: 1 } }
  turn_turn: { kind: orient, target: neck.b, sources: { turn: 1 } }
drivers:
  sway: { input: nod.sway, target: neck.a, channel: rz, keys: [[0, 0], [1, 20]] }
`;

const rigOf = (text: string): Rig => {
  const { rig, findings } = compile({ recipe: { name: 'demo.recipe.yaml', text }, trials: false });
  if (!rig) throw new Error(findings.map(({ message }) => message).join('\n'));
  return rig;
};

/** Upgrades and proves it: run(old) then run(upgrade) is run(new). */
function upgraded(before: Rig, after: Rig, pose: PoseValues = {}) {
  const text = emitUpgrade(planUpgrade(before, after));
  const run = runUpgrade(before, { name: 'demo.up.slip', text }, pose);
  expect(run.findings).toEqual([]);
  expect(run.rig).toEqual(after);
  const lines = text.split('\n').slice(2, -2);
  return { lines, verbs: lines.map((line) => line.split(' ')[0]), pose: run.pose };
}

const base = rigOf(BASE);
const nameOf = (rig: Rig, id: string): string => rig.nodes.find((node) => node.id === id)?.name ?? '';

describe('an upgrade', () => {
  it('of a rig to itself changes nothing', () => {
    expect(upgraded(base, base).lines).toEqual([]);
  });

  it('renames what stands alike under another id, and keeps its pose', () => {
    const after = rigOf(
      BASE.replaceAll('turn:', 'twist:').replace('turn: 1', 'twist: 1').replace('{ turn', '{ twist'),
    );
    const from = nameOf(base, 'turn');
    const to = nameOf(after, 'twist');
    const { lines, pose } = upgraded(base, after, { [from]: { rz: 30 } });
    expect(lines).toContain(`rename "${from}" to="${to}"`);
    expect(lines.filter((line) => line.startsWith('remove'))).toEqual([]);
    expect(pose).toEqual({ [to]: { rz: 30 } });
  });

  it('lets two things change names', () => {
    const swap: Rig = JSON.parse(
      JSON.stringify(base).replaceAll(
        new RegExp(`"(${nameOf(base, 'nod')}|${nameOf(base, 'turn')})"`, 'g'),
        (_, name: string) => `"${name === nameOf(base, 'nod') ? nameOf(base, 'turn') : nameOf(base, 'nod')}"`,
      ),
    ) as Rig;
    const { verbs } = upgraded(base, swap, { [nameOf(base, 'nod')]: { rx: 1 } });
    expect(verbs.filter((verb) => verb === 'rename').length).toBeGreaterThanOrEqual(3);
  });

  it('adds, removes, moves rest, re-parents and changes solvers in place', () => {
    const changes = [
      BASE.replace('turn: { at: d, parent: root }', 'turn: { at: d, parent: nod }'),
      BASE.replace('d: { at: [4, 30, 0] }', 'd: { at: [7, 31, 2] }'),
      BASE.replace('min: 0, max: 1 }', 'min: 0, max: 2, note: sways }'),
      BASE.replace('points: [a, b, c]', 'points: [a, b, c, d]'),
      BASE.replace('keys: [[0, 0], [1, 20]]', 'keys: [[0, 0], [1, 35]], curve: smooth'),
      `${BASE}guide_lines:\n  lead: { from: nod, to: neck.c }\n`,
      BASE.replace(/ {2}turn_turn:.*\n/, '').replace(/ {2}turn: .*\n/, ''),
      BASE.replace('scene:', '').replace('landmarks:', 'scene: { unit: m }\nlandmarks:'),
      `${BASE}notes: { take: 3 }\n`,
    ];
    for (const change of changes) {
      const after = rigOf(change);
      expect(upgraded(base, after).lines.length).toBeGreaterThan(0);
      upgraded(after, base);
    }
  });

  it('carries values of an attribute on to its new name', () => {
    const after = rigOf(BASE.replace('{ sway: { min', '{ lean: { min').replace('nod.sway', 'nod.lean'));
    const control = nameOf(base, 'nod');
    const { lines, pose } = upgraded(base, after, { [control]: { sway: 0.5, rx: 3 } });
    expect(lines).toContain(`remap "${control}" from="sway" to="lean"`);
    expect(pose).toEqual({ [control]: { lean: 0.5, rx: 3 } });
  });
});

describe('between any two samples', () => {
  const rigs = samples.map(
    ({ id, text }) =>
      [
        id,
        compile({ recipe: { name: id, text }, character: { name: 'cast' }, trials: false }).rig as Rig,
      ] as const,
  );
  it.each(rigs.flatMap(([from, old]) => rigs.map(([to, now]) => [from, to, old, now] as const)))(
    '%s → %s',
    (_, __, old, now) => {
      upgraded(old, now);
    },
  );
});

describe('between any two rigs', () => {
  /** Two rigs that share some of their nodes, as versions do. */
  const versions = fc
    .tuple(arbitraryRig, arbitraryRig, fc.nat({ max: 12 }))
    .map(([first, second, shared]): readonly [Rig, Rig] => {
      const kept = first.nodes.slice(0, shared);
      const names = new Set(kept.map(({ name }) => name));
      const others = second.nodes.filter(({ name }) => !names.has(name));
      const after: Rig = {
        ...second,
        nodes: [...kept, ...others.filter(({ kind }) => kind !== 'line')],
        constraints: [],
        solvers: [],
        spaces: [],
        drivers: [],
        skins: [],
        shapes: [],
      };
      return [first, after];
    })
    .filter(([, after]) => {
      const known = new Set<string>();
      for (const { name, parent } of after.nodes) {
        if (parent !== null && !known.has(parent)) return false;
        known.add(name);
      }
      return findEvaluationRing(after) === null;
    });

  it('leads exactly to the other, there and back', () => {
    fc.assert(
      fc.property(versions, ([before, after]) => {
        upgraded(before, after);
        upgraded(after, before);
      }),
      { numRuns: 150, seed: 20261201 },
    );
  });
});

describe('an upgrade script', () => {
  const after = rigOf(`${BASE}notes: { take: 3 }\n`);
  const text = emitUpgrade(planUpgrade(base, after));
  const codesOf = (script: string, rig = base) =>
    runUpgrade(rig, { name: 'x.up.slip', text: script }).findings.map(({ code }) => code);
  const seal = (lines: readonly string[]): string => {
    const body = `${lines.join('\n')}\n`;
    return `${body}end steps=${lines.length} sha256="${sha256Hex(body)}"\n`;
  };
  const head = text.split('\n').slice(0, 2);

  it('is refused by any other scene, altered, or cut short', () => {
    expect(codesOf(text, after)).toEqual(['upgrade-other-scene']);
    expect(codesOf(text.replace('take', 'cake'))).toEqual(['script-altered']);
    expect(codesOf(text.slice(0, -20))).toEqual(['script-truncated']);
    expect(codesOf(text.replace(UPGRADE_HEAD, 'slipway 1'))).toEqual(['script-version-unknown']);
  });

  it('says which line cannot be carried out', () => {
    const name = nameOf(base, 'nod');
    const other = nameOf(base, 'turn');
    expect(codesOf(seal([...head, 'remove "nobody"']))).toEqual(['upgrade-name-unknown']);
    expect(codesOf(seal([...head, `rename "${name}" to="${other}"`]))).toEqual(['upgrade-name-taken']);
    expect(codesOf(seal([...head, `rename "${name}" too="x"`]))).toEqual(['upgrade-key-wrong']);
    expect(codesOf(seal([...head, `set "${name}" shape=banana`]))).toEqual(['upgrade-key-wrong']);
    expect(codesOf(seal([...head, 'dance "x"']))).toEqual(['script-verb-unknown']);
    expect(codesOf(seal([...head, `remove "${name}"`]))).toEqual(['upgrade-other-result']);
    expect(codesOf(seal(head))).toEqual(['upgrade-other-result']);
  });

  it('is never the cause of a throw', () => {
    fc.assert(
      fc.property(
        fc.nat(),
        fc.nat({ max: 4 }),
        fc.string({ unit: 'binary', maxLength: 4 }),
        (at, remove, insert) => {
          const body = text.split('\n').slice(0, -2).join('\n');
          const place = at % body.length;
          const changed = body.slice(0, place) + insert + body.slice(place + remove);
          const { rig, findings } = runUpgrade(base, { name: 'x', text: seal(changed.split('\n')) });
          expect(rig === null).toBe(findings.length > 0);
        },
      ),
      { numRuns: 200, seed: 20261201 },
    );
  });
});
