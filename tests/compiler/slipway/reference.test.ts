import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type KeyRule, VERBS } from '@/compiler/slipway/verbs';

const reference = readFileSync(new URL('../../../compiler/slipway/reference.md', import.meta.url), 'utf8');

/** Keys with their kinds as the section of a verb lists them. */
function keysInReference(verb: string): readonly (readonly [string, string])[] {
  const section = reference.split(`\n### ${verb} (`)[1]?.split('\n#')[0] ?? '';
  return [...section.matchAll(/^\| (\w+\??) \| (.+) \|$/gm)]
    .map((match) => [match[1] ?? '', match[2] ?? ''] as const)
    .filter(([key, kind]) => !(key === 'key' && kind === 'kind'));
}

describe('the reference', () => {
  it('has a section for every verb and for no other', () => {
    const sections = [...reference.matchAll(/^### (\w+) \(/gm)].map((match) => match[1]);
    expect(sections).toEqual(Object.keys(VERBS));
  });

  it.each(Object.entries(VERBS))('lists the keys of %s as the compiler knows them', (verb, rule) => {
    const keys: Readonly<Record<string, KeyRule>> = rule.keys;
    const expected = Object.entries(keys).map(([key, { kind, optional }]) => [
      optional ? `${key}?` : key,
      typeof kind === 'string' ? kind : kind.join(', '),
    ]);
    expect(keysInReference(verb)).toEqual(expected);
  });

  it('says of every verb whether its name is new', () => {
    for (const [verb, rule] of Object.entries(VERBS)) {
      expect(reference).toContain(`### ${verb} (${rule.name === 'new' ? 'new' : 'of '}`);
    }
  });
});
