import type { Finding, Rig, SourceText, TrialResult } from '@/compiler';

/** What the page asks of the compiler. Answers carry the same sequence, so that stale ones are dropped. */
export interface CompileQuestion {
  readonly sequence: number;
  readonly text: string;
  /** Name of the recipe, shown in findings. */
  readonly name: string;
  /** Versions that recipes may extend, by `name@version`. */
  readonly bases: Readonly<Record<string, SourceText>>;
}

/** A node of the rig as it came out of the emitted script, with the stretch of text that made it. */
export interface PlacedNode {
  readonly id: string;
  /** Offsets in the recipe's own text: from the key's start to the value's end; null when nothing there made it. */
  readonly start: number | null;
  readonly end: number | null;
}

/** What a trial measured, with the pose that shows a failure. */
export interface TrialShown extends TrialResult {
  /** World matrices like those of the built rig at the trial's pose; null when it passed. */
  readonly world: Float64Array | null;
}

/** The rig that the emitted script built, posed at rest. */
export interface BuiltRig {
  readonly rig: Rig;
  /** World matrices, 16 numbers a node in the order of `rig.nodes`, column-major. */
  readonly world: Float64Array;
  readonly places: readonly PlacedNode[];
  readonly script: string;
}

export interface CompileAnswer {
  readonly sequence: number;
  readonly findings: readonly Finding[];
  /** Null while the text has errors, but for trials that failed: what failed them can be looked at. */
  readonly built: BuiltRig | null;
  /** Empty while there is no rig to try. */
  readonly trials: readonly TrialShown[];
  /** Milliseconds from receiving the question to this answer. */
  readonly took: number;
}
