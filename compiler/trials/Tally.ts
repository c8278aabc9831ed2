import type { PoseValues } from '../rig/Rig';
import type { TrialName, TrialResult } from './TrialResult';

/** More ids than this say no more to the person who mends the rig. */
const WORST_SHOWN = 5;

const AT_REST: PoseValues = {};

/** Keeps the worst of what one trial measures. */
export class Tally {
  readonly #failed = new Map<string, number>();
  #checked = 0;
  #measured = 0;
  #pose = AT_REST;

  constructor(
    private readonly trial: TrialName,
    private readonly unit: TrialResult['unit'],
    private readonly tolerance: number,
  ) {}

  /** Adds one comparison: how far off the node was at a pose. What is no number counts as endlessly far. */
  add(value: number, id: string, pose: PoseValues = AT_REST): void {
    // Results travel as JSON, which has no infinity.
    const off = Number.isFinite(value) ? Math.abs(value) : Number.MAX_VALUE;
    this.#checked += 1;
    if (off > this.#measured) {
      this.#measured = off;
      this.#pose = pose;
    }
    if (off > this.tolerance && off > (this.#failed.get(id) ?? 0)) this.#failed.set(id, off);
  }

  result(): TrialResult {
    const worst = [...this.#failed].sort((a, b) => b[1] - a[1]).slice(0, WORST_SHOWN);
    return {
      trial: this.trial,
      passed: this.#measured <= this.tolerance,
      measured: this.#measured,
      tolerance: this.tolerance,
      unit: this.unit,
      checked: this.#checked,
      worst: worst.map(([id]) => id),
      pose: this.#pose,
    };
  }
}

/** Counts things that are wrong in themselves, whatever the pose; `measured` is their number, none may be. */
export class Count {
  readonly #faults: string[] = [];
  #checked = 0;

  constructor(private readonly trial: TrialName) {}

  add(isRight: boolean, id: string): void {
    this.#checked += 1;
    if (!isRight) this.#faults.push(id);
  }

  result(): TrialResult {
    return {
      trial: this.trial,
      passed: this.#faults.length === 0,
      measured: this.#faults.length,
      tolerance: 0,
      unit: 'things',
      checked: this.#checked,
      worst: [...new Set(this.#faults)].slice(0, WORST_SHOWN),
      pose: AT_REST,
    };
  }
}
