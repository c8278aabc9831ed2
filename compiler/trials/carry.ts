import { eulerToQuat } from '../math/euler';
import { composeMat4, invertMat4, type Mat4, multiplyMat4 } from '../math/mat4';
import { REST_TOLERANCE } from '../math/tolerances';
import { CHANNELS } from '../pose/channelValues';
import { readMatrix } from '../pose/worldMatrices';
import type { Channel, ControlNode, Vec3 } from '../rig/Rig';
import { displacement } from './displacement';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** How the root is moved: as a rigid body, then scaled as well; moves in rig sizes, turns in degrees. */
const MOTIONS: readonly Readonly<Partial<Record<Channel, number>>>[] = [
  { tx: 0.3, ty: -0.04, tz: 0.12, rx: 20, ry: 75, rz: -10 },
  { tx: -0.2, ty: 0.1, tz: 0.3, rx: -35, ry: 140, rz: 15, sx: 0.8, sy: 0.8, sz: 0.8 },
];

/** The values of a motion that the root can take: locked channels stay, the others within their limits. */
function valuesFor(
  root: ControlNode,
  motion: (typeof MOTIONS)[number],
  size: number,
): Record<Channel, number> {
  const values = CHANNELS.map((channel): [Channel, number] => {
    const rest = channel.startsWith('s') ? 1 : 0;
    const rule = root.channels[channel];
    const wanted = (motion[channel] ?? rest) * (channel.startsWith('t') ? size : 1);
    if (rule?.locked) return [channel, rest];
    return [channel, Math.min(rule?.max ?? Infinity, Math.max(rule?.min ?? -Infinity, wanted))];
  });
  return Object.fromEntries(values) as Record<Channel, number>;
}

/**
 * Ids of nodes that a declared link ties to a node of the other kind, carried or parked: the recipe asks for a
 * mixed motion there, of which no single answer can be told. What hangs on or follows such a node is mixed as well.
 */
function mixedNodes({ rig, intent, indexOfName }: TrialBench): ReadonlySet<string> {
  const isCarried = (id: string): boolean => intent.nodes.get(id)?.carried ?? false;
  // What a driver makes of the root's own channels is meant to go another way than the root.
  const mixed = new Set(intent.drivenByRoot);
  const dependents = new Map<string, string[]>();
  const addDependent = (source: string, target: string): void => {
    const own = dependents.get(source);
    if (own) own.push(target);
    else dependents.set(source, [target]);
  };
  for (const { id, parent } of rig.nodes) {
    const above = parent === null ? undefined : rig.nodes[indexOfName.get(parent) ?? -1];
    if (above) addDependent(above.id, id);
  }
  for (const { targets, sources } of intent.links) {
    for (const target of targets) {
      for (const source of sources) {
        addDependent(source, target);
        if (isCarried(source) !== isCarried(target)) mixed.add(target);
      }
    }
  }
  const pending = [...mixed];
  for (let next = pending.pop(); next !== undefined; next = pending.pop()) {
    for (const dependent of dependents.get(next) ?? []) {
      if (mixed.has(dependent)) continue;
      mixed.add(dependent);
      pending.push(dependent);
    }
  }
  return mixed;
}

/** World motion of everything that the root carries: its own axes moved as the channels say. */
function motionOf(values: Readonly<Record<Channel, number>>, root: ControlNode, rest: Mat4): Mat4 {
  const at: Vec3 = [values.tx, values.ty, values.tz];
  const turn = eulerToQuat([values.rx, values.ry, values.rz], root.order);
  const own = composeMat4(at, turn, [values.sx, values.sy, values.sz]);
  const inverse = invertMat4(rest);
  return inverse === undefined ? own : multiplyMat4(rest, multiplyMat4(own, inverse));
}

/**
 * Moving, turning and scaling the root reaches each carried thing exactly once, and no parked thing unless a link
 * that the recipe declares brings it along.
 */
export function tryCarry(bench: TrialBench): TrialResult {
  const { rig, intent, poser, evaluatedRest, size, tolerance } = bench;
  // Moved by up to half its size, the rig reaches farther out than at rest.
  const tally = new Tally('carry', rig.scene.unit, tolerance + REST_TOLERANCE * size);
  const rootIndex = bench.indexOfId.get(intent.carrier ?? '');
  const root = rootIndex === undefined ? undefined : rig.nodes[rootIndex];
  if (rootIndex === undefined || root?.kind !== 'control') return tally.result();
  const mixed = mixedNodes(bench);
  for (const motion of MOTIONS) {
    const values = valuesFor(root, motion, size);
    const pose = { [root.name]: values };
    const whole = motionOf(values, root, readMatrix(evaluatedRest, rootIndex));
    poser.evaluate(pose);
    rig.nodes.forEach(({ id }, index) => {
      if (mixed.has(id)) return;
      const rest = readMatrix(evaluatedRest, index);
      const expected = intent.nodes.get(id)?.carried ? multiplyMat4(whole, rest) : rest;
      tally.add(displacement(poser.world, index, expected, 0, size), id, pose);
    });
  }
  return tally.result();
}
