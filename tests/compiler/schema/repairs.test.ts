import { describe, expect, it } from 'vitest';
import { HEAD, shapeOf } from './shapeOf';

describe('repairs', () => {
  it.each([
    ['a key at the top', 'chain: {}', 'chain', 'chains', true, 'Did you mean "chains"?'],
    [
      'a key of an entry',
      'chains: { arm: { points: [a], jonits: 3 } }',
      'jonits',
      'joints',
      true,
      'Did you mean "joints"?',
    ],
    [
      'a choice',
      'controls: { c: { shape: diamnd } }',
      'diamnd',
      'diamond',
      false,
      'Did you mean "diamond"? Allowed are "ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass".',
    ],
    [
      'a kind of part',
      'parts: { tail: { kind: strnd } }',
      'strnd',
      'strand',
      false,
      'Did you mean "strand"? Allowed are "axle", "clavicle", "eye", "foot", "hand", "jaw", "leg_three", "limb", "neck_head", "root", "spine", "strand" and 1 more.',
    ],
    [
      'a channel',
      'controls: { c: { channels: { scael: {} , scle: {} } } }',
      'scle',
      'scale',
      false,
      'Did you mean "scale"? Allowed are "move", "turn", "scale", "tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz".',
    ],
  ])('of %s', (_, rest, covered, newText, safe, help) => {
    const { found } = shapeOf(`${HEAD}${rest}\n`);
    const finding = found.find(({ text }) => text === covered)?.finding;
    expect(finding?.help).toBe(help);
    expect(finding?.fix?.safe).toBe(safe);
    expect(finding?.fix?.edits).toEqual([{ span: finding?.span, newText }]);
    expect(finding?.fix?.title).toContain(newText);
  });

  it('none where two names are as close', () => {
    const { found } = shapeOf(`${HEAD}scene: { unit: mn }\n`);
    expect(found.map(({ finding }) => finding.fix)).toEqual([undefined]);
  });
});
