import { describe, expect, it } from 'vitest';
import { HEAD, shapeOf } from './shapeOf';

interface Row {
  readonly wrong: string;
  /** The recipe below its two first lines. */
  readonly rest: string;
  readonly code: string;
  readonly covered: string;
  readonly message: string;
  readonly help: string;
  readonly poisoned: readonly string[];
}

const NUMBER = 'a number, or an expression that begins with =';
const WORD = 'a word of lower-case letters, digits and underscores that begins with a letter';
const ID = 'an id of lower-case letters, digits and underscores, with dots between its parts';

const row = (
  wrong: string,
  rest: string,
  code: string,
  covered: string,
  message: string,
  help: string,
  poisoned: readonly string[],
): Row => ({ wrong, rest, code, covered, message, help, poisoned });

const ROWS: readonly Row[] = [
  row(
    'key that nothing resembles',
    'wombat: 1',
    'unknown-key',
    'wombat',
    'There is no key "wombat" here.',
    'Keys here are "format", "recipe", "title", "house", "extends", "params", "scene", "landmarks", "roles", "containers", "parts", "chains" and 10 more.',
    ['wombat'],
  ),
  row(
    'key inside an entry: keys of the entry are named, and the entry is kept',
    'landmarks: { hip: { at: [0, 1, 2], flavour: sweet } }',
    'unknown-key',
    'flavour',
    'There is no key "flavour" here.',
    'Keys here are "at", "side", "right", "note".',
    [],
  ),
  row(
    'key inside a part: keys of that kind are named',
    'parts: { root: { kind: root, flavour: sweet } }',
    'unknown-key',
    'flavour',
    'There is no key "flavour" here.',
    'Keys here are "kind", "at", "shape", "size", "joint".',
    [],
  ),
  row(
    'key inside an inner map of a list-free entry',
    'controls: { c: { channels: { rx: { flavour: 1 } } } }',
    'unknown-key',
    'flavour',
    'There is no key "flavour" here.',
    'Keys here are "locked", "min", "max".',
    [],
  ),
  row(
    'missing key',
    'landmarks: { hip: { side: left } }',
    'missing-key',
    'hip',
    '"hip" has no key "at".',
    'Add "at".',
    ['landmarks/hip'],
  ),
  row(
    'part without its kind',
    'parts: { arm: { side: both } }',
    'missing-key',
    'arm',
    '"arm" has no key "kind".',
    'Add "kind".',
    ['parts/arm'],
  ),
  row(
    'part whose kind is no text',
    'parts: { arm: { kind: 3 } }',
    'wrong-type',
    '3',
    '"kind" of "arm" is a number, not text.',
    'Write text.',
    ['parts/arm'],
  ),
  row(
    'part of an unknown kind',
    'parts: { arm: { kind: zeppelin, points: [a, b, c] } }',
    'not-one-of',
    'zeppelin',
    '"zeppelin" is not allowed for "kind" of "arm".',
    'Write one of "axle", "clavicle", "eye", "foot", "hand", "jaw", "leg_three", "limb", "neck_head", "root", "spine", "strand" and 1 more.',
    ['parts/arm'],
  ),
  row('number as text', 'title: 3', 'wrong-type', '3', '"title" is a number, not text.', 'Write text.', [
    'title',
  ]),
  row(
    'list as collection',
    'chains: [a]',
    'wrong-type',
    '[a]',
    '"chains" is a list, not a map.',
    'Write a map.',
    ['chains'],
  ),
  row(
    'text as entry',
    'chains: { arm: words }',
    'wrong-type',
    'words',
    '"arm" is text, not a map.',
    'Write a map.',
    ['chains/arm'],
  ),
  row(
    'fraction where a whole number belongs',
    'chains: { arm: { points: [a, b], joints: 2.5 } }',
    'wrong-type',
    '2.5',
    '"joints" of "arm" is a number, not a whole number.',
    'Write a whole number.',
    ['chains/arm'],
  ),
  row(
    'expression where only a number may stand',
    'params: { p: { default: "=3" } }',
    'wrong-type',
    '"=3"',
    '"default" of "p" is text, not a number.',
    'Write a number.',
    ['params/p'],
  ),
  row(
    'true where a number or expression belongs',
    'controls: { c: { size: true } }',
    'wrong-type',
    'true',
    `"size" of "c" is true or false, not ${NUMBER}.`,
    `Write ${NUMBER}.`,
    ['controls/c'],
  ),
  row(
    'list as note',
    'notes: { a: [1] }',
    'wrong-type',
    '[1]',
    '"a" is a list, not text or a number or true or false.',
    'Write text or a number or true or false.',
    ['notes/a'],
  ),
  row(
    'word that is no expression',
    'controls: { c: { size: big } }',
    'text-not-legal',
    'big',
    `"big" is not ${NUMBER}.`,
    `Write ${NUMBER}.`,
    ['controls/c'],
  ),
  row(
    'choice that nothing resembles',
    'scene: { unit: furlong }',
    'not-one-of',
    'furlong',
    '"furlong" is not allowed for "unit".',
    'Write one of "mm", "cm", "m".',
    ['scene/unit'],
  ),
  row(
    'channel there is not',
    'controls: { c: { channels: { wobble: { locked: true } } } }',
    'not-one-of',
    'wobble',
    '"wobble" is not allowed for "channels" of "c".',
    'Write one of "move", "turn", "scale", "tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz".',
    ['controls/c'],
  ),
  row(
    'id with a capital',
    'chains: { Arm: { points: [a] } }',
    'text-not-legal',
    'Arm',
    `"Arm" is not ${ID}.`,
    `Write ${ID}.`,
    ['chains/Arm'],
  ),
  row(
    'name of a parameter with a dash',
    'params: { long-ear: { default: 1 } }',
    'text-not-legal',
    'long-ear',
    `"long-ear" is not ${WORD}.`,
    `Write ${WORD}.`,
    ['params/long-ear'],
  ),
  row(
    'reference without a version',
    'house: tidewrack',
    'text-not-legal',
    'tidewrack',
    '"tidewrack" is not a name and a version, such as walker@4.',
    'Write a name and a version, such as walker@4.',
    ['house'],
  ),
  row(
    'title longer than a line',
    `title: ${'x'.repeat(201)}`,
    'text-too-long',
    'x'.repeat(201),
    '"title" has more than 200 characters.',
    'Shorten it.',
    ['title'],
  ),
  row(
    'id longer than allowed',
    `chains: { ${'x'.repeat(121)}: { points: [a] } }`,
    'text-too-long',
    'x'.repeat(121),
    `The key "${'x'.repeat(20)}…" has more than 120 characters.`,
    'Shorten it.',
    [`chains/${'x'.repeat(121)}`],
  ),
  row(
    'list with too few entries',
    'chains: { arm: { points: [] } }',
    'list-size',
    '[]',
    '"points" of "arm" has 0 entries, where at least 1 are needed.',
    'Write at least 1.',
    ['chains/arm'],
  ),
  row(
    'list with too many entries',
    'parts: { s: { kind: limb, points: [a, b, c, d] } }',
    'list-size',
    '[a, b, c, d]',
    '"points" of "s" has 4 entries, where at most 3 are needed.',
    'Write at most 3.',
    ['parts/s'],
  ),
  row(
    'map with too few entries',
    'constraints: { s: { sources: {} } }',
    'list-size',
    '{}',
    '"sources" of "s" has 0 entries, where at least 1 are needed.',
    'Write at least 1.',
    ['constraints/s'],
  ),
  row(
    'number below its range',
    'chains: { arm: { joints: 1 } }',
    'out-of-range',
    '1',
    '"joints" of "arm" is 1, but must be at least 2.',
    'Write a number that is at least 2.',
    ['chains/arm'],
  ),
  row(
    'number above its range',
    'chains: { arm: { joints: 501 } }',
    'out-of-range',
    '501',
    '"joints" of "arm" is 501, but must be at most 500.',
    'Write a number that is at most 500.',
    ['chains/arm'],
  ),
];

