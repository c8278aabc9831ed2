import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import type { Axis, ValueRange } from '../rig/Rig';
import { expandFindings } from './findings';
import { jointCount, jointNames } from './jointIds';
import type { ChainEntry, Sided } from './primitives';
import type { StageContext } from './StageContext';
import { areParallel } from './sceneFrame';
import type { ChainSpecification, JointLimits } from './types';

type OrientEntry = NonNullable<NonNullable<EvaluatedRecipe['chains']>[string]['orient']>;

function specifyOrient(
  orient: OrientEntry,
  sided: Sided<ChainEntry>,
  context: StageContext,
): ChainSpecification['orient'] {
  const aim: Axis = orient.aim ?? '+x';
  let up: Axis = orient.up ?? (aim[1] === 'y' ? '+z' : '+y');
  if (areParallel(aim, up)) {
    context.findings.report(
      expandFindings,
      'axes-parallel',
      context.document.spanAt([...sided.path, 'orient']),
      {
        first: aim,
        second: up,
        what: `the frames of "${sided.id}"`,
      },
    );
    up = aim[1] === 'y' ? '+z' : '+y';
  }
  return { rule: orient.rule ?? 'chain', aim, up, toward: orient.toward ?? null, like: orient.like ?? null };
}

const TURNS = ['rx', 'ry', 'rz'] as const;

/** The limits of a chain's joints by their names; a name that is no joint's is a finding. */
function specifyLimits(sided: Sided<ChainEntry>, context: StageContext): ChainSpecification['limits'] {
  const names = jointNames(sided.entry);
  const limits: Record<string, JointLimits> = {};
  for (const [name, entry] of Object.entries(sided.entry.limits ?? {})) {
    if (!names.includes(name)) {
      const span = context.document.spanAt([...sided.path, 'limits', name], 'key');
      const parameters = { id: sided.id, name, names: names.slice(0, 20).join(', ') };
      context.findings.report(expandFindings, 'limit-joint-unknown', span, parameters);
      continue;
    }
    const ranges: Partial<Record<(typeof TURNS)[number], ValueRange>> = {};
    for (const turn of TURNS) {
      const range = entry[turn];
      if (range) ranges[turn] = { min: range.min ?? null, max: range.max ?? null };
    }
    limits[name] = ranges;
  }
  return limits;
}

/** Fills in a chain's defaults; null (with a finding) when it has no points. */
export function specifyChain(sided: Sided<ChainEntry>, context: StageContext): ChainSpecification | null {
  const { id, entry, side, path, part } = sided;
  if (!entry.points) {
    context.findings.report(expandFindings, 'entry-incomplete', context.document.spanAt(path, 'key'), {
      id,
      key: 'points',
    });
    return null;
  }
  if (entry.names && entry.names.length !== jointCount(entry)) {
    context.findings.report(
      expandFindings,
      'joint-names-count',
      context.document.spanAt([...path, 'names']),
      {
        id,
        count: jointCount(entry),
        given: entry.names.length,
      },
    );
  }
  return {
    id,
    side,
    path,
    part,
    role: entry.role ?? 'skin',
    points: entry.points,
    count: entry.joints ?? null,
    curve: entry.curve ?? 'smooth',
    jointIds: jointNames(entry).map((name) => `${id}.${name}`),
    parent: entry.parent ?? null,
    mirror: entry.mirror ?? 'behaviour',
    orient: specifyOrient(entry.orient ?? {}, sided, context),
    order: entry.rotation_order ?? 'xyz',
    limits: specifyLimits(sided, context),
  };
}
