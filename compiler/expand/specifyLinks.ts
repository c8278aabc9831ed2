import type { Channel } from '../rig/Rig';
import { expandFindings } from './findings';
import { isComplete } from './isComplete';
import type {
  ConstraintEntry,
  DriverEntry,
  GeometryEntry,
  GuideLineEntry,
  ShapeEntry,
  Sided,
  SkinEntry,
} from './primitives';
import type { StageContext } from './StageContext';
import { areParallel } from './sceneFrame';
import type {
  ConstraintSpecification,
  DriverSpecification,
  GeometrySpecification,
  GuideLineSpecification,
  ShapeSpecification,
  SkinSpecification,
} from './types';

/** Fills in a constraint's defaults; null (with findings) when a key is missing. */
export function specifyConstraint(
  sided: Sided<ConstraintEntry>,
  context: StageContext,
): ConstraintSpecification | null {
  if (!isComplete(sided, ['kind', 'target', 'sources'], context)) return null;
  const { id, entry, side, path, part } = sided;
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
    aim: entry.kind === 'aim' ? specifyAim(sided, context) : null,
  };
}

function specifyAim(
  { id, entry, path }: Sided<ConstraintEntry>,
  context: StageContext,
): NonNullable<ConstraintSpecification['aim']> {
  const axis = entry.axis ?? '+x';
  const upAxis = entry.up_axis ?? (axis[1] === 'y' ? '+z' : '+y');
  if (areParallel(axis, upAxis)) {
    const span = context.document.spanAt([...path, entry.up_axis === undefined ? 'axis' : 'up_axis']);
    const parameters = { first: axis, second: upAxis, what: `the frame of "${id}"` };
    context.findings.report(expandFindings, 'axes-parallel', span, parameters);
  }
  return { axis, upAxis, up: entry.up ?? null };
}

/** Fills in a driver's defaults; null (with findings) when a key is missing or its curve is none. */
export function specifyDriver(sided: Sided<DriverEntry>, context: StageContext): DriverSpecification | null {
  if (!isComplete(sided, ['input', 'target', 'channel', 'keys'], context)) return null;
  const { id, entry, side, path, part } = sided;
  const dot = entry.input.lastIndexOf('.');
  const inputs = entry.keys.map(([input]) => input ?? 0);
  const outputs = entry.keys.map(([, output]) => output ?? 0);
  const wrong = inputs.findIndex((input, index) => index > 0 && !(input > (inputs[index - 1] ?? input)));
  if (wrong > 0) {
    const span = context.document.spanAt([...path, 'keys', wrong]);
    const parameters = { id, before: inputs[wrong - 1] ?? 0, after: inputs[wrong] ?? 0 };
    context.findings.report(expandFindings, 'keys-not-rising', span, parameters);
    return null;
  }
  return {
    id,
    side,
    path,
    part,
    control: entry.input.slice(0, dot),
    input: entry.input.slice(dot + 1),
    target: entry.target,
    channel: entry.channel as Channel,
    inputs,
    outputs,
    curve: entry.curve ?? 'linear',
    beyond: entry.beyond ?? 'hold',
  };
}

/** Fills in what a mesh leaves out: its name in the model is its id. */
export function specifyGeometry({
  id,
  entry,
  side,
  path,
  part,
}: Sided<GeometryEntry>): GeometrySpecification {
  return { id, side, path, part, mesh: entry.mesh ?? id, role: entry.role ?? 'geometry' };
}

/** Fills in a skin's defaults; null (with findings) when a key is missing. */
export function specifySkin(sided: Sided<SkinEntry>, context: StageContext): SkinSpecification | null {
  if (!isComplete(sided, ['geometry', 'joints'], context)) return null;
  const { id, entry, side, path, part } = sided;
  const { geometry, joints, influences = 4 } = entry;
  return { id, side, path, part, geometry, joints, influences };
}

/** Fills in a shape's defaults; null (with findings) when a key is missing. */
export function specifyShape(sided: Sided<ShapeEntry>, context: StageContext): ShapeSpecification | null {
  if (!isComplete(sided, ['geometry', 'weight'], context)) return null;
  const { id, entry, side, path, part } = sided;
  return { id, side, path, part, geometry: entry.geometry, morph: entry.morph ?? id, weight: entry.weight };
}

/** Fills in a guide line's defaults; null (with findings) when an end is missing. */
export function specifyGuideLine(
  sided: Sided<GuideLineEntry>,
  context: StageContext,
): GuideLineSpecification | null {
  if (!isComplete(sided, ['from', 'to'], context)) return null;
  const { id, entry, side, path, part } = sided;
  return { id, side, path, part, from: entry.from, to: entry.to, style: entry.style ?? 'dotted' };
}
