import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emitScript } from '@/compiler/emit/emitScript';
import { MAXIMUM_FINDINGS } from '@/compiler/findings/FindingList';
import { planSteps } from '@/compiler/plan/planSteps';
import { runScript } from '@/compiler/slipway/runScript';
import { VERBS } from '@/compiler/slipway/verbs';
import { arbitraryRig } from './arbitraryRig';
import { make, SCENE, seal } from './scripts';

/** Runs a text and fails unless it gives either a rig or findings whose places lie within the text. */
function expectOrderly(text: string): void {
  const { rig, findings } = runScript({ name: 'fuzz.slip', text });
  expect(rig === null).toBe(findings.length > 0);
  expect(findings.length).toBeLessThanOrEqual(MAXIMUM_FINDINGS + 1);
  if (rig !== null) {
    // Whatever a script without findings makes is in the rig.
    const { scene: _, ...lists } = rig;
    const made = Object.values(lists).reduce((count, list) => count + list.length, 0);
    const makers = Object.entries(VERBS).filter(([verb, { name }]) => name === 'new' && verb !== 'scene');
    const lines = new RegExp(`^(${makers.map(([verb]) => verb).join('|')}) `, 'gm');
    expect(made).toBe(text.match(lines)?.length ?? 0);
  }
  for (const { span, message, help } of findings) {
    expect(span.start).toBeGreaterThanOrEqual(0);
    expect(span.end).toBeGreaterThanOrEqual(span.start);
    expect(span.end).toBeLessThanOrEqual(text.length);
    const before = text.slice(0, span.start).split('\n');
    expect([span.startLine, span.startColumn]).toEqual([
      before.length,
      (before[before.length - 1]?.length ?? 0) + 1,
    ]);
    expect(`${message}${help}`).not.toContain('undefined');
    // Names in quotes are whatever they are; outside them no parameter of the message is left unfilled.
    expect(message.replaceAll(/"[^"]*"/g, '')).not.toMatch(/\{\w+\}/);
  }
}

/** Pieces of the notation, to make wrong lines that get further than random letters do. */
const piece = fc.oneof(
  fc.constantFrom(
    ' ',
    '=',
    '(',
    ')',
    '"',
    '\\',
    '\\u',
    'attr(',
    '-',
    '+y',
    '0',
    '1e999',
    '-0',
    '1.5',
    'none',
    'true',
  ),
  fc.constantFrom(
    'scene',
    'joint',
    'lock',
    'solve',
    'constrain',
    'attr',
    'entry',
    'show',
    'end',
    'id',
    'at',
    'turn',
  ),
  fc.constantFrom(
    '"a"',
    '"b"',
    '(0 0 0)',
    '(0 0 0 1)',
    'parent=none',
    'side=left',
    'order=xyz',
    'channel=tx',
  ),
  fc.string({ unit: 'binary', maxLength: 3 }).filter((one) => !one.includes('\n')),
);
const wildLine = fc.array(piece, { maxLength: 12 }).map((pieces) => pieces.join(''));

describe('any text', () => {
  it('is refused by findings, never by a throw', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary' }), expectOrderly));
    fc.assert(fc.property(fc.string({ unit: 'binary' }), (text) => expectOrderly(`slipway 1\n${text}`)));
  });

  it('within a true seal is read to the end', () => {
    fc.assert(
      fc.property(fc.array(wildLine, { maxLength: 8 }), (lines) => {
        expectOrderly(seal(lines));
        expectOrderly(seal([SCENE, make.joint('a'), ...lines]));
      }),
      { numRuns: 500 },
    );
  });
});

describe('any change of a good script', () => {
  const change = fc.record({
    at: fc.nat(),
    remove: fc.nat({ max: 3 }),
    insert: fc.string({ unit: 'binary', maxLength: 3 }),
  });

  it('is seen before the first step', () => {
    fc.assert(
      fc.property(arbitraryRig, change, (rig, { at, remove, insert }) => {
        const script = emitScript(planSteps(rig));
        const place = at % script.length;
        const changed = script.slice(0, place) + insert + script.slice(place + remove);
        fc.pre(changed !== script);
        const { rig: built, findings } = runScript({ name: 'changed.slip', text: changed });
        expect(built).toBeNull();
        expect(findings).toHaveLength(1);
        expect(findings[0]?.code).toMatch(/^script-(altered|truncated|version-unknown)$/);
      }),
    );
  });

  it('sealed again, is read without a throw and builds nothing wrong', () => {
    fc.assert(
      fc.property(arbitraryRig, change, (rig, { at, remove, insert }) => {
        const lines = emitScript(planSteps(rig)).split('\n').slice(1, -2);
        const body = lines.join('\n');
        const place = at % (body.length + 1);
        expectOrderly(seal((body.slice(0, place) + insert + body.slice(place + remove)).split('\n')));
      }),
      { numRuns: 300 },
    );
  });

  it('cut anywhere, has lost its end', () => {
    const script = seal([SCENE, make.joint('a')]);
    for (let length = 0; length < script.length; length += 1) {
      const { rig, findings } = runScript({ name: 'cut.slip', text: script.slice(0, length) });
      expect(rig).toBeNull();
      expect(findings.map(({ code }) => code)).toEqual([
        length < 9 ? 'script-version-unknown' : 'script-truncated',
      ]);
    }
  });
});

describe('size', () => {
  it('of one line, one string, one list or many lines is no trouble', () => {
    const long = 600_000;
    for (const line of [
      'x'.repeat(long),
      `joint "${'\\u0041'.repeat(long / 6)}"`,
      `joint "${'"'.repeat(long)}`,
      `joint "a" at=(${'0 '.repeat(long / 2)}0)`,
      `joint "a" at=(${'('.repeat(long)}`,
      `joint "a" at=${'9'.repeat(long)}`,
      `joint "a" at=-${'.'.repeat(long)}`,
      ' '.repeat(long),
    ]) {
      expectOrderly(seal([SCENE, line]));
    }
    expectOrderly(seal([SCENE, ...Array.from({ length: 30_000 }, () => 'nonsense "a"')]));
    expectOrderly(
      seal([
        SCENE,
        make.joint('j'),
        ...Array.from({ length: 20_000 }, (_, i) => `show "n${i}" shown=true selectable=true`),
      ]),
    );
  });

  it('beyond the longest script is refused unread', () => {
    const { findings } = runScript({ name: 'huge.slip', text: `slipway 1\n${' '.repeat(16_000_000)}` });
    expect(findings.map(({ code }) => code)).toEqual(['script-too-long']);
  });
});
