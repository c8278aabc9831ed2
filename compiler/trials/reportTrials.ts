import type { FindingList } from '../findings/FindingList';
import type { Span } from '../source/SourceText';
import { trialFindings } from './findings';
import type { TrialResult } from './TrialResult';

/** A measured number with three digits, in the trial's unit. */
function words(value: number, unit: TrialResult['unit']): string {
  if (unit === 'things') return `${value} ${value === 1 ? 'thing' : 'things'}`;
  return value === Number.MAX_VALUE ? 'no number at all' : `${Number(value.toPrecision(3))} ${unit}`;
}

/** Reports each trial that failed, at the place of its worst thing. */
export function reportTrials(
  results: readonly TrialResult[],
  spanOf: (nodeId: string | undefined) => Span,
  findings: FindingList,
): void {
  for (const { trial, passed, measured, tolerance, unit, worst } of results) {
    if (passed) continue;
    const [first = 'something'] = worst;
    const others = worst.length - 1;
    findings.report(trialFindings, `trial-${trial}`, spanOf(worst[0]), {
      things:
        others > 0
          ? `"${first}" (as well as ${worst
              .slice(1)
              .map((id) => `"${id}"`)
              .join(', ')})`
          : `"${first}"`,
      measured: words(measured, unit),
      tolerance: words(tolerance, unit),
    });
  }
}
