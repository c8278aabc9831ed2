import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'driver-flat';
const withKeys = (keys: string): string => `chains:
  jaw: { points: [[0, 50, 0], [0, 48, 8]], names: [hinge, tip] }
controls:
  mouth: { at: jaw.tip, attributes: { open: { min: 0, max: 1 } } }
drivers:
  drop: { input: mouth.open, target: jaw.hinge, channel: rz, keys: ${keys} }
`;

describe(CODE, () => {
  it('points at the keys', () => {
    expect(told(CODE, withKeys('[[0, 0], [0.5, 0], [1, 0]]'))).toEqual([
      ['[[0, 0], [0.5, 0], [1, 0]]', 'The driver "drop" gives 0 whatever "mouth.open" reads.'],
    ]);
  });

  it('removes the driver', () => {
    const body = withKeys('[[0, 0], [1, 0]]');
    expect(fixed(CODE, body)).toBe(body.replace(/drivers:\n.*/, 'drivers: {}'));
  });

  it('is silent as soon as one output differs', () => {
    expect(told(CODE, withKeys('[[0, 0], [0.5, 0], [1, 0.1]]'))).toEqual([]);
  });
});
