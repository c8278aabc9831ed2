import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emitScript } from '@/compiler/emit/emitScript';
import { planSteps } from '@/compiler/plan/planSteps';
import { createPoser } from '@/compiler/pose/createPoser';
import type { PoseValues, Rig } from '@/compiler/rig/Rig';
import { runScript } from '@/compiler/slipway/runScript';
import { arbitraryRig } from './arbitraryRig';

const emit = (rig: Rig): string => emitScript(planSteps(rig));

describe('emit, parse, run', () => {
  it('gives the very same rig, whatever its names, texts and numbers', () => {
    fc.assert(
      fc.property(arbitraryRig, (rig) => {
        const { rig: built, findings } = runScript({ name: 'any.slip', text: emit(rig) });
        expect(findings).toEqual([]);
        expect(built).toEqual(rig);
      }),
      { numRuns: 500 },
    );
  });

  it('is the same script again from the rig that was run', () => {
    fc.assert(
      fc.property(arbitraryRig, (rig) => {
        const script = emit(rig);
        const { rig: built } = runScript({ name: 'any.slip', text: script });
        expect(built && emit(built)).toBe(script);
      }),
    );
  });

  it('writes one line for each step, and nothing a reader could not see', () => {
    fc.assert(
      fc.property(arbitraryRig, (rig) => {
        const steps = planSteps(rig);
        const script = emit(rig);
        const lines = script.split('\n');
        expect(lines).toHaveLength(steps.length + 3);
        steps.forEach((step, index) => {
          expect(lines[index + 1]?.startsWith(`${step.verb} "`)).toBe(true);
        });
        expect(script).not.toMatch(
          /[^\n\P{Cc}]|\p{Zl}|\p{Zp}|\p{Cs}|\p{Bidi_Control}|\p{Default_Ignorable_Code_Point}/u,
        );
      }),
    );
  });

  it('poses the run rig to the same numbers as the rig itself', () => {
    fc.assert(
      fc.property(arbitraryRig, fc.double({ min: -90, max: 90, noNaN: true }), (rig, angle) => {
        const { rig: built } = runScript({ name: 'any.slip', text: emit(rig) });
        if (built === null) throw new Error('not run');
        const pose: PoseValues = Object.fromEntries(
          rig.nodes.map(({ name }) => [name, { rx: angle, ty: angle }]),
        );
        const [own, theirs] = [createPoser(rig), createPoser(built)];
        own.evaluate(pose);
        theirs.evaluate(pose);
        expect(Array.from(theirs.world)).toEqual(Array.from(own.world));
      }),
    );
  });
});
