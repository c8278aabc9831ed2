import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { stringify } from 'yaml';
import { buildFiles, compile } from '@/compiler';
import { HOUSE_TEXTS } from '@/compiler/house/generated/houseTexts';

interface Bone {
  readonly name: string;
  readonly required: boolean;
  readonly parent: string | null;
}
// Source: VRM 1.0 specification, humanoid.md (the bones, which are required, and their parents); tests/data/gltf.
const { bones } = JSON.parse(
  readFileSync(new URL('../../data/gltf/vrm1_humanoid_bones.json', import.meta.url), 'utf8'),
) as { bones: readonly Bone[] };

/** Joints of a plain humanoid that stand for the required bones, by VRM's name. */
const JOINTS: Readonly<Record<string, string>> = {
  hips: 'spine.hips',
  spine: 'spine.waist',
  chest: 'spine.chest',
  neck: 'neck.01',
  head: 'neck.head.skull',
  ...Object.fromEntries(
    ['left', 'right'].flatMap((side) => [
      [`${side}UpperLeg`, `leg.${side}.hip`],
      [`${side}LowerLeg`, `leg.${side}.knee`],
      [`${side}Foot`, `leg.${side}.ankle`],
      [`${side}UpperArm`, `arm.${side}.shoulder`],
      [`${side}LowerArm`, `arm.${side}.elbow`],
      [`${side}Hand`, `arm.${side}.wrist`],
    ]),
  ),
};

const profileBones = (change: (bone: Bone) => object = () => ({})) =>
  Object.fromEntries(
    bones.map((bone) => [
      bone.name,
      {
        joint: JOINTS[bone.name] ?? `none.${bone.name.toLowerCase()}`,
        required: bone.required,
        ...(bone.parent === null ? {} : { parent: bone.parent }),
        ...change(bone),
      },
    ]),
  );

const HUMANOID = `format: 1
recipe: humanoid
title: A plain humanoid
house: receivers@1
landmarks:
  hips: { at: [0, 95, 0] }
  waist: { at: [0, 110, 1] }
  chest: { at: [0, 125, 0] }
  neck: { at: [0, 145, -1] }
  skull: { at: [0, 155, 1] }
  crown: { at: [0, 175, 2] }
  shoulder: { side: left, at: [18, 140, -1] }
  elbow: { side: left, at: [44, 140, -3] }
  wrist: { side: left, at: [70, 140, -1] }
  hip: { side: left, at: [9, 92, 0] }
  knee: { side: left, at: [9, 50, 2] }
  ankle: { side: left, at: [9, 8, -1] }
parts:
  root: { kind: root }
  neck: { kind: neck_head, parent: spine.chest, from: neck, to: skull, crown: crown, joints: 1 }
  arm: { kind: limb, side: both, parent: spine.chest, points: [shoulder, elbow, wrist] }
  leg: { kind: limb, side: both, parent: spine.hips, points: [hip, knee, ankle] }
chains:
  spine: { points: [hips, waist, chest], parent: cog }
controls:
  cog: { at: hips, parent: root, channels: { scale: { locked: true } } }
  bend: { at: spine.waist, align: spine.waist, parent: cog }
constraints:
  bend: { kind: orient, target: spine.waist, sources: { bend: 1 } }
deliver: [given]
`;

function findingsFor(profile: object, text = HUMANOID) {
  const house = (HOUSE_TEXTS.standard ?? '')
    .replace('house: standard', 'house: receivers')
    .replace(/profiles:[\s\S]*$/, stringify({ profiles: { given: { formats: ['gltf'], ...profile } } }));
  const compilation = compile({
    recipe: { name: 'humanoid.recipe.yaml', text },
    houses: { 'receivers@1': { name: 'receivers.house.yaml', text: house } },
  });
  const found = compilation.findings.filter(({ severity }) => severity === 'error');
  return {
    compilation,
    found: found.map(({ code, message, span }) => ({ code, message, at: text.slice(span.start, span.end) })),
  };
}

describe('the VRM 1.0 humanoid as a delivery profile', () => {
  it('lists its 55 bones, 15 of them required', () => {
    expect(bones).toHaveLength(55);
    expect(bones.filter(({ required }) => required)).toHaveLength(15);
  });

  it('is met by a humanoid with joints for the required bones, which bear their names in the file', async () => {
    const { compilation, found } = findingsFor({ bones: profileBones() });
    expect(found).toEqual([]);
    const glb = (await buildFiles(compilation)).find(({ name }) => name.endsWith('.given.glb'));
    const text = Buffer.from(glb?.text ?? '', 'base64').toString('latin1');
    for (const { name, required } of bones) if (required) expect(text).toContain(`"name":"${name}"`);
  });

  it('says which required bones are missing, five at most', () => {
    const { found } = findingsFor({
      bones: profileBones(({ name }) => (/Leg|Foot|Hand/.test(name) ? { joint: 'none.here' } : {})),
    });
    expect(found.map(({ code }) => code)).toEqual(['delivery-bone-missing']);
    expect(found[0]?.at).toBe('given');
    expect(found[0]?.message).toContain('and 3 more');
  });

  it('says which bones hang astray', () => {
    const { found } = findingsFor({
      bones: profileBones(({ name }) => (name === 'leftUpperArm' ? { parent: 'leftFoot' } : {})),
    });
    expect(found).toEqual([
      {
        code: 'delivery-bone-astray',
        message: '"given" expects the bones "leftUpperArm" below "leftFoot".',
        at: 'given',
      },
    ]);
  });
});

describe('what a profile bounds', () => {
  it.each([
    [{ joints_at_most: 10 }, 'delivery-too-many-joints', '"given" takes 10 joints and gets'],
    [{ depth_at_most: 4 }, 'delivery-too-deep', '"given" takes 4 joints below one another and gets'],
    [{ names: { letters: 'upper' } }, 'delivery-name-not-legal', '"given" takes names in upper case;'],
    [{ names: { digits: false } }, 'delivery-name-not-legal', 'without digits'],
    [{ names: { longest: 16 } }, 'delivery-name-not-legal', 'of at most 16 characters'],
    [{ root_at_origin: true }, 'delivery-root-off-origin', '"spine.hips" stands 95 cm away'],
  ])('%j', (profile, code, words) => {
    const { found, compilation } = findingsFor(profile);
    expect(found.map((finding) => finding.code)).toEqual([code]);
    expect(found[0]?.message).toContain(words);
    expect(compilation.rig).toBeNull();
  });

  it('is met by a root joint at the origin', () => {
    const text = HUMANOID.replace('{ kind: root }', '{ kind: root, joint: true }').replace(
      'parent: cog }',
      'parent: root.joint }',
    );
    const { found } = findingsFor({ root_at_origin: true }, text);
    expect(found).toEqual([]);
  });

  it('is asked for by a name the house rules must have', () => {
    const { found } = findingsFor({}, HUMANOID.replace('[given]', '[gven]'));
    expect(found.map(({ code, at }) => [code, at])).toEqual([['profile-unknown', 'gven']]);
  });
});
