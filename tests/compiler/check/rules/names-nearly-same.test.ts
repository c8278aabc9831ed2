import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'names-nearly-same';
const points = (...names: readonly string[]): string =>
  `landmarks:\n${names.map((name, index) => `  ${name}: { at: [0, ${index}, 0] }\n`).join('')}`;

describe(CODE, () => {
  it('points at the later name', () => {
    expect(told(CODE, points('fin_1', 'fin_01'))).toEqual([
      ['fin_01', '"fin_01" can hardly be told from "fin_1".'],
    ]);
    expect(told(CODE, points('ear_tip', 'eartip')).map(([text]) => text)).toEqual(['eartip']);
  });

  it('is silent about names with other numbers or words, and about different collections', () => {
    expect(told(CODE, points('fin_1', 'fin_10', 'fin_2', 'fins'))).toEqual([]);
    expect(told(CODE, `params:\n  ear_tip: { default: 1 }\n${points('eartip')}`)).toEqual([]);
  });
});
