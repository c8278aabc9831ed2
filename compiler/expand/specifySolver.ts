import { expandFindings } from './findings';
import { isComplete } from './isComplete';
import type { Sided, SolverEntry } from './primitives';
import type { StageContext } from './StageContext';
import type { SolverSpecification, Specification } from './types';

type Complete<K extends keyof SolverEntry> = Sided<
  SolverEntry & { readonly [Key in K]-?: Exclude<SolverEntry[Key], undefined> }
>;

/** Fills in a solver's defaults by its kind; null (with findings) when a key is missing or does not fit. */
export function specifySolver(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  if (!isComplete(sided, ['kind'], context)) return null;
  const { kind } = sided.entry;
  switch (kind) {
    case 'two_bone':
    case 'reach':
      return specifyReach(sided, kind, context);
    case 'spline':
      return specifySpline(sided, context);
    case 'twist':
      return specifyTwist(sided, context);
    case 'aim':
      return specifyAim(sided, context);
    case 'foot_roll':
      return specifyFootRoll(sided, context);
    default:
      return kind satisfies never;
  }
}

function baseOf({ id, side, path, part }: Sided<SolverEntry>): Specification {
  return { id, side, path, part };
}

function hasJoints(sided: Complete<'joints'>, least: number, most: number, context: StageContext): boolean {
  const { id, entry, path } = sided;
  const count = entry.joints.length;
  if (count >= least && count <= most) return true;
  const wanted =
    least === most ? `exactly ${least}` : most === Infinity ? `${least} or more` : `${least} to ${most}`;
  context.findings.report(
    expandFindings,
    'joints-count-wrong',
    context.document.spanAt([...path, 'joints']),
    { id, kind: entry.kind ?? '', count, wanted },
  );
  return false;
}

function isInside(
  sided: Sided<SolverEntry>,
  name: 'stretch_limit' | 'soft',
  value: number,
  isRight: boolean,
  wanted: string,
  context: StageContext,
): boolean {
  if (isRight) return true;
  const span = context.document.spanAt([...sided.path, name]);
  context.findings.report(expandFindings, 'number-outside', span, { id: sided.id, name, value, wanted });
  return false;
}

function specifyReach(
  sided: Sided<SolverEntry>,
  kind: 'two_bone' | 'reach',
  context: StageContext,
): SolverSpecification | null {
  if (!isComplete(sided, ['joints', 'goal', 'pole'], context)) return null;
  if (!hasJoints(sided, kind === 'two_bone' ? 3 : 4, kind === 'two_bone' ? 3 : Infinity, context))
    return null;
  const { entry } = sided;
  const stretchLimit = entry.stretch_limit ?? 1.5;
  const soft = entry.soft ?? 0;
  const fits = [
    isInside(sided, 'stretch_limit', stretchLimit, stretchLimit >= 1, 'of 1 or more', context),
    isInside(sided, 'soft', soft, soft >= 0 && soft <= 1, 'from 0 to 1', context),
  ];
  if (fits.includes(false)) return null;
  const shared = {
    ...baseOf(sided),
    goal: entry.goal,
    pole: entry.pole,
    blend: entry.blend ?? 1,
    stretch: entry.stretch ?? 0,
    stretchLimit,
    soft,
    swing: entry.swing ?? 0,
  };
  if (kind === 'reach') return { ...shared, kind, joints: entry.joints, bias: entry.bias ?? 0 };
  const [start, mid, end] = entry.joints;
  if (start === undefined || mid === undefined || end === undefined) return null;
  return { ...shared, kind, joints: [start, mid, end] };
}

function specifySpline(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  if (!isComplete(sided, ['joints', 'controls'], context)) return null;
  if (!hasJoints(sided, 2, Infinity, context)) return null;
  const { joints, controls, stretch = 0, volume = 0 } = sided.entry;
  return { ...baseOf(sided), kind: 'spline', joints, controls, stretch, volume };
}

function specifyTwist(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  if (!isComplete(sided, ['joints', 'bone', 'tip', 'base', 'driver'], context)) return null;
  const { id, entry, path } = sided;
  const { joints, bone, tip, base, driver } = entry;
  const shares = entry.shares ?? joints.map((_, index) => (index + 1) / (joints.length + 1));
  if (shares.length !== joints.length) {
    const span = context.document.spanAt([...path, 'shares']);
    const parameters = { id, count: joints.length, given: shares.length };
    context.findings.report(expandFindings, 'twist-shares-count', span, parameters);
    return null;
  }
  return { ...baseOf(sided), kind: 'twist', joints, shares, bone, tip, base, driver };
}

function specifyAim(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  if (!isComplete(sided, ['joints', 'goal'], context)) return null;
  if (!hasJoints(sided, 1, 1, context)) return null;
  const { joints, goal, pole = null, blend = 1 } = sided.entry;
  const [joint] = joints;
  return joint === undefined ? null : { ...baseOf(sided), kind: 'aim', joints: [joint], goal, pole, blend };
}

function specifyFootRoll(sided: Sided<SolverEntry>, context: StageContext): SolverSpecification | null {
  if (!isComplete(sided, ['foot', 'ankle', 'heel', 'ball', 'toe', 'inner', 'outer'], context)) return null;
  const { foot, ankle, toes = null, heel, ball, toe, inner, outer, ...entry } = sided.entry;
  return {
    ...baseOf(sided),
    kind: 'foot_roll',
    foot,
    ankle,
    toes,
    sole: { heel, ball, toe, inner, outer },
    roll: entry.roll ?? 0,
    bank: entry.bank ?? 0,
    break: entry.break ?? 30,
  };
}
