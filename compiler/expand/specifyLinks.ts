import { expandFindings } from './findings';
import type { ConstraintEntry, GuideLineEntry, Sided, SolverEntry } from './primitives';
import type { StageContext } from './StageContext';
import type { ConstraintSpecification, GuideLineSpecification, SolverSpecification } from './types';

/** Reports each of `keys` that the entry lacks; true when none is missing. */
function isComplete<E extends object>(
  sided: Sided<E>,
  keys: readonly (keyof E & string)[],
  context: StageContext,
): boolean {
  const missing = keys.filter((key) => sided.entry[key] === undefined);
  for (const key of missing) {
    context.findings.report(expandFindings, 'entry-incomplete', context.document.spanAt(sided.path, 'key'), {
      id: sided.id,
      key,
    });
  }
  return missing.length === 0;
}

/** Fills in a solver's defaults; null (with findings) when a key is missing. */
export function specifySolver(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  const { id, entry, side, path, part } = sided;
  if (!isComplete(sided, ['kind', 'joints', 'goal', 'pole'], context)) return null;
  const [start, mid, end] = entry.joints ?? [];
  if (start === undefined || mid === undefined || end === undefined) return null;
  if (entry.goal === undefined || entry.pole === undefined) return null;
  return {
    id,
    side,
    path,
    part,
    kind: 'two_bone',
    joints: [start, mid, end],
    goal: entry.goal,
    pole: entry.pole,
    blend: entry.blend ?? 1,
  };
}

/** Fills in a constraint's defaults; null (with findings) when a key is missing. */
export function specifyConstraint(
  sided: Sided<ConstraintEntry>,
  context: StageContext,
): ConstraintSpecification | null {
  const { id, entry, side, path, part } = sided;
  if (!isComplete(sided, ['kind', 'target', 'sources'], context)) return null;
  if (entry.kind === undefined || entry.target === undefined || entry.sources === undefined) return null;
  return {
    id,
    side,
    path,
    part,
    kind: entry.kind,
    target: entry.target,
    sources: Object.entries(entry.sources).map(([node, weight]) => ({ node, weight })),
    blend: entry.blend ?? null,
    keepOffset: entry.keep_offset ?? true,
  };
}

/** Fills in a guide line's defaults; null (with findings) when an end is missing. */
export function specifyGuideLine(
  sided: Sided<GuideLineEntry>,
  context: StageContext,
): GuideLineSpecification | null {
  const { id, entry, side, path, part } = sided;
  if (!isComplete(sided, ['from', 'to'], context)) return null;
  if (entry.from === undefined || entry.to === undefined) return null;
  return { id, side, path, part, from: entry.from, to: entry.to, style: entry.style ?? 'dotted' };
}