describe('shape of a recipe', () => {
  it.each(ROWS.map((item) => [item.wrong, item] as const))('%s', (_, expected) => {
    const { found, poisoned, isSound } = shapeOf(`${HEAD}${expected.rest}\n`);
    expect(found.map(({ finding, text }) => [finding.code, text, finding.message, finding.help])).toEqual([
      [expected.code, expected.covered, expected.message, expected.help],
    ]);
    expect(found[0]?.finding.severity).toBe('error');
    expect(found[0]?.finding.fix).toBeUndefined();
    expect(poisoned).toEqual(expected.poisoned);
    expect(isSound).toBe(false);
  });

  it('takes a right one as it is', () => {
    const { found, isSound, poisoned } = shapeOf(`${HEAD}landmarks: { hip: { at: [0, "=1 + 1", 0] } }\n`);
    expect([found, isSound, poisoned]).toEqual([[], true, []]);
  });

  it('asks for the language version that it knows', () => {
    const { found } = shapeOf('format: 2\nrecipe: hare\n');
    expect(found.map(({ finding, text }) => [finding.code, text, finding.message])).toEqual([
      ['not-one-of', '2', '"2" is not allowed for "format".'],
    ]);
  });

  it('says what the document itself lacks', () => {
    expect(shapeOf('format: 1\n').found.map(({ finding }) => finding.message)).toEqual([
      'The document has no key "recipe".',
    ]);
  });

  it.each([
    ['- a\n', 'The document is a list, not a map.'],
    ['words\n', 'The document is text, not a map.'],
    ['42\n', 'The document is a number, not a map.'],
  ])('gives up on %j, which is no map', (text, message) => {
    const { found, value } = shapeOf(text);
    expect(found.map(({ finding }) => [finding.code, finding.message])).toEqual([['not-a-map', message]]);
    expect(value).toBeNull();
  });

  it('leaves every message and help without a placeholder', () => {
    for (const { rest } of ROWS) {
      for (const { finding } of shapeOf(`${HEAD}${rest}\n`).found) {
        expect(`${finding.message} ${finding.help}`).not.toMatch(/\{\w+\}|undefined|\[object/);
      }
    }
  });
});
