import { describe, expect, it } from 'vitest';
import { compile, explainFinding, listFindingCodes } from '@/compiler';
import { PAGES } from '@/compiler/findings/generated/pages';

const HEADINGS = ['## What it means', '## Wrong', '## Right', '## Why'];

/** The first fenced recipe under a heading; undefined where the page explains in words. */
function recipeUnder(page: string, heading: string): string | undefined {
  const section = page.split(heading)[1]?.split('\n## ')[0] ?? '';
  return /```yaml\n([\s\S]*?)```/.exec(section)?.[1];
}

const codesIn = (text: string): readonly string[] =>
  compile({ recipe: { name: 'page.recipe.yaml', text } }).findings.map(({ code }) => code);

describe('finding pages', () => {
  it('has a page for every code and no page without one', () => {
    expect(Object.keys(PAGES).sort()).toEqual(listFindingCodes());
  });

  it.each(listFindingCodes())('%s: has its four headings in order and its code as title', (code) => {
    const { page } = explainFinding(code) ?? { page: '' };
    expect(page.startsWith(`# ${code}\n`)).toBe(true);
    const places = HEADINGS.map((heading) => page.indexOf(`\n${heading}\n`));
    expect(places.every((place, index) => place > (places[index - 1] ?? 0))).toBe(true);
  });

  const shown = listFindingCodes().flatMap((code) => {
    const page = PAGES[code] ?? '';
    const wrong = recipeUnder(page, '## Wrong');
    const right = recipeUnder(page, '## Right');
    return wrong === undefined || right === undefined ? [] : [[code, wrong, right] as const];
  });

  it.each(shown)('%s: the wrong recipe gives it and no other error', (code, wrong) => {
    const findings = compile({ recipe: { name: 'page.recipe.yaml', text: wrong } }).findings;
    expect(findings.map((finding) => finding.code)).toContain(code);
    const otherErrors = findings.filter((finding) => finding.severity === 'error' && finding.code !== code);
    expect(otherErrors.map((finding) => `${finding.code}: ${finding.message}`)).toEqual([]);
  });

  it.each(shown)('%s: the right recipe does not give it, nor any error', (code, _, right) => {
    expect(codesIn(right)).not.toContain(code);
    const errors = compile({ recipe: { name: 'page.recipe.yaml', text: right } }).findings.filter(
      ({ severity }) => severity === 'error',
    );
    expect(errors.map((finding) => `${finding.code}: ${finding.message}`)).toEqual([]);
  });
});
