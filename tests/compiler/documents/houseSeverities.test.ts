import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';
import { HOUSE_TEXTS } from '@/compiler/house/generated/houseTexts';

const RECIPE = `format: 1
recipe: demo
title: Demonstration
house: strict@1
parts:
  root: { kind: root }
landmarks:
  spare: { at: [0, 1, 0] }
`;

function severitiesBy(severities: string, text = RECIPE) {
  const house = `${(HOUSE_TEXTS.standard ?? '').replace('house: standard', 'house: strict')}${severities}`;
  const { findings, rig } = compile({
    recipe: { name: 'demo.recipe.yaml', text },
    houses: { 'strict@1': { name: 'strict.house.yaml', text: house } },
  });
  return { found: findings.map(({ code, severity }) => [code, severity]), isBuilt: rig !== null };
}

describe('severities of the house rules', () => {
  it('are the rules’ own where the house says nothing', () => {
    expect(severitiesBy('')).toEqual({ found: [['landmark-unused', 'info']], isBuilt: true });
  });

  it('make a rule stricter, to the point of stopping the build', () => {
    expect(severitiesBy('severities: { landmark-unused: error }\n')).toEqual({
      found: [['landmark-unused', 'error']],
      isBuilt: false,
    });
  });

  it('leave a rule out', () => {
    expect(severitiesBy('severities: { landmark-unused: "off" }\n')).toEqual({ found: [], isBuilt: true });
  });

  it('cannot make an error of the language anything else', () => {
    const wrong = RECIPE.replace('kind: root', 'kind: rood');
    const { found, isBuilt } = severitiesBy('severities: { not-one-of: info }\n', wrong);
    expect(found[0]).toEqual(['not-one-of', 'error']);
    expect(isBuilt).toBe(false);
  });
});
