import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';
import { RULES } from '@/compiler/check/rules/index';
import type { Finding } from '@/compiler/findings/Finding';
import { PAGES } from '@/compiler/findings/generated/pages';
import { applyFix } from './applyFix';

const SOURCE = 'page.recipe.yaml';

const findingsOf = (text: string): readonly Finding[] => compile({ recipe: { name: SOURCE, text } }).findings;

const WRONG = RULES.map(({ code }) => {
  const section = PAGES[code]?.split('## Wrong')[1]?.split('\n## ')[0] ?? '';
  return { code, text: /```yaml\n([\s\S]*?)```/.exec(section)?.[1] ?? '' };
});

const FIXED = WRONG.flatMap(({ code, text }) => {
  const fix = findingsOf(text).find((finding) => finding.code === code)?.fix;
  return fix ? [[code, text, fix] as const] : [];
});

describe('fixes of rules', () => {
  it.each(FIXED)('%s: the fix ends the finding and brings no error', (code, text, fix) => {
    const count = (findings: readonly Finding[]): number =>
      findings.filter((finding) => finding.code === code).length;
    const after = findingsOf(applyFix(text, fix));
    expect(count(after)).toBeLessThan(count(findingsOf(text)));
    const errors = after.filter(({ severity }) => severity === 'error');
    expect(errors.map((finding) => `${finding.code}: ${finding.message}`)).toEqual([]);
  });

  it.each(FIXED)('%s: the fix edits only the recipe, and no place twice', (_code, text, fix) => {
    const edits = [...fix.edits].sort((a, b) => a.span.start - b.span.start);
    expect(edits.map(({ span }) => span.source)).toEqual(edits.map(() => SOURCE));
    edits.forEach(({ span }, index) => {
      expect(span.start).toBeGreaterThanOrEqual(edits[index - 1]?.span.end ?? 0);
      expect(span.end).toBeLessThanOrEqual(text.length);
    });
  });

  it('are offered by at least half of all rules', () => {
    expect(FIXED.length).toBeGreaterThanOrEqual(RULES.length / 2);
  });
});
