import { IDENTITY_MAT4, positionOf } from '../math/mat4';
import { length } from '../math/vec3';
import { restWorldMatrices } from '../pose/worldMatrices';
import type { ResolveContext } from '../resolve/Reporter';
import type { Rig } from '../rig/Rig';
import type { HouseRules } from '../schema/generated/houseTypes';
import type { Span } from '../source/SourceText';
import { type DeliveryProfile, toProfile } from './DeliveryProfile';
import { deliveredNames } from './deliveredNames';
import { deliverFindings } from './findings';
import { type DeliveredJoint, deliveredJoints } from './skeleton';

/** Offenders that one finding names at most. */
const MOST_NAMED = 5;
/** Relative to the rig's size: nearer than this counts as at the origin. */
const AT_ORIGIN = 1e-6;

function quoted(names: readonly string[]): string {
  const shown = names.slice(0, MOST_NAMED).map((name) => `"${name}"`);
  return shown.join(', ') + (names.length > MOST_NAMED ? ` and ${names.length - MOST_NAMED} more` : '');
}

/** The chain a joint belongs to, by its id: all but the last segment. */
function chainOf(id: string): string {
  return id.includes('.') ? id.slice(0, id.lastIndexOf('.')) : id;
}

type Report = (
  code: keyof typeof deliverFindings,
  parameters: Readonly<Record<string, string | number>>,
) => void;

function checkBudgets(profile: DeliveryProfile, joints: readonly DeliveredJoint[], report: Report): void {
  const { id, jointsAtMost, depthAtMost } = profile;
  if (jointsAtMost !== null && joints.length > jointsAtMost) {
    const counts = new Map<string, number>();
    for (const { node } of joints) counts.set(chainOf(node.id), (counts.get(chainOf(node.id)) ?? 0) + 1);
    const worst = [...counts].sort((a, b) => b[1] - a[1]).slice(0, MOST_NAMED);
    report('delivery-too-many-joints', {
      profile: id,
      most: jointsAtMost,
      count: joints.length,
      worst: worst.map(([chain, count]) => `"${chain}" (${count})`).join(', '),
    });
  }
  const deepest = [...joints].sort((a, b) => b.depth - a.depth);
  const depth = (deepest[0]?.depth ?? -1) + 1;
  if (depthAtMost !== null && depth > depthAtMost) {
    const worst = deepest.filter(({ depth: own }) => own + 1 > depthAtMost).map(({ node }) => node.id);
    report('delivery-too-deep', { profile: id, most: depthAtMost, count: depth, worst: quoted(worst) });
  }
}

function nameRule({ names }: DeliveryProfile): string {
  const rules = [
    ...(names.longest === null ? [] : [`of at most ${names.longest} characters`]),
    ...(names.letters === 'any' ? [] : [`in ${names.letters} case`]),
    ...(names.digits ? [] : ['without digits']),
  ];
  return rules.join(', ');
}

function checkNames(profile: DeliveryProfile, joints: readonly DeliveredJoint[], report: Report): void {
  const { longest, letters, digits } = profile.names;
  const isLegal = (name: string): boolean =>
    (longest === null || name.length <= longest) &&
    (letters !== 'lower' || name === name.toLowerCase()) &&
    (letters !== 'upper' || name === name.toUpperCase()) &&
    (digits || !/[0-9]/.test(name));
  const wrong = deliveredNames(joints, profile).filter((name) => !isLegal(name));
  if (wrong.length === 0) return;
  const worst = [...wrong].sort((a, b) => b.length - a.length);
  report('delivery-name-not-legal', {
    profile: profile.id,
    rule: nameRule(profile),
    count: wrong.length,
    worst: quoted(worst),
  });
}

