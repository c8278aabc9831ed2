import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'space-without-choice';
const look = (text: string): string => `chains:
  neck: { points: [[0, 0, 0], [0, 60, 0]], names: [a, b] }
controls:
  look: { at: [0, 70, 0], ${text} }
constraints:
  turn: { kind: parent, target: neck.a, sources: { look: 1 } }
`;

describe(CODE, () => {
  it('points at the spaces and takes them away', () => {
    expect(told(CODE, look('parent: root, spaces: [root]'))).toEqual([
      ['[root]', '"look" has only the space "root", so there is nothing to choose.'],
    ]);
    expect(fixed(CODE, look('parent: root, spaces: [root]'))).toBe(look('parent: root'));
  });

  it('offers nothing where the space would be lost', () => {
    expect(told(CODE, look('spaces: [root]'))).toHaveLength(1);
    expect(fixed(CODE, look('spaces: [root]'))).toBeNull();
  });

  it('is silent where the parent adds the second choice', () => {
    const hub = look('parent: hub, spaces: [root]').replace(
      'controls:',
      'controls:\n  hub: { at: [0, 5, 0] }',
    );
    expect(told(CODE, hub)).toEqual([]);
  });
});
