'use client';

import type { TrialName } from '@/compiler';
import type { TrialShown } from '@/components/worker/messages';

/** What each trial proves, as a sentence that holds when it passes. */
const WORDS: Readonly<Record<TrialName, string>> = {
  rest: 'At rest nothing moves, with everything at work',
  zero: 'Every control reads zero at rest',
  carry: 'The root carries everything exactly once',
  mirror: 'A mirrored pose gives a mirrored rig',
  pole: 'Bent chains point at their poles',
  reach: 'Chains meet their goals and keep their lengths',
  blend: 'Nothing jumps in blends and choices of space',
  guide: 'Guide lines join controls with what they steer',
  limits: 'Limits hold',
  hidden: 'Animators see what is theirs and nothing else',
  containment: 'Everything lies in the container of its role',
  names: 'Ten characters in one scene share no name',
};

export interface TrialsPaneProps {
  readonly trials: readonly TrialShown[];
  /** The failed trial whose pose the picture shows. */
  readonly posed: TrialName | null;
  onPose(trial: TrialName | null): void;
  onChoose(id: string): void;
}

/** A measured number with three digits, tiny ones as powers of ten, with its unit. */
export function measureWords(value: number, unit: TrialShown['unit']): string {
  if (unit === 'things') return String(value);
  if (value === 0) return `0 ${unit}`;
  if (value >= Number.MAX_VALUE) return 'no number';
  const words = value < 1e-3 ? value.toExponential(1) : String(Number(value.toPrecision(3)));
  return `${words.replace('-', '−')} ${unit}`;
}

/** Counts in words, for the tab. */
export function countTrials(trials: readonly TrialShown[]): string {
  const failed = trials.filter(({ passed }) => !passed).length;
  if (trials.length === 0) return 'Trials';
  return failed === 0 ? `Trials (${trials.length} passed)` : `Trials (${failed} failed)`;
}

/** What the trials measured on the rig, against what is allowed; a failure can be looked at in the picture. */
export function TrialsPane({ trials, posed, onPose, onChoose }: TrialsPaneProps) {
  if (trials.length === 0) {
    return <p className="p-4 text-ink-soft">The trials run as soon as the text has no other errors.</p>;
  }
  return (
    <table className="w-full text-sm" aria-label="Trials">
      <thead className="sticky top-0 bg-sheet text-left text-ink-soft">
        <tr className="border-rule border-b">
          <th className="px-3 py-1 font-normal" scope="col">
            Trial
          </th>
          <th className="px-2 py-1 font-normal" scope="col">
            Outcome
          </th>
          <th className="px-2 py-1 text-right font-normal" scope="col">
            Worst
          </th>
          <th className="px-2 py-1 text-right font-normal" scope="col">
            Allowed
          </th>
          <th className="px-3 py-1 text-right font-normal" scope="col">
            Checked
          </th>
        </tr>
      </thead>
      <tbody>
        {trials.map(({ trial, passed, measured, tolerance, unit, checked, worst, pose, world }) => (
          <tr key={trial} data-trial={trial} className="border-rule border-b align-top">
            <th scope="row" className="px-3 py-1 text-left font-normal">
              {WORDS[trial]}
              {!passed && (
                <span className="block">
                  {worst.map((id) => (
                    <button
                      key={id}
                      type="button"
                      className="plain-action figures mr-3"
                      onClick={() => onChoose(id)}
                    >
                      {id}
                    </button>
                  ))}
                  {world !== null && Object.keys(pose).length > 0 && (
                    <button
                      type="button"
                      className="plain-action"
                      aria-pressed={posed === trial}
                      onClick={() => onPose(posed === trial ? null : trial)}
                    >
                      {posed === trial ? 'Back to rest' : 'Show in the picture'}
                    </button>
                  )}
                </span>
              )}
            </th>
            <td className="px-2 py-1">
              {passed ? (
                <span className="text-ink-soft">{checked === 0 ? 'nothing to try' : 'passed'}</span>
              ) : (
                <strong className="trial-failed">failed</strong>
              )}
            </td>
            <td className="figures px-2 py-1 text-right">{measureWords(measured, unit)}</td>
            <td className="figures px-2 py-1 text-right text-ink-soft">{measureWords(tolerance, unit)}</td>
            <td className="figures px-3 py-1 text-right text-ink-soft">{checked}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
