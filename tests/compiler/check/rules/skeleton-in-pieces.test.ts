import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'skeleton-in-pieces';
const withHead = (rest: string, more = ''): string =>
  `chains:\n  body: { points: [[0, 10, 0], [0, 20, 0]] }\n  head: { points: [[0, 22, 0], [0, 30, 0]]${rest} }\n${more}`;

describe(CODE, () => {
  it('points at the second piece', () => {
    expect(told(CODE, withHead(''))).toEqual([
      ['head', '"head" hangs on nothing, apart from "body": the skeleton is in 2 pieces.'],
    ]);
  });

  it('tells any number of pieces in one finding', () => {
    const more =
      'tail: { points: [[0, 9, 0], [0, 9, -9]] }\n  fin: { points: [[0, 8, 0], [0, 8, -9]] }\n  head:';
    expect(told(CODE, withHead('').replace('head:', more)).map(([, message]) => message)).toEqual([
      '"tail" hangs on nothing, apart from "body": the skeleton is in 4 pieces.',
    ]);
  });

  it('tells both sides of a mirrored chain in one finding', () => {
    const body = 'chains:\n  leg: { side: both, points: [[10, 40, 0], [10, 5, 0]] }\n';
    expect(told(CODE, body).map(([text]) => text)).toEqual(['leg']);
  });

  it('is silent for a chain with a parent, one that a constraint places, and helpers', () => {
    expect(told(CODE, withHead(', parent: body.02'))).toEqual([]);
    expect(told(CODE, withHead(', role: helper'))).toEqual([]);
    const placed =
      'controls:\n  one: { at: head.01 }\nconstraints:\n  hold: { kind: parent, target: head.01, sources: { one: 1 } }\n';
    expect(told(CODE, withHead('', placed))).toEqual([]);
  });

  it('is silent for a single chain', () => {
    expect(told(CODE, 'chains:\n  body: { points: [[0, 10, 0], [0, 20, 0]] }\n')).toEqual([]);
  });
});
