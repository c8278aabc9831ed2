import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { slipwayFindings } from '@/compiler/slipway/findings';
import { findingsOf, SCENE } from './scripts';

const folder = new URL('../../../compiler/slipway/pages/', import.meta.url);

/** Lines of the script under a heading; none where the page explains in words. */
function linesUnder(page: string, heading: string): readonly string[] {
  const section = page.split(`\n## ${heading}\n`)[1]?.split('\n## ')[0] ?? '';
  return /```slip\n([\s\S]*?)\n```/.exec(section)?.[1]?.split('\n') ?? [];
}

/** Pages show the lines that matter; the scene before them is understood unless they open one. */
const run = (lines: readonly string[]) =>
  lines[0]?.startsWith('scene ') ? findingsOf(...lines) : findingsOf(SCENE, ...lines);

describe('pages of script findings', () => {
  const pages = readdirSync(folder).map((name) => {
    const text = readFileSync(new URL(name, folder), 'utf8');
    return {
      code: name.replace('.page.md', ''),
      wrong: linesUnder(text, 'Wrong'),
      right: linesUnder(text, 'Right'),
    };
  });

  it('are there for every code and no other', () => {
    expect(pages.map(({ code }) => code).sort()).toEqual(Object.keys(slipwayFindings).sort());
  });

  it.each(pages.filter(({ wrong }) => wrong.length > 0))(
    '$code: Wrong gives exactly this code, Right none',
    ({ code, wrong, right }) => {
      expect([...new Set(run(wrong).map((finding) => finding.code))]).toEqual([code]);
      expect(run(wrong).map((finding) => finding.code)).toHaveLength(1);
      expect(right.length).toBeGreaterThan(0);
      expect(run(right)).toEqual([]);
    },
  );

  it('only what concerns the whole file is told in words', () => {
    const inWords = pages.filter(({ wrong }) => wrong.length === 0).map(({ code }) => code);
    expect(inWords.sort()).toEqual([
      'script-altered',
      'script-too-long',
      'script-truncated',
      'script-version-unknown',
    ]);
  });
});
