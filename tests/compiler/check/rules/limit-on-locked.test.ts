import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'limit-on-locked';

describe(CODE, () => {
  it('points at the channel and keeps the lock', () => {
    const body = headControl('channels: { rx: { locked: true, max: 40 }, ry: { max: 40 } }');
    expect(told(CODE, body)).toEqual([
      ['{ locked: true, max: 40 }', '"rx" of "head" is locked, so its limit is never met.'],
    ]);
    expect(fixed(CODE, body)).toBe(body.replace('{ locked: true, max: 40 }', '{ locked: true }'));
  });

  it('is silent about a lock or a limit alone, and about what is expressly not locked', () => {
    const body = headControl('channels: { rx: { locked: true }, ry: { locked: false, max: 40 } }');
    expect(told(CODE, body)).toEqual([]);
  });
});
