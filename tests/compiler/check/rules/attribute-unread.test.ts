import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'attribute-unread';

describe(CODE, () => {
  it('points at the name of the attribute and takes it away', () => {
    const body = headControl('attributes:', '  puff: { min: 0, max: 1 }', '  tilt: { min: 0, max: 1 }');
    const read = `${body}drivers:
  tilting: { input: head.tilt, target: head.top, channel: rz, keys: [[0, 0], [1, 30]] }
`;
    expect(told(CODE, read)).toEqual([['puff', 'Nothing reads the attribute "puff" of "head".']]);
    expect(fixed(CODE, read)).toBe(read.replace('      puff: { min: 0, max: 1 }\n', ''));
  });

  it('is silent about what a shape reads, and about the choice of a space', () => {
    const body = headControl('attributes: { grin: { min: 0, max: 1 } }', 'spaces: [root, other]');
    const read = `${body}geometry:
  face: { mesh: face }
shapes:
  grin: { geometry: face, morph: grin, weight: head.grin }
`;
    const other = '  other: { at: [0, 9, 0] }\nconstraints:';
    expect(told(CODE, read.replace('constraints:', other))).toEqual([]);
  });
});
