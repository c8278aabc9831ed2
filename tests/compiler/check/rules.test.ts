import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { RULES } from '@/compiler/check/rules/index';

const ROOT = join(import.meta.dirname, '../../..');
const endingIn = (folder: string, ending: string): readonly string[] =>
  readdirSync(join(ROOT, folder))
    .filter((file) => file.endsWith(ending))
    .map((file) => file.slice(0, -ending.length))
    .sort();

const CODES = RULES.map(({ code }) => code).sort();

describe('the catalogue of rules', () => {
  it('has no code twice', () => {
    expect(new Set(CODES).size).toBe(CODES.length);
  });

  it('has every rule file in the index, and a page beside each', () => {
    const files = endingIn('compiler/check/rules', '.ts').filter((file) => file !== 'index');
    expect(files).toEqual(CODES);
    expect(endingIn('compiler/check/rules', '.page.md')).toEqual(CODES);
  });

  it('speaks in one sentence of fact and says what to do', () => {
    for (const { message, help, summary } of RULES) {
      for (const text of [message, help, summary]) expect(text).toMatch(/^\S.*[.?]$/);
      expect(message).not.toMatch(/!|please/i);
    }
  });

  it('has at least sixty rules', () => {
    expect(CODES.length).toBeGreaterThanOrEqual(60);
  });
});
