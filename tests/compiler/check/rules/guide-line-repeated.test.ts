import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'guide-line-repeated';
const lines = (...entries: readonly string[]): string => `chains:
  head: { points: [[0, 50, 0], [0, 60, 0]], names: [base, top] }
controls:
  head: { at: [0, 80, 0] }
  brow: { at: [0, 70, 0], parent: head }
constraints:
  turn: { kind: orient, target: head.base, sources: { brow: 1 } }
guide_lines:
${entries.map((entry) => `  ${entry}\n`).join('')}`;
const FIRST = 'one: { from: head, to: brow }';

describe(CODE, () => {
  it('points at the later line and takes it away', () => {
    const body = lines(FIRST, 'two: { from: head, to: brow, style: solid }');
    expect(told(CODE, body)).toEqual([['two', 'The guide line "two" is drawn over "one".']]);
    expect(fixed(CODE, body)).toBe(lines(FIRST));
  });

  it('sees a line that leads the other way', () => {
    expect(told(CODE, lines(FIRST, 'two: { from: brow, to: head }')).map(([text]) => text)).toEqual(['two']);
  });

  it('is silent about lines that share one end', () => {
    expect(told(CODE, lines(FIRST, 'two: { from: head, to: head.base }'))).toEqual([]);
  });
});
