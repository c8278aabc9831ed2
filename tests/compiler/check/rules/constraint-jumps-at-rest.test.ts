import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'constraint-jumps-at-rest';
const withConstraint = (kind: string, rest: string, control = 'at: neck.b'): string => `chains:
  neck: { points: [[0, 50, 0], [0, 60, 0]], names: [a, b] }
controls:
  one: { ${control} }
constraints:
  hold: { kind: ${kind}, target: neck.a, sources: { one: 1 }${rest} }
`;

describe(CODE, () => {
  it('points at the offset that is not kept, and keeps it', () => {
    const body = withConstraint('point', ', keep_offset: false');
    expect(told(CODE, body)).toEqual([
      ['false', '"hold" keeps no offset, so "neck.a" moves away from its rest place, onto "one".'],
    ]);
    expect(fixed(CODE, body)).toBe(withConstraint('point', ', keep_offset: true'));
  });

  it('tells a turn as well as a move', () => {
    const body = withConstraint('orient', ', keep_offset: false');
    expect(told(CODE, body).map(([, message]) => message)).toEqual([
      '"hold" keeps no offset, so "neck.a" turns away from its rest place, onto "one".',
    ]);
  });

  it('is silent where target and source stand and turn alike', () => {
    const alike = 'at: neck.a, align: neck.a';
    expect(told(CODE, withConstraint('parent', ', keep_offset: false', alike))).toEqual([]);
    expect(told(CODE, withConstraint('point', ', keep_offset: false', 'at: neck.a'))).toEqual([]);
  });

  it('is silent where the offset is kept', () => {
    expect(told(CODE, withConstraint('parent', ''))).toEqual([]);
  });
});
