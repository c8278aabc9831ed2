import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { printString } from '@/compiler/emit/printString';

describe('printString', () => {
  it('reads back by JSON as the very same text', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        expect(JSON.parse(printString(text))).toBe(text);
      }),
    );
    for (let code = 0; code < 0x10000; code += 1) {
      const text = String.fromCharCode(code);
      expect(JSON.parse(printString(text))).toBe(text);
    }
  });

  it('shows nothing unseen, out of order or broken, for every code point there is', () => {
    // By the engine's own Unicode properties, independently of the ranges listed in the code.
    const unseen = /[\p{Cc}\p{Zl}\p{Zp}\p{Cs}\p{Bidi_Control}\p{Default_Ignorable_Code_Point}]/u;
    let all = '';
    for (let code = 0; code < 0x110000; code += 1) {
      all += String.fromCodePoint(code);
      if (all.length > 4096) {
        expect(printString(all)).not.toMatch(unseen);
        all = '';
      }
    }
  });

  it.each([
    ['quote " here', '"quote \\" here"'],
    ['back\\slash', '"back\\\\slash"'],
    ['line\nfeed', '"line\\nfeed"'],
    ['\u2028', '"\\u2028"'],
    ['\u202e', '"\\u202e"'],
    ['\ud800', '"\\ud800"'],
    ['é漢👍', '"é漢👍"'],
    ['{{7*7}}', '"{{7*7}}"'],
  ])('%j is written %s', (text, written) => {
    expect(printString(text)).toBe(written);
  });
});
