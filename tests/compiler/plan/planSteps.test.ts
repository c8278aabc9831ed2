import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planSteps } from '@/compiler/plan/planSteps';
import type { Rig } from '@/compiler/rig/Rig';
import { VERBS } from '@/compiler/slipway/verbs';
import { control, group, joint, rigOf } from '../pose/rigParts';
import { arbitraryRig } from '../slipway/arbitraryRig';

/** Names that a step's keys refer to. */
function referencesOf(
  values: Readonly<Record<string, unknown>>,
  keys: Readonly<Record<string, { readonly kind: unknown }>>,
): readonly string[] {
  return Object.entries(keys).flatMap(([key, { kind }]) => {
    const value = values[key];
    if (kind === 'reference' || kind === 'parent') return value === null ? [] : [value as string];
    if (kind === 'references') return value as readonly string[];
    return kind === 'blend' && typeof value === 'object' && value !== null
      ? [(value as { control: string }).control]
      : [];
  });
}

describe('planSteps', () => {
  it('never refers forward', () => {
    fc.assert(
      fc.property(arbitraryRig, (rig) => {
        const made = new Set<string>();
        for (const { verb, name, values } of planSteps(rig).slice(1)) {
          for (const reference of referencesOf(values, VERBS[verb].keys))
            expect(made.has(reference)).toBe(true);
          if (VERBS[verb].name === 'new') made.add(name);
          else expect(made.has(name)).toBe(true);
        }
      }),
    );
  });

  it('says only what is not understood', () => {
    const verbs = (rig: Rig): readonly string[] => planSteps(rig).map(({ verb }) => verb);
    expect(verbs(rigOf([group('a')]))).toEqual(['scene', 'group']);
    expect(verbs(rigOf([{ ...joint('a'), selectable: false }]))).toEqual(['scene', 'joint', 'show']);
    const knob = control('a', {
      channels: {
        sx: { locked: true, min: null, max: null },
        tx: { locked: true, min: null, max: 4 },
        ry: { locked: false, min: -10, max: 10 },
      },
      attributes: [{ name: 'reach', default: 1, min: 0, max: 1, labels: null, note: null }],
    });
    expect(planSteps(rigOf([knob])).slice(2)).toEqual([
      {
        verb: 'attr',
        name: 'a',
        values: { name: 'reach', default: 1, min: 0, max: 1, labels: null, note: null },
      },
      { verb: 'lock', name: 'a', values: { channels: ['tx', 'sx'] } },
      { verb: 'limit', name: 'a', values: { channel: 'tx', min: null, max: 4 } },
      { verb: 'limit', name: 'a', values: { channel: 'ry', min: -10, max: 10 } },
    ]);
  });
});
