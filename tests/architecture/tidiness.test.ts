import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { RULES } from '@/compiler/check/rules/index';
import { listSources, projectRoot } from '../support/sourceTree';

const sources = listSources();
const code = sources.filter((file) => /\.(ts|tsx|mjs|mts)$/.test(file) && !file.includes('/generated/'));
const read = (file: string): string => readFileSync(join(projectRoot, file), 'utf8');
/** Put together here, or this file would find itself. */
const word = (...parts: string[]): RegExp => new RegExp(parts.join(''));

describe('tidiness', () => {
  it('leaves nothing for later and silences nothing', () => {
    const marks = word('\\b(TO', 'DO|FIX', 'ME|XX', 'X)\\b|@ts-', '(ignore|nocheck)|\\bas an', 'y\\b');
    expect(code.filter((file) => marks.test(read(file)))).toEqual([]);
  });

  it('skips and focuses no test', () => {
    const marks = word('\\b(it|test|describe)\\.', '(skip|only|todo)\\b');
    expect(code.filter((file) => marks.test(read(file)))).toEqual([]);
  });

  it('keeps files about one thing, under 400 lines', () => {
    expect(code.filter((file) => read(file).split('\n').length > 400)).toEqual([]);
  });

  it('names no path of a machine and no address of a registry', () => {
    const marks = word('(^|[^A-Za-z0-9_.])/', '(work|root|home)/|registry\\.', 'npmjs');
    expect(code.filter((file) => marks.test(read(file)))).toEqual([]);
    expect(word('"resolved": "', 'http').test(read('package-lock.json'))).toBe(false);
  });

  it('has a file and a page for every rule, named by its code', () => {
    for (const { code: name } of RULES) {
      expect(sources).toContain(`compiler/check/rules/${name}.ts`);
      expect(sources).toContain(`compiler/check/rules/${name}.page.md`);
    }
  });
});
