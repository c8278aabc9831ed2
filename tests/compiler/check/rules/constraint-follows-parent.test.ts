import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'constraint-follows-parent';
const withConstraint = (constraint: string, more = ''): string => `chains:
  neck: { points: [[0, 50, 0], [0, 60, 2], [0, 70, 0]], names: [a, b, c] }
controls:
  one: { at: neck.a, attributes: { nod: { min: -1, max: 1 } } }
constraints:
  turn: { ${constraint} }
${more}`;

describe(CODE, () => {
  it('points at the constraint that repeats what hanging does', () => {
    expect(told(CODE, withConstraint('kind: orient, target: neck.b, sources: { neck.a: 1 }'))).toEqual([
      ['turn', '"neck.b" hangs on "neck.a" already, so "turn" does nothing.'],
    ]);
  });

  it('removes the constraint and leaves an empty map', () => {
    const body = withConstraint('kind: orient, target: neck.b, sources: { neck.a: 1 }');
    expect(fixed(CODE, body)).toBe(body.replace(/constraints:\n.*/, 'constraints: {}'));
  });

  it('is silent for any other source, for two of them, and for an aim', () => {
    expect(told(CODE, withConstraint('kind: orient, target: neck.c, sources: { neck.a: 1 }'))).toEqual([]);
    const both = 'kind: orient, target: neck.b, sources: { neck.a: 1, one: 1 }';
    expect(told(CODE, withConstraint(both))).toEqual([]);
    expect(told(CODE, withConstraint('kind: aim, target: neck.b, sources: { neck.a: 1 }'))).toEqual([]);
  });

  it('is silent where a driver moves the target against its parent', () => {
    const driver =
      'drivers:\n  nod: { input: one.nod, target: neck.b, channel: rz, keys: [[-1, -9], [1, 9]] }\n';
    expect(
      told(CODE, withConstraint('kind: orient, target: neck.b, sources: { neck.a: 1 }', driver)),
    ).toEqual([]);
  });
});
