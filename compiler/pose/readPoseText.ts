import type { Finding } from '../findings/Finding';
import { FindingList } from '../findings/FindingList';
import { finishFindings } from '../findings/finishFindings';
import type { PoseValues, Rig } from '../rig/Rig';
import type { SourceText } from '../source/SourceText';
import { parseDocument } from '../syntax/parseDocument';
import { readPose } from './readPose';

/** Control values as read from a file, and what is wrong with them. */
export interface PoseReading {
  readonly pose: PoseValues;
  readonly findings: readonly Finding[];
}

/**
 * Reads a pose file, JSON or YAML of the form `{control: {channel or attribute: number}}`, against the rig it is for.
 * Never throws: what does not fit is a finding at its line and column, and is left out of the pose.
 */
export function readPoseText(source: SourceText, rig: Rig): PoseReading {
  const findings = new FindingList();
  const pose = readPose(parseDocument(source, findings), rig, findings);
  return { pose, findings: finishFindings(findings.all) };
}
