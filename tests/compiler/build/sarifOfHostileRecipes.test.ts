import { readdirSync, readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';
import { findingsToSarif } from '@/compiler/build/findingsToSarif';
import { sarifProblems } from './sarifProblems';

/** Source: tests/data/robust, constructed after YAML 1.2.2, Unicode UTS #39 and others named there, from memory. */
const folder = new URL('../../data/robust/', import.meta.url);
const hostile = readdirSync(new URL('yaml/', folder)).filter((name) => name.endsWith('.yaml'));
const names = Object.values(
  JSON.parse(readFileSync(new URL('names.json', folder), 'utf8')) as Record<string, unknown>,
)
  .flat()
  .filter((name) => typeof name === 'string');

/** A log as a reader would get it: written out and read again. */
const logOf = (name: string, text: string): unknown =>
  JSON.parse(JSON.stringify(findingsToSarif(compile({ recipe: { name, text } }).findings)));

describe('SARIF of hostile recipes', () => {
  it('has recipes and names to try', () => {
    expect(hostile.length).toBeGreaterThan(10);
    expect(names.length).toBeGreaterThan(20);
  });

  it.each(hostile)('is valid for %s, and not empty', (name) => {
    const text = readFileSync(new URL(`yaml/${name}`, folder), 'utf8');
    expect(compile({ recipe: { name, text } }).findings.length).toBeGreaterThan(0);
    expect(sarifProblems(logOf(name, text))).toEqual([]);
  });

  it.each(names.map((name) => [JSON.stringify(name).slice(0, 60), name] as const))(
    'is valid for a file, a key and a reference called %s',
    (_, name) => {
      const quoted = JSON.stringify(name);
      const text = `format: 1\nrecipe: a\n${quoted}: 1\nchains: { arm: { points: [${quoted}, b] } }\n`;
      expect(sarifProblems(logOf(name, text))).toEqual([]);
    },
  );

  it('is valid for any text under any name', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.string({ unit: 'binary' }), (name, text) => {
        expect(sarifProblems(logOf(name, text))).toEqual([]);
      }),
    );
  });
});
