import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';
import { fixed, told } from '../ruleFindings';

const CODE = 'mirrored-controls-differ';
const ears = (left: string, right: string): string => `chains:
  ear: { side: both, points: [[4, 60, 0], [8, 66, 0]], names: [base, tip] }
controls:
  ear.left: { at: ear.left.base${left} }
  ear.right: { at: ear.right.base${right} }
constraints:
  turn: { side: both, kind: orient, target: ear.left.base, sources: { ear.left: 1 } }
`;

describe(CODE, () => {
  it('points at what the right one says otherwise, and writes what the left one says', () => {
    const body = ears(', shape: pin', ', shape: ball');
    expect(told(CODE, body)).toEqual([
      ['ball', '"ear.right" differs from "ear.left" in shape: ball against pin.'],
    ]);
    expect(fixed(CODE, body)).toBe(ears(', shape: pin', ', shape: pin'));
  });

  it('compares locks, and which channels are limited', () => {
    const body = ears(', channels: { rx: { locked: true } }', ', channels: { rx: { max: 3 } }');
    expect(told(CODE, body).map(([, message]) => message)).toEqual([
      '"ear.right" differs from "ear.left" in channels: rx limited against rx locked.',
    ]);
  });

  it('points at the one that was changed where a part made both', () => {
    const text = `format: 1
recipe: demo
parts:
  root: { kind: root }
  arm: { kind: limb, side: both, points: [shoulder, elbow, wrist], goal: hand }
landmarks:
  shoulder: { side: left, at: [10, 50, 0] }
  elbow: { side: left, at: [25, 50, -3] }
  wrist: { side: left, at: [40, 50, 0] }
controls:
  arm.left.hand: { shape: pin }
`;
    const { findings } = compile({ recipe: { name: 'rule.recipe.yaml', text } });
    const found = findings.filter(({ code }) => code === CODE);
    expect(found.map(({ span }) => text.slice(span.start, span.end))).toEqual(['pin']);
  });

  it('is silent about limits with other numbers, which mirroring may turn round, and about one entry for both', () => {
    expect(told(CODE, ears(', channels: { rx: { max: 3 } }', ', channels: { rx: { min: -3 } }'))).toEqual([]);
    const both = ears('', '').replace(
      / {2}ear\.left: .*\n {2}ear\.right: .*\n/,
      '  ear: { side: both, at: ear.left.base }\n',
    );
    expect(told(CODE, both)).toEqual([]);
  });
});
