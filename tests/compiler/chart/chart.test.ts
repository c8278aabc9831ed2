import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { JSDOM } from 'jsdom';
import { describe, expect, it } from 'vitest';
import { compile, type Rig, samples } from '@/compiler';
import { chartCsv } from '@/compiler/chart/chartCsv';
import { chartHtml } from '@/compiler/chart/chartHtml';
import { controlChart } from '@/compiler/chart/controlChart';
import { arbitraryRig } from '../slipway/arbitraryRig';

const text = samples.find(({ id }) => id === 'hare')?.text ?? '';
const rig = compile({ recipe: { name: 'hare.recipe.yaml', text }, trials: false }).rig as Rig;
const chart = controlChart(rig);
const entryOf = (id: string) => chart.entries.find((entry) => entry.id === id);

describe('the control chart', () => {
  it('numbers every control that an animator sees', () => {
    const controls = rig.nodes.filter(({ kind, shown }) => kind === 'control' && shown);
    expect(chart.entries.map(({ number }) => number)).toEqual(controls.map((_, index) => index + 1));
  });

  it('says what a control steers, what it may change, and between which ends', () => {
    const hand = entryOf('arm.left.hand');
    expect(hand?.steers).toContain('arm.left.wrist');
    expect(hand?.values.map(({ name }) => name)).toEqual([
      ...['tx', 'ty', 'tz', 'rx', 'ry', 'rz'],
      ...['reach', 'swing', 'stretch', 'space'],
    ]);
    expect(hand?.values.find(({ name }) => name === 'space')).toMatchObject({
      choices: ['root', 'cog', 'spine.high'],
      default: 0,
    });
    const head = entryOf('head.head');
    expect(head?.values.find(({ name }) => name === 'ry')).toMatchObject({ unit: '°', min: -45, max: 45 });
    expect(entryOf('arm.left.pole')?.steers).toContain('arm.left.elbow');
  });
});

/** Reads CSV by RFC 4180. */
function readCsv(csv: string): readonly (readonly string[])[] {
  const rows: string[][] = [];
  let row: string[] = [];
  for (const [, quoted, plain, end] of csv.matchAll(/(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n)/g)) {
    row.push(quoted === undefined ? (plain ?? '') : quoted.replaceAll('""', '"'));
    if (end === ',') continue;
    rows.push(row);
    row = [];
  }
  return rows;
}

describe('as CSV', () => {
  it('has one line for each value, all of one width', () => {
    const [head, ...rows] = readCsv(chartCsv(chart));
    expect(rows).toHaveLength(chart.entries.reduce((count, { values }) => count + values.length, 0));
    for (const row of rows) expect(row).toHaveLength(head?.length ?? 0);
  });

  it('holds nothing that a spreadsheet would work out', () => {
    // Source: tests/data/robust/csv_formula_injection.json, OWASP, from memory.
    const { dangerous_first_characters: starts, examples } = JSON.parse(
      readFileSync(new URL('../../data/robust/csv_formula_injection.json', import.meta.url), 'utf8'),
    ) as { dangerous_first_characters: readonly string[]; examples: readonly string[] };
    for (const note of examples) {
      const entries = chart.entries.slice(0, 1).map((entry) => ({
        ...entry,
        values: entry.values.slice(0, 1).map((value) => ({ ...value, note })),
      }));
      const cell = readCsv(chartCsv({ ...chart, entries }))[1]?.at(-1) ?? '';
      expect(cell).toBe(`'${note}`);
      expect(starts).not.toContain(cell[0]);
    }
  });

  it('keeps whatever rigs may be called to their cells', () => {
    fc.assert(
      fc.property(arbitraryRig, (any) => {
        const [head, ...rows] = readCsv(chartCsv(controlChart(any)));
        for (const row of rows) expect(row).toHaveLength(head?.length ?? 0);
      }),
    );
  });
});

describe('as HTML', () => {
  it('lists every control in a table and in the picture, without scripts or links', () => {
    const { document } = new JSDOM(chartHtml(rig)).window;
    expect(document.querySelectorAll('tbody tr')).toHaveLength(chart.entries.length);
    expect(document.querySelectorAll('svg text')).toHaveLength(chart.entries.length);
    expect(document.querySelectorAll('script, link, img, a, iframe')).toHaveLength(0);
    expect(document.querySelector('dl')?.textContent).toContain('hare');
  });

  it('lets no name become markup', () => {
    fc.assert(
      fc.property(arbitraryRig, (any) => {
        const { document } = new JSDOM(chartHtml(any)).window;
        const tags = new Set([...document.querySelectorAll('*')].map(({ localName }) => localName));
        const known =
          'html head meta title style body h1 figure svg rect path g circle text div table thead tr th tbody td ul li b span dl dt dd';
        for (const tag of tags) expect(known.split(' ')).toContain(tag);
      }),
      { numRuns: 60 },
    );
  });
});
