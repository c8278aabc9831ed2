import { composeMat4, type Mat4, multiplyMat4 } from '../math/mat4';
import { createPoser } from '../pose/createPoser';
import type { Quat, Rig } from '../rig/Rig';
import { metresPer, spaceChange } from './axes';
import type { DeliveryProfile } from './DeliveryProfile';
import { deliveredNames } from './deliveredNames';
import { continuous, type JointTransform, jointTransforms } from './jointTransforms';
import { POSE_SECONDS, rangeOfMotion } from './rangeOfMotion';
import { type DeliveredJoint, deliveredJoints } from './skeleton';

const FRAMES_PER_SECOND = 24;

/** A name that a prim or a joint may bear: letters, digits and underscores, not beginning with a digit. */
function primName(name: string): string {
  const plain = name.replace(/[^A-Za-z0-9_]/g, '_');
  return /^[A-Za-z_]/.test(plain) ? plain : `_${plain}`;
}

/** The path of each joint from the top of the skeleton; siblings that would share a name are numbered apart. */
function jointPaths(joints: readonly DeliveredJoint[], names: readonly string[]): readonly string[] {
  const taken = new Set<string>();
  const paths: string[] = [];
  joints.forEach(({ parent }, place) => {
    const above = parent === null ? '' : `${paths[parent] ?? ''}/`;
    const own = primName(names[place] ?? '');
    let path = `${above}${own}`;
    for (let number = 2; taken.has(path); number += 1) path = `${above}${own}_${number}`;
    taken.add(path);
    paths.push(path);
  });
  return paths;
}

function number(value: number): string {
  return value === 0 ? '0' : String(value);
}

function tuple(values: readonly number[]): string {
  return `(${values.map(number).join(', ')})`;
}

/** USD multiplies row vectors: the position stands in the last row. Column-major numbers in order are its rows. */
function matrix(m: Mat4): string {
  const rows = [0, 4, 8, 12].map((row) => tuple(m.slice(row, row + 4)));
  return `(${rows.join(', ')})`;
}

function quaternion([x, y, z, w]: Quat): string {
  return tuple([w, x, y, z]);
}

function list(items: readonly string[]): string {
  return `[${items.join(', ')}]`;
}

/** Time samples of one array, one for each frame. */
function samples(name: string, frames: readonly string[]): string {
  const lines = frames.map(
    (value, index) => `                ${number(index * POSE_SECONDS * FRAMES_PER_SECOND)}: ${value},`,
  );
  return `            ${name}.timeSamples = {\n${lines.join('\n')}\n            }`;
}

function animationPrim(
  rig: Rig,
  joints: readonly DeliveredJoint[],
  paths: readonly string[],
  change: ReturnType<typeof spaceChange>,
): { readonly text: string; readonly frames: number } {
  const poser = createPoser(rig);
  const frames = rangeOfMotion(rig).map((pose) => {
    poser.evaluate(pose);
    return jointTransforms(joints, poser, change);
  });
  const turns = joints.map((_, place) =>
    continuous(frames.map((frame) => (frame[place] as JointTransform).turn)),
  );
  const text = [
    '        def SkelAnimation "RangeOfMotion"',
    '        {',
    `            uniform token[] joints = ${list(paths.map((path) => JSON.stringify(path)))}`,
    samples(
      'float3[] translations',
      frames.map((frame) => list(frame.map(({ at }) => tuple(at)))),
    ),
    samples(
      'quatf[] rotations',
      frames.map((_, index) => list(turns.map((turn) => quaternion(turn[index] as Quat)))),
    ),
    samples(
      'half3[] scales',
      frames.map((frame) => list(frame.map(({ size }) => tuple(size)))),
    ),
    '        }',
  ].join('\n');
  return { text, frames: frames.length };
}

/**
 * The skeleton of a rig as OpenUSD text: a SkelRoot with a Skeleton (UsdSkel) in the profile's axes and unit, and the
 * range of motion baked into a SkelAnimation. Names are made legal for USD; the same rig always gives the same text.
 */
export function toUsda(rig: Rig, profile: DeliveryProfile): string {
  const joints = deliveredJoints(rig, profile);
  const change = spaceChange(rig.scene, profile);
  const rest = jointTransforms(joints, createPoser(rig), change);
  const paths = jointPaths(joints, deliveredNames(joints, profile));
  const local = rest.map(({ at, turn, size }) => composeMat4(at, turn, size));
  const bind: Mat4[] = [];
  joints.forEach(({ parent }, place) => {
    const own = local[place] as Mat4;
    bind.push(parent === null ? own : multiplyMat4(bind[parent] as Mat4, own));
  });
  const root = primName(rig.scene.character);
  const animation =
    profile.animation === 'range_of_motion' && joints.length > 0
      ? animationPrim(rig, joints, paths, change)
      : null;
  const last = animation === null ? 0 : (animation.frames - 1) * POSE_SECONDS * FRAMES_PER_SECOND;
  const bound =
    animation === null ? '' : `\n            rel skel:animationSource = </${root}/Skeleton/RangeOfMotion>`;
  return [
    '#usda 1.0',
    '(',
    `    defaultPrim = ${JSON.stringify(root)}`,
    `    metersPerUnit = ${number(metresPer(profile.unit))}`,
    `    upAxis = ${JSON.stringify(profile.up === '+z' ? 'Z' : 'Y')}`,
    `    timeCodesPerSecond = ${FRAMES_PER_SECOND}`,
    '    startTimeCode = 0',
    `    endTimeCode = ${number(last)}`,
    ')',
    '',
    `def SkelRoot ${JSON.stringify(root)}`,
    '{',
    '    def Skeleton "Skeleton" (',
    '        prepend apiSchemas = ["SkelBindingAPI"]',
    '    )',
    '    {',
    `            uniform token[] joints = ${list(paths.map((path) => JSON.stringify(path)))}`,
    `            uniform matrix4d[] bindTransforms = ${list(bind.map(matrix))}`,
    `            uniform matrix4d[] restTransforms = ${list(local.map(matrix))}${bound}`,
    ...(animation === null ? [] : ['', animation.text]),
    '    }',
    '}',
    '',
  ].join('\n');
}
