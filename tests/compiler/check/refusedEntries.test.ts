import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';

/** Everything here would be called unused, were it not for the chain that is refused for its misspelt key. */
const recipe = (key: string): string => `format: 1
recipe: demo
parts:
  root: { kind: root }
params:
  stature: { default: 96 }
landmarks:
  crown: { at: [0, 96, 0] }
roles:
  face: { token: face, container: faces }
  brow: { token: brow, container: handles }
containers:
  faces: { parent: handles }
  brows: { parent: handles }
chains:
  broken: { ${key}: [[0, 0, 0], [0, 5, 0]], names: [a, b] }
  arm: { points: [[0, 50, 0], [20, 50, -4], [40, 50, 0]], names: [a, b, c] }
controls:
  hand: { at: arm.c, attributes: { puff: { min: 0, max: 1 } } }
  pole: { pole_of: { joints: [arm.a, arm.b, arm.c] } }
solvers:
  bend: { kind: two_bone, joints: [arm.a, arm.b, arm.c], goal: hand, pole: pole }
`;

const MISSING = [
  'attribute-unread',
  'channel-steers-nothing',
  'container-unused',
  'landmark-unused',
  'parameter-unused',
  'pole-without-guide-line',
  'role-unused',
];

const codesOf = (text: string): readonly string[] => [
  ...new Set(
    compile({ recipe: { name: 'refused.recipe.yaml', text } })
      .findings.map(({ code }) => code)
      .filter((code) => MISSING.includes(code)),
  ),
];

describe('rules that say that something is missing', () => {
  it('speak when the recipe is whole', () => {
    expect([...codesOf(recipe('points'))].sort()).toEqual(MISSING);
  });

  it('say nothing when an entry was refused, which may have been what they miss', () => {
    expect(codesOf(recipe('pionts'))).toEqual([]);
  });
});
