import type { FindingList } from '../findings/FindingList';
import type { MergedDocument } from '../merge/types';

/** What every stage after the shape check needs to report well. */
export interface StageContext {
  readonly document: MergedDocument;
  readonly findings: FindingList;
  /**
   * Entries (`chains/arm`) that were refused. Stages add to them and leave them out; what refers to them stays
   * silent: one root cause, one finding.
   */
  readonly poisoned: Set<string>;
}
