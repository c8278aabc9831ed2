import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'driver-moves-rest';
const withDriver = (keys: string, rest = '', attribute = 'min: 0, max: 1', more = ''): string => `chains:
  jaw: { points: [[0, 50, 0], [0, 48, 8]], names: [hinge, tip] }
controls:
  mouth: { at: jaw.tip, attributes: { open: { ${attribute} } } }
drivers:
  drop: { input: mouth.open, target: jaw.hinge, channel: rz, keys: ${keys}${rest} }
${more}`;

describe(CODE, () => {
  it('points at the keys and takes what is added at rest from every output', () => {
    const body = withDriver('[[0, 5], [1, -25]]');
    expect(told(CODE, body)).toEqual([
      ['[[0, 5], [1, -25]]', 'At rest "mouth.open" reads 0, where "drop" adds 5 to rz of "jaw.hinge".'],
    ]);
    expect(fixed(CODE, body)).toBe(withDriver('[[0, 0], [1, -30]]'));
    expect(told(CODE, fixed(CODE, body) ?? '')).toEqual([]);
  });

  it('reads the curve between its keys at the default of the attribute', () => {
    const keys = '[[0, 0], [1, 40]]';
    const message = told(CODE, withDriver(keys, ', curve: smooth', 'default: 0.25, min: 0, max: 1'))[0]?.[1];
    // 3t² − 2t³ at a quarter is 0.15625, of 40 degrees.
    expect(message).toContain('adds 6.25 to rz');
  });

  it('reads a scale channel at 1 and any other at 0', () => {
    const scaled = withDriver('[[1, 0], [2, 30]]').replace('mouth.open', 'mouth.sy');
    expect(told(CODE, scaled)).toEqual([]);
    const turned = withDriver('[[-90, -30], [90, 30]]').replace('mouth.open', 'mouth.rz');
    expect(told(CODE, turned)).toEqual([]);
  });

  it('tells a constant, which is never 0', () => {
    expect(told(CODE, withDriver('[[0, 3], [1, 3]]')).map(([text]) => text)).toEqual(['[[0, 3], [1, 3]]']);
  });

  it('is silent where two drivers of one channel cancel out', () => {
    const other = '  lift: { input: mouth.open, target: jaw.hinge, channel: rz, keys: [[0, -5], [1, 0]] }\n';
    expect(told(CODE, withDriver('[[0, 5], [1, -25]]', '', 'min: 0, max: 1', other))).toEqual([]);
  });
});
