import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'choice-repeated';

describe(CODE, () => {
  it('points at the labels of an attribute', () => {
    expect(told(CODE, headControl('attributes: { mood: { labels: [calm, merry, Calm, calm] } }'))).toEqual([
      ['[calm, merry, Calm, calm]', '"mood" of "head" offers "Calm" twice.'],
    ]);
  });

  it('points at the spaces of a control', () => {
    const body = headControl('spaces: [hub, root, hub]').replace(
      'controls:',
      'controls:\n  hub: { at: [0, 5, 0] }',
    );
    expect(told(CODE, body).map(([text]) => text)).toEqual(['[hub, root, hub]']);
  });

  it('is silent about words that differ', () => {
    expect(told(CODE, headControl('attributes: { mood: { labels: [calm, calmer] } }'))).toEqual([]);
  });
});
