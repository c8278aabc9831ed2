import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '@/compiler/hash/canonicalJson';

describe('canonicalJson', () => {
  it('gives the worked example of RFC 8785 §3.2.2 and §3.2.3', () => {
    // Source: RFC 8785, the sample object and its canonical form; from memory.
    const sample = {
      numbers: [Number('333333333.33333329'), 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
      string: '\u20ac$\u000f\u000aA\'\u0042\u0022\u005c\\"/',
      literals: [null, true, false],
    };
    expect(canonicalJson(sample)).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  it('sorts keys by UTF-16 code units, as RFC 8785 §3.2.3 asks', () => {
    const keys = ['\u20ac', '\r', '\ufb33', '1', '\ud83d\ude00', '\u0080', '\u00f6'];
    const object = Object.fromEntries(keys.map((key) => [key, 0]));
    expect(
      Object.keys(JSON.parse(canonicalJson({ a: 0, ...object })) as object).filter((key) => key !== 'a'),
    ).toEqual(['1', '\r', '\u0080', '\u00f6', '\u20ac', '\ud83d\ude00', '\ufb33']);
  });

  it('does not depend on the order in which keys were set, and reads back as the same value', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
        const reversed = Object.fromEntries(Object.entries(value).reverse());
        expect(canonicalJson(reversed)).toBe(canonicalJson(value));
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });

  it('refuses what JSON cannot hold', () => {
    expect(() => canonicalJson(undefined)).toThrow(/JSON/);
    expect(() => canonicalJson({ size: Number.NaN })).toThrow();
  });
});
