import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'limit-zero-width';

describe(CODE, () => {
  it('points at the limit of a channel, and locks the channel', () => {
    const body = headControl('channels: { rx: { min: 0, max: 0 }, ry: { min: -1, max: 0 } }');
    expect(told(CODE, body)).toEqual([['{ min: 0, max: 0 }', '"rx" of "head" may only be 0.']]);
    expect(fixed(CODE, body)).toBe(body.replace('{ min: 0, max: 0 }', '{ locked: true }'));
  });

  it('points at the range of an attribute', () => {
    const body = headControl('attributes: { puff: { default: 2, min: 2, max: 2 } }');
    expect(told(CODE, body).map(([text]) => text)).toEqual(['{ default: 2, min: 2, max: 2 }']);
  });

  it('is silent about half limits and locks', () => {
    expect(told(CODE, headControl('channels: { rx: { min: 0 }, ry: { locked: true } }'))).toEqual([]);
  });
});
