import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '@/compiler/hash/canonicalJson';

/** The double with these 64 bits, written as sixteen hexadecimal digits. */
function doubleOf(bits: string): number {
  const view = new DataView(new ArrayBuffer(8));
  view.setBigUint64(0, BigInt(`0x${bits}`));
  return view.getFloat64(0);
}

/**
 * Source: RFC 8785, Appendix B, "Number Serialization Samples"; from memory. Every row also follows from
 * Number::toString of ECMAScript, on which the RFC rests, and reads back as the bits beside it.
 */
const NUMBERS: readonly (readonly [bits: string, text: string])[] = [
  ['0000000000000000', '0'],
  ['8000000000000000', '0'],
  ['0000000000000001', '5e-324'],
  ['8000000000000001', '-5e-324'],
  ['7fefffffffffffff', '1.7976931348623157e+308'],
  ['ffefffffffffffff', '-1.7976931348623157e+308'],
  ['4340000000000000', '9007199254740992'],
  ['c340000000000000', '-9007199254740992'],
  ['4430000000000000', '295147905179352830000'],
  ['44b52d02c7e14af5', '9.999999999999997e+22'],
  ['44b52d02c7e14af6', '1e+23'],
  ['44b52d02c7e14af7', '1.0000000000000001e+23'],
  ['444b1ae4d6e2ef4e', '999999999999999700000'],
  ['444b1ae4d6e2ef4f', '999999999999999900000'],
  ['444b1ae4d6e2ef50', '1e+21'],
  ['3eb0c6f7a0b5ed8c', '9.999999999999997e-7'],
  ['3eb0c6f7a0b5ed8d', '0.000001'],
  ['41b3de4355555553', '333333333.3333332'],
  ['41b3de4355555554', '333333333.33333325'],
  ['41b3de4355555555', '333333333.3333333'],
  ['41b3de4355555556', '333333333.3333334'],
  ['41b3de4355555557', '333333333.33333343'],
  ['becbf647612f3696', '-0.0000033333333333333333'],
  ['43143ff3c1cb0959', '1424953923781206.2'],
];

describe('numbers of RFC 8785, Appendix B', () => {
  it.each(NUMBERS)('writes the double %s as %s', (bits, text) => {
    expect(canonicalJson(doubleOf(bits))).toBe(text);
    expect(canonicalJson([{ n: doubleOf(bits) }])).toBe(`[{"n":${text}}]`);
    // Zero has no sign in canonical JSON; every other text gives its bits back.
    if (text !== '0') expect(Object.is(Number(text), doubleOf(bits))).toBe(true);
  });

  it.each([
    ['7fffffffffffffff', 'not a number'],
    ['7ff0000000000000', 'infinity'],
    ['fff0000000000000', 'minus infinity'],
  ])('refuses %s, %s', (bits) => {
    expect(() => canonicalJson(doubleOf(bits))).toThrow();
    expect(() => canonicalJson({ deep: [doubleOf(bits)] })).toThrow();
  });

  it('writes every finite double so that it reads back as itself', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(Object.is(Number(canonicalJson(value)), value + 0)).toBe(true);
      }),
    );
  });
});

describe('objects of RFC 8785, §3.2.3', () => {
  it('sorts the sample by UTF-16 code units', () => {
    // Source: RFC 8785 §3.2.3, the sample of keys and the order of their values; from memory.
    const sample = {
      '\u20ac': 'Euro Sign',
      '\r': 'Carriage Return',
      '\ufb33': 'Hebrew Letter Dalet With Dagesh',
      '1': 'One',
      '\ud83d\ude00': 'Emoji: Grinning Face',
      '\u0080': 'Control',
      '\u00f6': 'Latin Small Letter O With Diaeresis',
    };
    const order = [...canonicalJson(sample).matchAll(/:"([^"]*)"/g)].map((match) => match[1]);
    expect(order).toEqual([
      'Carriage Return',
      'One',
      'Control',
      'Latin Small Letter O With Diaeresis',
      'Euro Sign',
      'Emoji: Grinning Face',
      'Hebrew Letter Dalet With Dagesh',
    ]);
  });

  it('sorts the keys of nested objects and leaves lists as they are', () => {
    // Source: the rules of RFC 8785 §3.2.3, worked by hand.
    expect(canonicalJson({ b: [{ d: 1, c: 2 }, 3, 1], a: { f: [], e: {} } })).toBe(
      '{"a":{"e":{},"f":[]},"b":[{"c":2,"d":1},3,1]}',
    );
  });
});

describe('texts of RFC 8785, §3.2.2.2', () => {
  it('escapes control signs, quotes and backslashes, in the short form where there is one, and nothing else', () => {
    // Source: RFC 8785 §3.2.2.2, the rules; from memory.
    const short: Record<number, string> = { 8: '\\b', 9: '\\t', 10: '\\n', 12: '\\f', 13: '\\r' };
    for (let code = 0; code < 0x20; code += 1) {
      const escaped = short[code] ?? `\\u${code.toString(16).padStart(4, '0')}`;
      expect(canonicalJson(String.fromCharCode(code))).toBe(`"${escaped}"`);
    }
    expect(canonicalJson('"\\')).toBe('"\\"\\\\"');
    for (const plain of ['/', '\u007f', '\u0080', '\u2028', '\u2029', 'ö', '😀', '</script>']) {
      expect(canonicalJson(plain)).toBe(`"${plain}"`);
    }
  });
});

it('is its own canonical form', () => {
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      const text = canonicalJson(value);
      expect(canonicalJson(JSON.parse(text))).toBe(text);
    }),
  );
});
