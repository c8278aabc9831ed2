import { describe, expect, it } from 'vitest';
import { compile, explainFinding, listFindingCodes, samples } from '@/compiler';
import { findingsToSarif } from '@/compiler/build/findingsToSarif';
import type { Finding } from '@/compiler/findings/Finding';
import { sarifProblems as problems } from './sarifProblems';

const WRONG = `format: 1
recipe: hare
titl: Häsin \u{1f407} # a letter and a sign beyond ASCII before what is wrong
landmarks:
  a: { at: ["=landmarks.b.x", 0, 0] }
  b: { at: "=landmarks.a" }
  c: { at: [1, 2], note: "\u{1f407}", flavour: sweet }
`;
const wrong = (name = 'häsin & co.recipe.yaml') => compile({ recipe: { name, text: WRONG } }).findings;

/** The offset of a line and column, counted by themselves. */
function offsetOf(text: string, line: number, column: number): number {
  const before = text.split('\n').slice(0, line - 1);
  return before.reduce((sum, one) => sum + one.length + 1, 0) + column - 1;
}

describe('findings as SARIF', () => {
  it('refuses what is no SARIF (the check can fail)', () => {
    expect(problems({ version: '2.1.0' })).not.toEqual([]);
    const log = findingsToSarif(wrong());
    expect(problems({ ...log, version: '2.0.0' })).not.toEqual([]);
    expect(problems({ ...log, runs: [{ ...log.runs[0], results: [{ level: 'loud' }] }] })).not.toEqual([]);
  });

  it('is valid for no findings, for errors with fixes and related places, and for every sample', () => {
    expect(problems(findingsToSarif([]))).toEqual([]);
    expect(wrong().some(({ fix }) => fix)).toBe(true);
    expect(wrong().some(({ related }) => related.length > 0)).toBe(true);
    expect(problems(findingsToSarif(wrong()))).toEqual([]);
    for (const { id, text } of samples) {
      const { findings } = compile({ recipe: { name: `${id}.yaml`, text } });
      expect(problems(findingsToSarif(findings))).toEqual([]);
    }
  });

  it('is valid with every code there is, each beside its level', () => {
    const [first] = wrong();
    const every = listFindingCodes().map((code): Finding => {
      const { severity } = explainFinding(code) ?? { severity: 'error' };
      return { ...(first as Finding), code, severity };
    });
    const log = findingsToSarif(every);
    expect(problems(log)).toEqual([]);
    const levels = { error: 'error', warning: 'warning', info: 'note' };
    expect(log.runs[0]?.results?.map(({ level }) => level)).toEqual(
      every.map(({ severity }) => levels[severity]),
    );
    const rules = log.runs[0]?.tool.driver.rules ?? [];
    expect(log.runs[0]?.results?.map(({ ruleIndex }) => rules[ruleIndex ?? -1]?.id)).toEqual(
      listFindingCodes(),
    );
  });

  it('gives regions whose lines, columns and offsets are one place', () => {
    const findings = wrong();
    const results = findingsToSarif(findings).runs[0]?.results ?? [];
    expect(results.length).toBe(findings.length);
    results.forEach(({ locations, relatedLocations = [] }, index) => {
      for (const { physicalLocation } of [...(locations ?? []), ...relatedLocations]) {
        const { startLine, startColumn, endLine, endColumn, charOffset, charLength } =
          physicalLocation?.region ?? {};
        expect(offsetOf(WRONG, startLine ?? 0, startColumn ?? 0)).toBe(charOffset);
        expect(offsetOf(WRONG, endLine ?? 0, endColumn ?? 0)).toBe((charOffset ?? 0) + (charLength ?? 0));
      }
      const { charOffset = 0, charLength = 0 } = locations?.[0]?.physicalLocation?.region ?? {};
      const { start, end } = findings[index]?.span ?? { start: -1, end: -1 };
      expect(WRONG.slice(charOffset, charOffset + charLength)).toBe(WRONG.slice(start, end));
    });
    const covered = results.map(({ ruleId, locations }) => {
      const { charOffset = 0, charLength = 0 } = locations?.[0]?.physicalLocation?.region ?? {};
      return [ruleId, WRONG.slice(charOffset, charOffset + charLength)];
    });
    expect(covered).toContainEqual(['unknown-key', 'titl']);
    expect(covered).toContainEqual(['unknown-key', 'flavour']);
    expect(covered).toContainEqual(['list-size', '[1, 2]']);
  });

  it('writes a file name as the URI it must be', () => {
    const uri = findingsToSarif(wrong()).runs[0]?.results?.[0]?.locations?.[0]?.physicalLocation
      ?.artifactLocation?.uri;
    expect(uri).toBe('h%C3%A4sin%20%26%20co.recipe.yaml');
  });

  it('carries a fix as the text to take out and the text to put in', () => {
    const result = findingsToSarif(wrong()).runs[0]?.results?.find(({ fixes }) => fixes);
    const [replacement] = result?.fixes?.[0]?.artifactChanges[0]?.replacements ?? [];
    const { charOffset = 0, charLength = 0 } = replacement?.deletedRegion ?? {};
    expect(WRONG.slice(charOffset, charOffset + charLength)).toBe('titl');
    expect(replacement?.insertedContent?.text).toBe('title');
  });
});
