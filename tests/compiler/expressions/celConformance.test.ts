import { describe, expect, it } from 'vitest';
import { recipeEnvironment } from '@/compiler/expressions/environment';
import { CEL_CASES, type CelCase, EXCLUDED, KNOWN_DIFFERENCES, nameOf } from './celCases';

/** A value as the suite's file writes it: numbers with their type, because 1, 1u and 1.0 differ in CEL. */
function typed(value: unknown): unknown {
  if (typeof value === 'bigint') return ['int64', value.toString()];
  if (typeof value === 'number') return ['double', value];
  if (Array.isArray(value)) return value.map(typed);
  if (typeof value === 'object' && value !== null && 'value' in value) return ['uint64', String(value.value)];
  return value;
}

function wanted(type: string | undefined, value: unknown): unknown {
  if (type === 'double') return ['double', Number(value)];
  if (type === 'int64' || type === 'uint64') return [type, value];
  if (type === 'list') return (value as [string, unknown][]).map(([kind, item]) => wanted(kind, item));
  return value;
}

function outcome(expression: string): unknown {
  try {
    return typed(recipeEnvironment.evaluate(expression, { params: {}, landmarks: {} }));
  } catch {
    return 'an error';
  }
}

const wantedOf = ({ type, value, error }: CelCase): unknown => (error ? 'an error' : wanted(type, value));
const intended = CEL_CASES.filter((item) => !EXCLUDED.some(({ covers }) => covers(item)));

/** Our environment as it is, without the reading of whole literals as doubles that recipes add. */
describe('CEL conformance', () => {
  it.each(
    intended
      .filter((item) => !(nameOf(item) in KNOWN_DIFFERENCES))
      .map((item) => [nameOf(item), item] as const),
  )('%s', (_, item) => {
    expect(outcome(item.expr)).toEqual(wantedOf(item));
  });

  it.each(Object.entries(KNOWN_DIFFERENCES))('still differs in %s: %s', (name) => {
    const item = intended.find((one) => nameOf(one) === name);
    expect(item).toBeDefined();
    expect(outcome(item?.expr ?? '')).not.toEqual(wantedOf(item as CelCase));
  });

  it.each(EXCLUDED.map(({ reason, covers }) => [reason, covers] as const))('leaves out: %s', (_, covers) => {
    expect(CEL_CASES.filter(covers).length).toBeGreaterThan(0);
  });

  it('runs most of what is not an extension', () => {
    const own = CEL_CASES.filter(({ file }) => !file.endsWith('_ext'));
    expect(intended.length / own.length).toBeGreaterThan(0.85);
  });
});
