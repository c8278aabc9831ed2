import { type Accessor, Document, type Node, WebIO } from '@gltf-transform/core';
import { composeMat4, IDENTITY_MAT4, invertMat4, type Mat4, multiplyMat4 } from '../math/mat4';
import { createPoser } from '../pose/createPoser';
import type { PoseValues, Quat, Rig, Vec3 } from '../rig/Rig';
import { GLTF_SPACE, spaceChange } from './axes';
import type { DeliveryProfile } from './DeliveryProfile';
import { deliveredNames } from './deliveredNames';
import { continuous, type JointTransform, jointTransforms } from './jointTransforms';
import { POSE_SECONDS, rangeOfMotion } from './rangeOfMotion';
import { type DeliveredJoint, deliveredJoints } from './skeleton';

/** Half the width of the little mark that stands at each joint, as a share of the skeleton's height. */
const MARK = 0.004;

interface Skeleton {
  readonly joints: readonly DeliveredJoint[];
  readonly nodes: readonly Node[];
  readonly rest: readonly JointTransform[];
  readonly world: readonly Mat4[];
}

function worldMatrices(joints: readonly DeliveredJoint[], rest: readonly JointTransform[]): readonly Mat4[] {
  const world: Mat4[] = [];
  joints.forEach(({ parent }, place) => {
    const { at, turn, size } = rest[place] as JointTransform;
    const own = composeMat4(at, turn, size);
    world.push(parent === null ? own : multiplyMat4(world[parent] as Mat4, own));
  });
  return world;
}

/**
 * A mesh for the skin: an octahedron's half, three triangles, at each joint, bound wholly to it. A skin without a mesh
 * that uses it would be an unused object to a validator, and nothing to see for a person.
 */
function addMarks(document: Document, { nodes, world }: Skeleton, name: string): Node {
  const height = Math.max(...world.map((matrix) => Math.abs(matrix[13])), 0.1);
  const size = height * MARK;
  const corners: readonly Vec3[] = [
    [size, 0, 0],
    [0, size, 0],
    [0, 0, size],
    [-size, -size, -size],
  ];
  const faces = [0, 1, 2, 0, 3, 1, 1, 3, 2, 2, 3, 0];
  const positions = new Float32Array(nodes.length * corners.length * 3);
  const jointIndices = new Uint16Array(nodes.length * corners.length * 4);
  const weights = new Float32Array(nodes.length * corners.length * 4);
  const indices = new Uint32Array(nodes.length * faces.length);
  world.forEach((matrix, joint) => {
    corners.forEach((corner, index) => {
      const vertex = joint * corners.length + index;
      positions.set([matrix[12] + corner[0], matrix[13] + corner[1], matrix[14] + corner[2]], vertex * 3);
      jointIndices[vertex * 4] = joint;
      weights[vertex * 4] = 1;
    });
    faces.forEach((face, index) => {
      indices[joint * faces.length + index] = joint * corners.length + face;
    });
  });
  const buffer = document.getRoot().listBuffers()[0] ?? document.createBuffer();
  const accessor = (
    type: Accessor['getType'] extends () => infer T ? T : never,
    array: Accessor['getArray'] extends () => infer A ? A : never,
  ) => document.createAccessor().setType(type).setArray(array).setBuffer(buffer);
  const primitive = document
    .createPrimitive()
    .setIndices(accessor('SCALAR', indices))
    .setAttribute('POSITION', accessor('VEC3', positions))
    .setAttribute('JOINTS_0', accessor('VEC4', jointIndices))
    .setAttribute('WEIGHTS_0', accessor('VEC4', weights))
    .setMaterial(document.createMaterial('marks').setBaseColorFactor([0.9, 0.6, 0, 1]).setDoubleSided(true));
  return document.createNode(`${name}_marks`).setMesh(document.createMesh('marks').addPrimitive(primitive));
}

