import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'limit-beyond-full-turn';

describe(CODE, () => {
  it('points at the limit of a control and takes it away', () => {
    const body = headControl('channels: { rx: { min: -200, max: 200 }, ry: { max: 9 } }');
    expect(told(CODE, body)).toEqual([
      [
        '{ min: -200, max: 200 }',
        '"rx" of "head" may run over 400 degrees, so every direction can be reached.',
      ],
    ]);
    expect(fixed(CODE, body)).toBe(body.replace('rx: { min: -200, max: 200 }, ', ''));
  });

  it('points at the limit of a joint', () => {
    const body = `chains:
  head:
    points: [[0, 50, 0], [0, 60, 0]]
    names: [base, top]
    limits: { base: { ry: { min: 0, max: 361 } } }
`;
    expect(told(CODE, body).map(([text]) => text)).toEqual(['{ min: 0, max: 361 }']);
  });

  it('is silent about exactly one turn, about moving, and about an open end', () => {
    const body = headControl(
      'channels: { rx: { min: -180, max: 180 }, tx: { min: -900, max: 900 }, ry: { min: -900 } }',
    );
    expect(told(CODE, body)).toEqual([]);
  });
});