function checkBones(profile: DeliveryProfile, joints: readonly DeliveredJoint[], report: Report): void {
  const placeOf = new Map(joints.map(({ node }, place) => [node.id, place]));
  const boneAt = new Map([...profile.bones].map(([bone, { joint }]) => [placeOf.get(joint) ?? -1, bone]));
  const missing = [...profile.bones].filter(([, { joint, required }]) => required && !placeOf.has(joint));
  if (missing.length > 0) {
    const worst = missing.slice(0, MOST_NAMED).map(([bone, { joint }]) => `"${bone}" (joint "${joint}")`);
    const more = missing.length > MOST_NAMED ? ` and ${missing.length - MOST_NAMED} more` : '';
    report('delivery-bone-missing', { profile: profile.id, worst: worst.join(', ') + more });
  }
  /** The nearest bone above that is there, by the profile. */
  const expected = (bone: string): string | null => {
    let parent = profile.bones.get(bone)?.parent ?? null;
    const seen = new Set<string>();
    while (parent !== null && !seen.has(parent)) {
      seen.add(parent);
      const entry = profile.bones.get(parent);
      if (entry && placeOf.has(entry.joint)) return parent;
      parent = entry?.parent ?? null;
    }
    return null;
  };
  const astray: string[] = [];
  for (const [bone, { joint }] of profile.bones) {
    const place = placeOf.get(joint);
    const wanted = expected(bone);
    if (place === undefined || wanted === null) continue;
    let above = joints[place]?.parent ?? null;
    while (above !== null && !boneAt.has(above)) above = joints[above]?.parent ?? null;
    if (above === null || boneAt.get(above) !== wanted) astray.push(`"${bone}" below "${wanted}"`);
  }
  if (astray.length === 0) return;
  const more = astray.length > MOST_NAMED ? ` and ${astray.length - MOST_NAMED} more` : '';
  report('delivery-bone-astray', {
    profile: profile.id,
    worst: astray.slice(0, MOST_NAMED).join(', ') + more,
  });
}

function checkOrigin(
  profile: DeliveryProfile,
  joints: readonly DeliveredJoint[],
  rig: Rig,
  report: Report,
): void {
  if (!profile.rootAtOrigin) return;
  const rest = restWorldMatrices(rig);
  const size = Math.max(...joints.map(({ index }) => length(positionOf(rest[index] ?? IDENTITY_MAT4))), 1e-9);
  for (const { node, index, parent } of joints) {
    const matrix = rest[index];
    if (parent !== null || matrix === undefined) continue;
    const distance = length(positionOf(matrix));
    if (distance <= AT_ORIGIN * size) continue;
    report('delivery-root-off-origin', {
      profile: profile.id,
      worst: `"${node.id}"`,
      distance: Number(distance.toPrecision(4)),
      unit: rig.scene.unit,
    });
    return;
  }
}

function checkInfluences(profile: DeliveryProfile, rig: Rig, report: Report): void {
  const { influencesAtMost } = profile;
  if (influencesAtMost === null) return;
  const wrong = rig.skins.filter(({ influences }) => influences > influencesAtMost);
  if (wrong.length === 0) return;
  const worst = [...wrong].sort((a, b) => b.influences - a.influences).map(({ id }) => id);
  report('delivery-too-many-influences', {
    profile: profile.id,
    most: influencesAtMost,
    worst: quoted(worst),
  });
}

/**
 * The profiles that a recipe is delivered by, each with what the rig exceeds reported at the place that asks for it.
 * A profile that the house rules do not have is a finding and left out.
 */
export function checkDeliveries(
  wanted: readonly string[],
  house: string,
  rules: HouseRules,
  rig: Rig,
  context: Pick<ResolveContext, 'document' | 'findings'>,
): readonly DeliveryProfile[] {
  const profiles: DeliveryProfile[] = [];
  wanted.forEach((id, index) => {
    const span: Span = context.document.spanAt(['deliver', index]);
    const entry = Object.hasOwn(rules.profiles ?? {}, id) ? rules.profiles?.[id] : undefined;
    if (!entry) {
      const known = Object.keys(rules.profiles ?? {}).join(', ') || 'none';
      context.findings.report(deliverFindings, 'profile-unknown', span, {
        house,
        profile: id,
        profiles: known,
      });
      return;
    }
    const profile = toProfile(id, entry);
    if (profile.up[1] === profile.forward[1]) {
      const axes = { profile: id, up: profile.up, forward: profile.forward };
      context.findings.report(deliverFindings, 'profile-axes-parallel', span, axes);
      return;
    }
    profiles.push(profile);
    const report: Report = (code, parameters) => {
      context.findings.report(deliverFindings, code, span, parameters as never);
    };
    const joints = deliveredJoints(rig, profile);
    checkBudgets(profile, joints, report);
    checkInfluences(profile, rig, report);
    checkNames(profile, joints, report);
    checkOrigin(profile, joints, rig, report);
    checkBones(profile, joints, report);
  });
  return profiles;
}
