import { Bone, Object3D, Skeleton } from 'three';
import { createPoser } from '@/compiler/pose/createPoser';
import type { BenchRow } from './BenchRow';
import { heapInUse } from './collectGarbage';
import { makeLargeRig } from './largeRig';
import { median } from './median';

const ROUNDS = 40;
const FRAMES = 50;

/** The same tree in three.js: joints as bones, everything else as plain objects. */
function makeTree() {
  const { rig } = makeLargeRig();
  const objects = new Map<string, Object3D>();
  const bones: Bone[] = [];
  const root = new Object3D();
  for (const node of rig.nodes) {
    const object = node.kind === 'joint' ? new Bone() : new Object3D();
    if (object instanceof Bone) bones.push(object);
    object.position.set(...node.at);
    object.quaternion.set(...node.turn);
    (node.parent === null ? root : (objects.get(node.parent) as Object3D)).add(object);
    objects.set(node.name, object);
  }
  return { root, skeleton: new Skeleton(bones) };
}

/**
 * Evaluating a pose, constraints and inverse kinematics included, beside what three.js does for the same tree without
 * either: world matrices and the skeleton's bone matrices. Turn by turn in one run.
 */
export function measureAgainstThree(): readonly BenchRow[] {
  const { rig, pose } = makeLargeRig();
  const poser = createPoser(rig);
  const { root, skeleton } = makeTree();
  const time = (task: () => void): number => {
    const started = performance.now();
    for (let frame = 0; frame < FRAMES; frame += 1) task();
    return performance.now() - started;
  };
  const ratios: number[] = [];
  for (let round = 0; round < ROUNDS * 2; round += 1) {
    const theirs = time(() => {
      root.updateMatrixWorld(true);
      skeleton.update();
    });
    const ours = time(() => poser.evaluate(pose));
    if (round >= ROUNDS) ratios.push(ours / theirs);
  }
  const joints = rig.nodes.filter(({ kind }) => kind === 'joint').length;
  return [
    {
      name: `evaluate a pose of ${joints} joints ÷ three.js updateMatrixWorld + Skeleton.update`,
      value: median(ratios),
      goal: 1,
      unit: '×',
    },
    { name: 'bytes allocated by one evaluated frame', value: bytesPerFrame(), goal: 0, unit: 'bytes' },
  ];

  /** Growth of the heap over many frames, before anything is collected. */
  function bytesPerFrame(): number {
    for (let frame = 0; frame < 2000; frame += 1) poser.evaluate(pose);
    const before = heapInUse();
    for (let frame = 0; frame < 1000; frame += 1) poser.evaluate(pose);
    return Math.max(0, Math.round((process.memoryUsage().heapUsed - before) / 1000));
  }
}
