import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { told } from '../ruleFindings';

const CODE = 'control-all-locked';
const locks = (turn: string): string =>
  `channels: { move: { locked: true }, turn: { locked: ${turn} }, scale: { locked: true } }`;

describe(CODE, () => {
  it('points at the channels', () => {
    expect(told(CODE, headControl(locks('true'))).map(([, message]) => message)).toEqual([
      'Every channel of "head" is locked and it has no attributes.',
    ]);
  });

  it('is silent as soon as a channel is free or an attribute is there', () => {
    expect(told(CODE, headControl(locks('false')))).toEqual([]);
    expect(told(CODE, headControl(locks('true'), 'attributes: { puff: {} }'))).toEqual([]);
  });
});
