import { describe, expect, it } from 'vitest';
import { shapeOf } from './shapeOf';

const house = (changed: Readonly<Record<string, string>> = {}): string =>
  Object.entries({
    format: '1',
    house: 'mine',
    naming: '{ pattern: [character, path] }',
    roles: '{ skin: { token: sk, container: skin } }',
    containers: '{ skin: {} }',
    ...changed,
  })
    .map(([key, value]) => `${key}: ${value}\n`)
    .join('');

describe('shape of house rules', () => {
  it('takes right ones', () => expect(shapeOf(house(), 'house').found).toEqual([]));

  it.each([
    [{ house: 'Mine' }, 'text-not-legal', 'Mine', 'house'],
    [{ naming: '{ pattern: [rloe] }' }, 'not-one-of', 'rloe', 'naming/pattern'],
    [{ naming: '{ pattern: [] }' }, 'list-size', '[]', 'naming/pattern'],
    [{ naming: '{ pattern: [path], separator: "----" }' }, 'text-not-legal', '"----"', 'naming/separator'],
    [{ naming: '{ pattern: [path], index_digits: 1 }' }, 'out-of-range', '1', 'naming/index_digits'],
    [{ naming: '{ pattern: [path], longest: 256 }' }, 'out-of-range', '256', 'naming/longest'],
    [{ naming: '{ pattern: [path], sides: { left: "l-" } }' }, 'text-not-legal', '"l-"', 'naming/sides'],
    [{ naming: '{ separator: _ }' }, 'missing-key', 'naming', 'naming'],
    [{ roles: '{ Bad: {} }' }, 'text-not-legal', 'Bad', 'roles/Bad'],
    [{ roles: '{ skin: { token: "a b" } }' }, 'text-not-legal', '"a b"', 'roles/skin'],
    [{ containers: '{ c: { moves: sideways } }' }, 'not-one-of', 'sideways', 'containers/c'],
    [{ severities: '{ landmark-unused: never }' }, 'not-one-of', 'never', 'severities/landmark-unused'],
  ])('%j', (changed, code, covered, entry) => {
    const { found, poisoned } = shapeOf(house(changed), 'house');
    expect(found.map(({ finding, text }) => [finding.code, text])).toEqual([[code, covered]]);
    expect(`${found[0]?.finding.message} ${found[0]?.finding.help}`).not.toMatch(
      /\{\w+\}|undefined|\[object/,
    );
    expect(poisoned).toEqual([entry]);
  });

  it('names the keys of a role, which the recipe schema defines', () => {
    const { found } = shapeOf(house({ roles: '{ skin: { flavour: sweet } }' }), 'house');
    expect(found.map(({ finding, text }) => [finding.code, text, finding.help])).toEqual([
      ['unknown-key', 'flavour', 'Keys here are "token", "container", "shown", "selectable", "title".'],
    ]);
  });

  it('says each thing that is missing', () => {
    const { found } = shapeOf('format: 1\nhouse: mine\n', 'house');
    expect(found.map(({ finding }) => finding.help).sort()).toEqual([
      'Add "containers".',
      'Add "naming".',
      'Add "roles".',
    ]);
  });
});
