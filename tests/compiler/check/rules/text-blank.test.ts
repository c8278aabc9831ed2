import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'text-blank';

describe(CODE, () => {
  it('points at each text without words and takes it away', () => {
    const body = 'title: ""\nparams:\n  stature:\n    default: 3\n    unit: cm\n';
    expect(told(CODE, body)).toEqual([['""', '"title" holds no words.']]);
    expect(fixed(CODE, body)).toBe(body.replace('title: ""\n', ''));
    expect(told(CODE, body.replace('""', 'Rig').replace('cm', '"  "'))).toEqual([
      ['"  "', '"unit" holds no words.'],
    ]);
  });

  it('is silent about short texts, and about what is no prose', () => {
    expect(told(CODE, 'title: A\nnotes: { show: "" }\n')).toEqual([]);
  });
});
