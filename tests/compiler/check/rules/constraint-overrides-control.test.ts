import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'constraint-overrides-control';
const withHat = (channels: string, kind: string): string => `chains:
  neck: { points: [[0, 50, 0], [0, 60, 0]], names: [a, b] }
controls:
  hat: { at: neck.b${channels} }
constraints:
  hold: { kind: ${kind}, target: hat, sources: { neck.b: 1 } }
`;

describe(CODE, () => {
  it('points at the control and lists the channels that do nothing', () => {
    const channels = ', channels: { ty: { locked: true } }';
    expect(told(CODE, withHat(channels, 'point'))).toEqual([
      ['hat', '"hold" overrides tx, tz of the control "hat", which an animator can still set.'],
    ]);
  });

  it('locks the channels where none are written', () => {
    expect(fixed(CODE, withHat('', 'orient'))).toBe(
      withHat('', 'orient').replace('{ at: neck.b', '{ channels: { turn: { locked: true } }, at: neck.b'),
    );
    expect(fixed(CODE, withHat(', channels: { ty: { locked: true } }', 'point'))).toBeNull();
  });

  it('tells a limited channel, which is open all the same', () => {
    const channels = ', channels: { turn: { min: -10, max: 10 } }';
    expect(told(CODE, withHat(channels, 'orient'))[0]?.[1]).toContain('rx, ry, rz');
  });

  it('is silent when exactly the overridden channels are locked', () => {
    expect(told(CODE, withHat(', channels: { move: { locked: true } }', 'point'))).toEqual([]);
    expect(told(CODE, withHat(', channels: { turn: { locked: true } }', 'orient'))).toEqual([]);
  });

  it('is silent for joints', () => {
    expect(
      told(
        CODE,
        withHat('', 'point').replace('target: hat', 'target: neck.a').replace('neck.b: 1', 'hat: 1'),
      ),
    ).toEqual([]);
  });
});
