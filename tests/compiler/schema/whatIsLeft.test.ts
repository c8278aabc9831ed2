import { describe, expect, it } from 'vitest';
import { HEAD, shapeOf } from './shapeOf';

describe('what is left of a recipe', () => {
  it('has every finding of several entries, and the sound ones in its value', () => {
    const { found, poisoned, value } = shapeOf(
      `${HEAD}landmarks:\n  hip: { at: [1, "x", "y"] }\n  knee: { at: [0, 1, 0] }\nchains:\n  arm: { points: [], joints: 1 }\n`,
    );
    expect(found.map(({ finding, text }) => [finding.code, text])).toEqual([
      ['text-not-legal', '"x"'],
      ['text-not-legal', '"y"'],
      ['list-size', '[]'],
      ['out-of-range', '1'],
    ]);
    expect(poisoned).toEqual(['chains/arm', 'landmarks/hip']);
    expect(value).toMatchObject({ landmarks: { knee: { at: [0, 1, 0] } }, chains: {} });
    expect(value).not.toHaveProperty('landmarks.hip');
  });

  it('marks each of two ill-named keys of one map, and nothing of its good one', () => {
    const { found, poisoned } = shapeOf(
      `${HEAD}params:\n  Ear: { default: 1 }\n  b: { default: 1 }\n  2nd: { default: 1 }\n`,
    );
    expect(found.map(({ text }) => text)).toEqual(['Ear', '2nd']);
    expect(poisoned).toEqual(['params/2nd', 'params/Ear']);
  });
});
