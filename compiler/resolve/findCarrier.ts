import type { ControlSpecification } from '../expand/types';
import { resolveFindings } from './findings';
import type { ResolveContext } from './Reporter';

/** The role of the control that carries the rig. */
export const CARRIER_ROLE = 'carrier';

/**
 * The control beneath which carried containers hang: the innermost carrier, where carriers follow one another.
 * Null when nothing carries the rig; more than one innermost carrier is a finding.
 */
export function findCarrier(
  controls: readonly ControlSpecification[],
  context: ResolveContext,
): ControlSpecification | null {
  const carriers = controls.filter(({ role }) => role === CARRIER_ROLE);
  const innermost = carriers.filter(({ id }) => !carriers.some(({ parent }) => parent === id));
  const [first, second] = innermost;
  if (first && second) {
    context.findings.report(
      resolveFindings,
      'several-carriers',
      context.document.spanAt(second.path, 'key'),
      { first: first.id, second: second.id },
      { related: [{ span: context.document.spanAt(first.path, 'key'), label: 'the other one' }] },
    );
  }
  return first ?? null;
}
