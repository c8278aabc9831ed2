import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';

const CODE = 'part-on-one-side';
const ears = (...sides: readonly string[]): string => `format: 1
recipe: demo
parts:
  root: { kind: root }
${sides.map((side, index) => `  ear_${'ab'[index]}: { kind: strand, side: ${side}, points: [base, tip], joints: 3 }\n`).join('')}landmarks:
  base: { side: left, at: [4, 60, 0] }
  tip: { side: left, at: [8, 70, 0] }
`;

function told(text: string): readonly string[] {
  const { findings } = compile({ recipe: { name: 'rule.recipe.yaml', text } });
  expect(findings.filter(({ severity }) => severity === 'error')).toEqual([]);
  return findings
    .filter(({ code }) => code === CODE)
    .map(({ span, message, fix }) => `${text.slice(span.start, span.end)}: ${message} ${fix?.title}`);
}

describe(CODE, () => {
  it('points at the side and writes both', () => {
    expect(told(ears('left'))).toEqual(['left: The part "ear_a" stands on the left only. Write both']);
  });

  it('is silent about parts on both sides, in the middle, and about a left and a right one', () => {
    expect(told(ears('both'))).toEqual([]);
    expect(told(ears('centre'))).toEqual([]);
    expect(told(ears('left', 'right'))).toEqual([]);
  });
});
