import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'entry-changes-nothing';

describe(CODE, () => {
  it('points at the entry and takes it away', () => {
    const body = 'controls:\n  root: {}\n  aim: { at: [0, 9, 0], parent: root }\n';
    expect(told(CODE, body)).toEqual([['root', 'The entry "root" changes nothing.']]);
    expect(fixed(CODE, body)).toBe('controls:\n  aim: { at: [0, 9, 0], parent: root }\n');
  });

  it('is silent as soon as one thing is said', () => {
    expect(told(CODE, 'controls:\n  root: { size: 2 }\n')).toEqual([]);
  });
});
