import validator from 'gltf-validator';
import { type AnimationClip, AnimationMixer, Bone, type Object3D, type SkinnedMesh } from 'three';
import { GLTFLoader } from 'three/examples/jsm/loaders/GLTFLoader.js';
import { describe, expect, it } from 'vitest';
import { compile, createPoser, type PoseValues, type Rig, samples } from '@/compiler';
import { GLTF_SPACE } from '@/compiler/deliver/axes';
import { type DeliveryProfile, toProfile } from '@/compiler/deliver/DeliveryProfile';
import { POSE_SECONDS, rangeOfMotion } from '@/compiler/deliver/rangeOfMotion';
import { deliveredJoints } from '@/compiler/deliver/skeleton';
import { toGlb } from '@/compiler/deliver/toGlb';
import { toUsda } from '@/compiler/deliver/toUsda';
import { type Mat4, multiplyMat4 } from '@/compiler/math/mat4';
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

type Vec = readonly [number, number, number];
const DIRECTIONS: Readonly<Record<string, Vec>> = {
  '+x': [1, 0, 0],
  '-x': [-1, 0, 0],
  '+y': [0, 1, 0],
  '-y': [0, -1, 0],
  '+z': [0, 0, 1],
  '-z': [0, 0, -1],
};
const METRES: Readonly<Record<string, number>> = { mm: 0.001, cm: 0.01, m: 1 };

/** Left, up and forward of a space, written out: left is up × forward. */
function frameOf({ up, forward }: { readonly up: string; readonly forward: string }): readonly Vec[] {
  const u = DIRECTIONS[up] as Vec;
  const f = DIRECTIONS[forward] as Vec;
  const l: Vec = [u[1] * f[2] - u[2] * f[1], u[2] * f[0] - u[0] * f[2], u[0] * f[1] - u[1] * f[0]];
  return [l, u, f];
}

/**
 * World matrices of delivered joints straight from the poser, carried into the space of a file by hand: the part of a
 * vector along left, up and forward of the scene is its part along those of the file. Nothing of the writers is used.
 */
function worldIn(
  rig: Rig,
  wanted: DeliveryProfile,
  space: { readonly up: string; readonly forward: string; readonly unit: string },
  pose: PoseValues = {},
): readonly Mat4[] {
  const poser = createPoser(rig);
  poser.evaluate(pose);
  const from = frameOf(rig.scene);
  const to = frameOf(space);
  const factor = (METRES[rig.scene.unit] as number) / (METRES[space.unit] as number);
  const carry = (v: Vec): Vec =>
    [0, 1, 2].map((axis) =>
      from.reduce(
        (sum, direction, index) =>
          sum +
          (direction[0] * v[0] + direction[1] * v[1] + direction[2] * v[2]) *
            ((to[index] as Vec)[axis] as number),
        0,
      ),
    ) as unknown as Vec;
  /** The scene's axis that becomes the file's axis number `index`, to carry columns as well. */
  const uncarry = (index: number): Vec => {
    const unit: Vec = [index === 0 ? 1 : 0, index === 1 ? 1 : 0, index === 2 ? 1 : 0];
    return [0, 1, 2].map((axis) =>
      to.reduce(
        (sum, direction, place) =>
          sum +
          (direction[0] * unit[0] + direction[1] * unit[1] + direction[2] * unit[2]) *
            ((from[place] as Vec)[axis] as number),
        0,
      ),
    ) as unknown as Vec;
  };
  return deliveredJoints(rig, wanted).map(({ index: node }) => {
    const m = poser.world.subarray(node * 16, node * 16 + 16);
    const columns = [0, 1, 2].map((index) => {
      const v = uncarry(index);
      const turned = [0, 1, 2].map(
        (row) => (m[row] as number) * v[0] + (m[row + 4] as number) * v[1] + (m[row + 8] as number) * v[2],
      ) as unknown as Vec;
      return [...carry(turned), 0];
    });
    const at = carry([m[12] as number, m[13] as number, m[14] as number]).map((value) => value * factor);
    return [...columns.flat(), ...at, 1] as unknown as Mat4;
  });
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
    const clip = loaded.animations[0] as AnimationClip;
    expect(clip.duration).toBeCloseTo((poses.length - 1) * POSE_SECONDS, 4);
    const mixer = new AnimationMixer(loaded.scene);
    mixer.clipAction(clip).play();
    for (const index of [1, Math.floor(poses.length / 3), Math.floor(poses.length / 2), poses.length - 2]) {
      mixer.setTime(index * POSE_SECONDS);
      loaded.scene.updateMatrixWorld(true);
      worldIn(rig, wanted, GLTF_SPACE, poses[index]).forEach((matrix, place) => {
        const bone = bones.get(joints[place]?.node.name ?? '');
        const at = bone?.matrixWorld.elements.slice(12, 15) ?? [];
        for (const axis of [0, 1, 2]) {
          expect(Math.abs((at[axis] as number) - (matrix[12 + axis] as number))).toBeLessThan(
            1e-4 * Math.max(1, heightOf(world)),
          );
        }
      });
    }
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