function addSkin(
  document: Document,
  { nodes, world }: Skeleton,
  name: string,
): ReturnType<Document['createSkin']> {
  const inverses = new Float32Array(nodes.length * 16);
  world.forEach((matrix, place) => {
    inverses.set(invertMat4(matrix) ?? IDENTITY_MAT4, place * 16);
    // The fourth row of an inverse bind matrix is 0 0 0 1 exactly.
    for (const [entry, value] of [
      [3, 0],
      [7, 0],
      [11, 0],
      [15, 1],
    ] as const) {
      inverses[place * 16 + entry] = value;
    }
  });
  const buffer = document.getRoot().listBuffers()[0] ?? document.createBuffer();
  const skin = document
    .createSkin(name)
    .setInverseBindMatrices(document.createAccessor().setType('MAT4').setArray(inverses).setBuffer(buffer));
  for (const node of nodes) skin.addJoint(node);
  return skin;
}

function isStill(values: readonly (readonly number[])[]): boolean {
  const [first = []] = values;
  return values.every((value) =>
    value.every((number, index) => Math.abs(number - (first[index] ?? 0)) < 1e-7),
  );
}

/** Bakes poses into an animation; channels that never move are left out. */
function addAnimation(
  document: Document,
  { joints, nodes }: Skeleton,
  rig: Rig,
  poses: readonly PoseValues[],
  change: ReturnType<typeof spaceChange>,
): void {
  const poser = createPoser(rig);
  const frames = poses.map((pose) => {
    poser.evaluate(pose);
    return jointTransforms(joints, poser, change);
  });
  const buffer = document.getRoot().listBuffers()[0] ?? document.createBuffer();
  const times = Float32Array.from(poses, (_, index) => index * POSE_SECONDS);
  const input = document.createAccessor().setType('SCALAR').setArray(times).setBuffer(buffer);
  const animation = document.createAnimation('range_of_motion');
  const channel = (
    node: Node,
    path: 'translation' | 'rotation' | 'scale',
    values: readonly (Vec3 | Quat)[],
  ): void => {
    if (isStill(values)) return;
    const output = document
      .createAccessor()
      .setType(path === 'rotation' ? 'VEC4' : 'VEC3')
      .setArray(Float32Array.from(values.flat()))
      .setBuffer(buffer);
    const sampler = document
      .createAnimationSampler()
      .setInput(input)
      .setOutput(output)
      .setInterpolation('LINEAR');
    animation.addSampler(sampler);
    animation.addChannel(
      document.createAnimationChannel().setTargetNode(node).setTargetPath(path).setSampler(sampler),
    );
  };
  nodes.forEach((node, place) => {
    const of = <T>(read: (transform: JointTransform) => T): readonly T[] =>
      frames.map((frame) => read(frame[place] as JointTransform));
    channel(
      node,
      'translation',
      of(({ at }) => at),
    );
    channel(node, 'rotation', continuous(of(({ turn }) => turn)));
    channel(
      node,
      'scale',
      of(({ size }) => size),
    );
  });
  if (animation.listChannels().length === 0) {
    animation.dispose();
    input.dispose();
  }
}

/**
 * The skeleton of a rig as binary glTF 2.0: joints at rest with a skin, a little mark at each, and the range of motion
 * baked in. The same rig and profile always give the same bytes.
 */
export async function toGlb(rig: Rig, profile: DeliveryProfile): Promise<Uint8Array> {
  const joints = deliveredJoints(rig, profile);
  const change = spaceChange(rig.scene, GLTF_SPACE);
  const rest = jointTransforms(joints, createPoser(rig), change);
  const names = deliveredNames(joints, profile);
  const document = new Document();
  document.createBuffer();
  document.getRoot().getAsset().generator = 'Pintle';
  const nodes = joints.map((_, place) => {
    const { at, turn, size } = rest[place] as JointTransform;
    return document
      .createNode(names[place] ?? '')
      .setTranslation([...at])
      .setRotation([...turn])
      .setScale([...size]);
  });
  const { character } = rig.scene;
  const top = document.createNode(`${character}_skeleton`);
  joints.forEach(({ parent }, place) => {
    (parent === null ? top : (nodes[parent] as Node)).addChild(nodes[place] as Node);
  });
  const scene = document.createScene(character).addChild(top);
  document.getRoot().setDefaultScene(scene);
  if (joints.length > 0) {
    const skeleton = { joints, nodes, rest, world: worldMatrices(joints, rest) };
    const marks = addMarks(document, skeleton, character);
    scene.addChild(marks.setSkin(addSkin(document, skeleton, character)));
    if (profile.animation === 'range_of_motion')
      addAnimation(document, skeleton, rig, rangeOfMotion(rig), change);
  }
  return new WebIO().writeBinary(document);
}
