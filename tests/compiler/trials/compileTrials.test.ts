import { describe, expect, it } from 'vitest';
import { buildFiles, compile, samples, TRIAL_NAMES } from '@/compiler';

const hare = samples.find(({ id }) => id === 'hare')?.text ?? '';
const compileText = (text: string, more: { readonly trials?: boolean } = {}) =>
  compile({ recipe: { name: 'a.recipe.yaml', text }, ...more });

/** A guide line from a control to a joint that another one moves. */
const ASTRAY = `format: 1
recipe: astray
parts:
  root: { kind: root }
landmarks:
  a: { at: [0, 10, 0] }
  b: { at: [0, 20, 1] }
  c: { at: [0, 30, 0] }
chains:
  neck: { points: [a, b, c] }
controls:
  one: { at: a }
  two: { at: c }
constraints:
  turn: { kind: orient, target: neck.a, sources: { one: 1 } }
  tip: { kind: orient, target: neck.c, sources: { two: 1 } }
guide_lines:
  line: { from: two, to: neck.a }
`;

describe('trials of a compile', () => {
  it('run on every compile, and stand in the manifest with what they measured', async () => {
    const compilation = compileText(hare);
    expect(compilation.trials.map(({ trial }) => trial)).toEqual(TRIAL_NAMES);
    expect(compilation.failing).toBeNull();
    const manifest = JSON.parse((await buildFiles(compilation)).at(-1)?.text ?? '') as {
      trials: { trial: string; passed: boolean; measured: number; tolerance: number; unit: string }[];
    };
    expect(manifest.trials.map(({ trial, passed }) => [trial, passed])).toEqual(
      TRIAL_NAMES.map((trial) => [trial, true]),
    );
    for (const { measured, tolerance } of manifest.trials) expect(measured).toBeLessThanOrEqual(tolerance);
    expect(manifest.trials[0]).toMatchObject({ trial: 'rest', unit: 'cm' });
  });

  it('are left out on demand, and where there is no rig', () => {
    expect(compileText(hare, { trials: false })).toMatchObject({ trials: [], failing: null });
    expect(compileText(hare, { trials: false }).script).toBe(compileText(hare).script);
    expect(compileText('format: 1\nrecipe: hare\ntitel: x\n').trials).toEqual([]);
  });

  it('keep what fails from being built, and show it where it was written', async () => {
    const { findings, rig, script, failing, trials } = compileText(ASTRAY);
    const errors = findings.filter(({ severity }) => severity === 'error');
    expect(errors.map(({ code, span }) => [code, span.startLine, span.startColumn])).toEqual([
      ['trial-guide', 18, 3],
    ]);
    expect(errors[0]?.message).toContain('"line"');
    expect([rig, script]).toEqual([null, null]);
    expect(failing?.rig.nodes.length).toBeGreaterThan(0);
    expect(trials.filter(({ passed }) => !passed).map(({ trial, worst }) => [trial, worst])).toEqual([
      ['guide', ['line']],
    ]);
    expect((await buildFiles(compileText(ASTRAY))).map(({ mediaType }) => mediaType)).toEqual([
      'application/sarif+json',
    ]);
  });

  it('name the control values at which a failure shows', () => {
    const lopsided = ASTRAY.replace('to: neck.a', 'to: neck.c')
      .replace(
        'neck: { points: [a, b, c] }',
        'neck: { points: [a, b, c], limits: { c: { ry: { min: -20, max: 20 } } } }',
      )
      .replace('two: { at: c }', 'two: { at: c, align: neck.c, channels: { ry: { min: -70, max: 10 } } }');
    const { trials, failing } = compileText(lopsided);
    const limits = trials.find(({ trial }) => trial === 'limits');
    const control = failing?.rig.nodes.find(({ id }) => id === 'two')?.name ?? '';
    expect(limits).toMatchObject({ passed: false, worst: ['neck.c'], pose: { [control]: { ry: -70 } } });
  });

  it.each([
    ['nothing', 'format: 1\nrecipe: bare\n'],
    ['a joint at the origin', 'format: 1\nrecipe: bare\nchains: { one: { points: [[0, 0, 0]] } }\n'],
    [
      'a chain that nothing carries',
      'format: 1\nrecipe: bare\nchains: { one: { points: [[0, 1, 0], [0, 2, 0], [0, 3, 1]] } }\n',
    ],
  ])('pass for %s, and have nothing to carry', (_, text) => {
    const { trials } = compileText(text);
    expect(trials.filter(({ passed }) => !passed)).toEqual([]);
    expect(trials.find(({ trial }) => trial === 'carry')).toMatchObject({ checked: 0 });
    for (const { tolerance, unit } of trials) if (unit !== 'things') expect(tolerance).toBeGreaterThan(0);
  });
});
