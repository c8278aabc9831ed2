import validator from 'gltf-validator';
import { Bone, type Object3D, type SkinnedMesh } from 'three';
import { GLTFLoader } from 'three/examples/jsm/loaders/GLTFLoader.js';
import { describe, expect, it } from 'vitest';
import { compile, createPoser, type Rig, samples } from '@/compiler';
import { GLTF_SPACE, spaceChange } from '@/compiler/deliver/axes';
import { type DeliveryProfile, toProfile } from '@/compiler/deliver/DeliveryProfile';
import { jointTransforms } from '@/compiler/deliver/jointTransforms';
import { POSE_SECONDS, rangeOfMotion } from '@/compiler/deliver/rangeOfMotion';
import { deliveredJoints } from '@/compiler/deliver/skeleton';
import { toGlb } from '@/compiler/deliver/toGlb';
import { toUsda } from '@/compiler/deliver/toUsda';
import { composeMat4, type Mat4, multiplyMat4 } from '@/compiler/math/mat4';
import { readUsda } from './readUsda';

const rigs = samples.map(
  ({ id, text }) =>
    [id, compile({ recipe: { name: `${id}.recipe.yaml`, text }, trials: false }).rig as Rig] as const,
);
const profile = (given: Partial<Parameters<typeof toProfile>[1]> = {}): DeliveryProfile =>
  toProfile('test', { formats: ['gltf', 'usd'], ...given });
const profiles = [
  ['skin joints only', profile()],
  ['helpers too', profile({ skin_joints_only: false })],
  ['z up in metres', profile({ up: '+z', forward: '-y', unit: 'm' })],
] as const;
const cases = rigs.flatMap(([id, rig]) => profiles.map(([what, wanted]) => [id, what, rig, wanted] as const));

/** World matrices of delivered joints in the space of a file, worked out beside the writers. */
function worldIn(
  rig: Rig,
  wanted: DeliveryProfile,
  space: Parameters<typeof spaceChange>[1],
): readonly Mat4[] {
  const joints = deliveredJoints(rig, wanted);
  const local = jointTransforms(joints, createPoser(rig), spaceChange(rig.scene, space));
  const world: Mat4[] = [];
  joints.forEach(({ parent }, place) => {
    const { at, turn, size } = local[place] as (typeof local)[number];
    const own = composeMat4(at, turn, size);
    world.push(parent === null ? own : multiplyMat4(world[parent] as Mat4, own));
  });
  return world;
}

function expectMatrix(actual: ArrayLike<number>, expected: ArrayLike<number>, tolerance: number): void {
  for (let index = 0; index < 16; index += 1) {
    expect(Math.abs((actual[index] as number) - (expected[index] as number))).toBeLessThanOrEqual(tolerance);
  }
}

const heightOf = (world: readonly Mat4[]): number =>
  Math.max(...world.map((m) => Math.hypot(m[12], m[13], m[14])));

describe('the delivered skeleton', () => {
  it.each(rigs)('%s: hangs together, parents first, with every skin joint', (_, rig) => {
    const joints = deliveredJoints(rig, profile());
    const skin = rig.nodes.filter(({ kind, role }) => kind === 'joint' && role === 'skin');
    expect(joints.map(({ node }) => node.name).sort()).toEqual(skin.map(({ name }) => name).sort());
    for (const [place, { parent }] of joints.entries()) expect(parent ?? -1).toBeLessThan(place);
  });

  it('of the hare is one tree from its hips', () => {
    const hare = rigs.find(([id]) => id === 'hare')?.[1] as Rig;
    const tops = deliveredJoints(hare, profile()).filter(({ parent }) => parent === null);
    expect(tops.map(({ node }) => node.id)).toEqual(['spine.hips']);
  });
});

describe.each(cases)('%s, %s', (_, __, rig, wanted) => {
  it('passes the Khronos validator without errors or warnings', async () => {
    // Source: KhronosGroup glTF-Validator, through the package gltf-validator.
    const { issues } = await validator.validateBytes(await toGlb(rig, wanted));
    expect(issues.messages).toEqual([]);
    expect([issues.numErrors, issues.numWarnings]).toEqual([0, 0]);
  });

  it('gives three.js the same world matrices, at rest and in the baked poses', async () => {
    const bytes = await toGlb(rig, wanted);
    const buffer = bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength) as ArrayBuffer;
    const loaded = await new GLTFLoader().parseAsync(buffer, '');
    loaded.scene.updateMatrixWorld(true);
    const joints = deliveredJoints(rig, wanted);
    const world = worldIn(rig, wanted, GLTF_SPACE);
    const tolerance = 2e-6 * Math.max(1, heightOf(world));
    const bones = new Map<string, Object3D>();
    loaded.scene.traverse((object) => {
      if (object instanceof Bone) bones.set(object.name, object);
    });
    joints.forEach(({ node }, place) => {
      expectMatrix(bones.get(node.name)?.matrixWorld.elements ?? [], world[place] as Mat4, tolerance);
    });
    // Inverse bind × world = identity, so that the rest pose leaves the mesh as it is.
    let mesh: SkinnedMesh | undefined;
    loaded.scene.traverse((object) => {
      if ('isSkinnedMesh' in object && object.isSkinnedMesh) mesh = object as SkinnedMesh;
    });
    const skeleton = (mesh as SkinnedMesh).skeleton;
    skeleton.boneInverses.forEach((inverse, index) => {
      const product = (skeleton.bones[index] as Object3D).matrixWorld.clone().multiply(inverse);
      expectMatrix(product.elements, [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1], 1e-5);
    });
    const poses = rangeOfMotion(rig);
    const [clip] = loaded.animations;
    expect(clip?.duration).toBeCloseTo((poses.length - 1) * POSE_SECONDS, 4);
  });

  it('gives the same world matrices as OpenUSD text', () => {
    const stage = readUsda(toUsda(rig, wanted));
    const world = worldIn(rig, wanted, wanted);
    expect(stage.upAxis).toBe(wanted.up === '+z' ? 'Z' : 'Y');
    expect(stage.metersPerUnit).toBe({ mm: 0.001, cm: 0.01, m: 1 }[wanted.unit]);
    expect(stage.joints).toHaveLength(world.length);
    expect(new Set(stage.joints).size).toBe(world.length);
    const tolerance = 1e-6 * Math.max(1, heightOf(world));
    // UsdSkel: the product of rest transforms along a joint's path is its bind transform; rows, not columns.
    stage.joints.forEach((path, place) => {
      for (const name of path.split('/')) expect(name).toMatch(/^[A-Za-z_][A-Za-z0-9_]*$/);
      const above = path.includes('/') ? stage.joints.indexOf(path.slice(0, path.lastIndexOf('/'))) : -1;
      expect(above).toBeLessThan(place);
      const rest = stage.restTransforms[place] as Mat4;
      const bind = stage.bindTransforms[place] as Mat4;
      expectMatrix(
        above < 0 ? rest : multiplyMat4(stage.bindTransforms[above] as Mat4, rest),
        bind,
        tolerance,
      );
      expectMatrix(bind, world[place] as Mat4, tolerance);
    });
  });
});

describe('bytes', () => {
  it('are the same each time', async () => {
    const [, rig] = rigs[0] as (typeof rigs)[number];
    expect(await toGlb(rig, profile())).toEqual(await toGlb(rig, profile()));
    expect(toUsda(rig, profile())).toBe(toUsda(rig, profile()));
  });
});
