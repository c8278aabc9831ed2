import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'channel-steers-nothing';
const LOCKED = '{ locked: true }';

describe(CODE, () => {
  it('points at the control once for each group that has no effect', () => {
    expect(told(CODE, headControl('shape: ring'))).toEqual([
      ['head', 'Nothing follows "head" when it is moved.'],
      ['head', 'Nothing follows "head" when it is scaled.'],
    ]);
  });

  it('locks the group, with or without other channels', () => {
    const body = headControl(`channels: { move: ${LOCKED} }`);
    expect(fixed(CODE, body)).toBe(headControl(`channels: { scale: ${LOCKED}, move: ${LOCKED} }`));
    const bare = headControl('shape: ring').replace('kind: orient', 'kind: point');
    expect(told(CODE, bare).map(([, message]) => message)).toEqual([
      'Nothing follows "head" when it is turned.',
      'Nothing follows "head" when it is scaled.',
    ]);
    expect(fixed(CODE, bare)).toContain(`channels: { turn: ${LOCKED} }`);
  });

  it('is silent where a child takes everything', () => {
    const body = headControl('shape: ring').replace(
      'constraints:',
      '  hat: { at: head.top, parent: head }\nconstraints:',
    );
    expect(told(CODE, body)).toEqual([]);
  });

  it('is silent where a constraint takes everything, and about locked channels', () => {
    expect(told(CODE, headControl('shape: ring').replace('kind: orient', 'kind: parent'))).toEqual([]);
    expect(told(CODE, headControl(`channels: { move: ${LOCKED}, scale: ${LOCKED} }`))).toEqual([]);
  });
});
