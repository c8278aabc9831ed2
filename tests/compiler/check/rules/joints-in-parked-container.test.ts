import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'joints-in-parked-container';
const withContainer = (container: string, rest = ''): string => `roles:
  probe: { token: probe, container: ${container} }
chains:
  feeler: { points: [[0, 10, 0], [0, 20, 0]], role: probe${rest} }
`;

describe(CODE, () => {
  it('points at the role whose container stays in the world', () => {
    expect(told(CODE, withContainer('record'))).toEqual([
      [
        'probe',
        'The joints of "feeler" lie in the container "record", which stays in the world, and follow nothing.',
      ],
    ]);
  });

  it('is silent for a carried container and for joints that follow a parent', () => {
    expect(told(CODE, withContainer('helpers'))).toEqual([]);
    expect(told(CODE, withContainer('record', ', parent: root'))).toEqual([]);
  });
});
