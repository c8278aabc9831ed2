import { expect, it } from 'vitest';
import { findHouseReference } from '@/compiler';

const referenceOf = (text: string) => findHouseReference({ name: 'own.house.yaml', text });

it('joins name and version as recipes write them', () => {
  expect(referenceOf('house: tidewrack\nversion: 3\n')).toBe('tidewrack@3');
});

it('takes house rules that state no version for the first', () => {
  expect(referenceOf('house: tidewrack\n')).toBe('tidewrack@1');
});

it.each(['', 'house: [tidewrack]\n', 'house: tidewrack\nversion: three\n', `house: ${'['.repeat(100_000)}`])(
  'finds no name in what has none, however broken (%#)',
  (text) => {
    expect(referenceOf(text)).toBeUndefined();
  },
);
