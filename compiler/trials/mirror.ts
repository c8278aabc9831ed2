import { eulerToQuat, quatToEuler } from '../math/euler';
import {
  columnsOf,
  composeMat4,
  type Mat4,
  matFromColumns,
  multiplyMat4,
  positionOf,
  rotationOf,
} from '../math/mat4';
import { add, dot, scale, sub } from '../math/vec3';
import { readMatrix } from '../pose/worldMatrices';
import type { ControlNode, PoseValues, RigNode, Vec3 } from '../rig/Rig';
import { displacement } from './displacement';
import { findInfluences } from './influences';
import { nudge, type PoseDraft, put, putAmount } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { Twins } from './TrialIntent';
import type { TrialResult } from './TrialResult';

/**
 * Relative to the rig's size. Rest is rounded on each side in its own axes, by some 1e-12 of the size, and a chain near
 * its full reach bends by the square root of what is left to it: at a hundredth of its length off straight it shows
 * rounding a hundredfold, at less yet more.
 */
const MIRROR_TOLERANCE = 1e-7;

/** A reflection of a right twin's axes against the mirrored left ones: columns of an orthogonal 3 × 3 matrix. */
type Flip = readonly [Vec3, Vec3, Vec3];

interface Pair extends Twins {
  readonly leftIndex: number;
  readonly rightIndex: number;
  readonly flip: Flip;
}

function mirrorVector(v: Vec3, left: Vec3): Vec3 {
  return sub(v, scale(left, 2 * dot(v, left)));
}

function transposed([x, y, z]: Flip): Flip {
  return [
    [x[0], y[0], z[0]],
    [x[1], y[1], z[1]],
    [x[2], y[2], z[2]],
  ];
}

function applyFlip([x, y, z]: Flip, v: Vec3): Vec3 {
  return add(add(scale(x, v[0]), scale(y, v[1])), scale(z, v[2]));
}

/** How local values of a left twin look on the right: worldRight = mirror × worldLeft × flip. */
function flipOf({ axes }: Twins, restLeft: Mat4, left: Vec3): Flip {
  switch (axes.kind) {
    case 'opposed':
      return [
        [-1, 0, 0],
        [0, -1, 0],
        [0, 0, -1],
      ];
    case 'hinge':
      return [
        [axes.axis === 0 ? -1 : 1, 0, 0],
        [0, axes.axis === 1 ? -1 : 1, 0],
        [0, 0, axes.axis === 2 ? -1 : 1],
      ];
    case 'same': {
      // Both stand alike in the world; the mirror, seen in the axes they share.
      const axes = columnsOf(restLeft);
      const column = (of: Vec3): Vec3 => {
        const mirrored = mirrorVector(of, left);
        return [dot(axes[0], mirrored), dot(axes[1], mirrored), dot(axes[2], mirrored)];
      };
      return [column(axes[0]), column(axes[1]), column(axes[2])];
    }
    default:
      return axes satisfies never;
  }
}

/** The world matrix a right twin has when the left one's is mirrored. */
function mirroredWorld(world: Mat4, flip: Flip, left: Vec3): Mat4 {
  const [x, y, z] = columnsOf(world).map((axis) => mirrorVector(axis, left)) as unknown as [Vec3, Vec3, Vec3];
  const axes: Flip = [x, y, z];
  return matFromColumns(
    applyFlip(axes, flip[0]),
    applyFlip(axes, flip[1]),
    applyFlip(axes, flip[2]),
    mirrorVector(positionOf(world), left),
  );
}

/** Channel values that move the right control as the mirror shows the left one; null where its limits forbid them. */
function mirroredValues(
  values: Readonly<Record<string, number>>,
  right: ControlNode,
  left: ControlNode,
  flip: Flip,
): Readonly<Record<string, number>> | null {
  const read = (a: string, b: string, c: string): Vec3 => [values[a] ?? 0, values[b] ?? 0, values[c] ?? 0];
  const inverse = transposed(flip);
  const turn = composeMat4([0, 0, 0], eulerToQuat(read('rx', 'ry', 'rz'), left.order));
  const [f, g, h] = flip;
  const [i, j, k] = inverse;
  // The flip reflects; reflected twice, the rotation is one again.
  const turned = multiplyMat4(
    matFromColumns(i, j, k, [0, 0, 0]),
    multiplyMat4(turn, matFromColumns(f, g, h, [0, 0, 0])),
  );
  const [tx, ty, tz] = applyFlip(inverse, read('tx', 'ty', 'tz'));
  const [rx, ry, rz] = quatToEuler(rotationOf(turned), right.order);
  const mirrored: Record<string, number> = { tx, ty, tz, rx, ry, rz };
  for (const [channel, value] of Object.entries(mirrored)) {
    const rule = right.channels[channel as 'tx'];
    const least = rule?.locked ? 0 : (rule?.min ?? -Infinity);
    const most = rule?.locked ? 0 : (rule?.max ?? Infinity);
    // Rounding of an angle read back from its rotation.
    const slack = 1e-9;
    if (value < least - slack || value > most + slack) return null;
  }
  return mirrored;
}

/** Attributes that solvers read as angles about the line from a start to its goal, as control and attribute. */
function swingsOf({ rig }: TrialBench): ReadonlySet<string> {
  const keys = new Set<string>();
  for (const solver of rig.solvers) {
    if ('swing' in solver && typeof solver.swing !== 'number') {
      keys.add(`${solver.swing.control} ${solver.swing.attribute}`);
    }
  }
  return keys;
}

/** Attribute values for twins: partway from the default to a bound, where there is one, by number on the left. */
function attributeValues(control: ControlNode, share: number): Readonly<Record<string, number>> {
  const values: Record<string, number> = {};
  for (const { name, default: initial, min, max, labels } of control.attributes) {
    if (labels !== null) continue;
    const bound = max !== null && max !== initial ? max : (min ?? initial);
    values[name] = initial + (bound - initial) * share;
  }
  return values;
}

/** The same on the right: equal but for angles about a line, which the mirror turns round. */
function mirroredAttributes(
  values: Readonly<Record<string, number>>,
  right: ControlNode,
  swings: ReadonlySet<string>,
): Readonly<Record<string, number>> {
  const mirrored = Object.entries(values).map(([name, value]): [string, number] => {
    return [name, swings.has(`${right.name} ${name}`) ? -value : value];
  });
  return Object.fromEntries(mirrored);
}

/** Both twins posed as the mirror shows them: `seed` varies the channels, `share` how far attributes go. */
function mirroredPose(pairs: readonly Pair[], bench: TrialBench, seed: number, share: number): PoseValues {
  const { rig, size } = bench;
  const draft: PoseDraft = {};
  const swings = swingsOf(bench);
  pairs.forEach(({ leftIndex, rightIndex, flip }, index) => {
    const [left, right] = [rig.nodes[leftIndex], rig.nodes[rightIndex]];
    if (left?.kind !== 'control' || right?.kind !== 'control') return;
    const values = nudge(left, seed + index * 9, size);
    const mirrored = mirroredValues(values, right, left, flip);
    if (mirrored) {
      put(draft, left.name, values);
      put(draft, right.name, mirrored);
    }
    const attributes = attributeValues(left, share);
    put(draft, left.name, attributes);
    put(draft, right.name, mirroredAttributes(attributes, right, swings));
  });
  return draft;
}

/**
 * Pairs without those that something moves which stands on one side only: the recipe is lopsided there. Most recipes
 * have no such thing, so what moves what is looked up only when there is one.
 */
function leaveOutLopsided(
  pairs: readonly Pair[],
  paired: ReadonlySet<string>,
  bench: TrialBench,
): readonly Pair[] {
  const isLoner = ({ id, side, kind }: RigNode): boolean =>
    side !== 'centre' && (kind === 'joint' || kind === 'control') && !paired.has(id);
  const loners = new Set(bench.rig.nodes.filter(isLoner).map(({ name }) => name));
  if (loners.size === 0) return pairs;
  const isMovedBy = findInfluences(bench);
  const isEven = (index: number): boolean => !isMovedBy(bench.rig.nodes[index]?.name ?? '', loners);
  return pairs.filter(({ leftIndex, rightIndex }) => isEven(leftIndex) && isEven(rightIndex));
}

/**
 * A mirrored pose gives a mirrored rig: twins that one entry makes on both sides stand as each other's mirror image,
 * at rest and in poses that both sides take alike, with equal
 * attributes (but opposite swings); twins mirrored by behaviour take equal turns.
 */
export function tryMirror(bench: TrialBench): TrialResult {
  const { rig, intent, poser, rest, indexOfId, size } = bench;
  const { left } = intent;
  const tally = new Tally('mirror', rig.scene.unit, MIRROR_TOLERANCE * size);
  const paired = new Set(intent.twins.flatMap((twins) => [twins.left, twins.right]));
  const pairs = intent.twins.flatMap((twins): Pair[] => {
    const leftIndex = indexOfId.get(twins.left);
    const rightIndex = indexOfId.get(twins.right);
    if (leftIndex === undefined || rightIndex === undefined) return [];
    return [{ ...twins, leftIndex, rightIndex, flip: flipOf(twins, readMatrix(rest, leftIndex), left) }];
  });
  const compared = leaveOutLopsided(pairs, paired, bench);
  if (compared.length === 0) return tally.result();
  const compare = (pose: PoseValues, world: Float64Array): void => {
    for (const { leftIndex, rightIndex, flip, right } of compared) {
      const expected = mirroredWorld(readMatrix(world, leftIndex), flip, left);
      tally.add(displacement(world, rightIndex, expected, 0, size), right, pose);
    }
  };
  const compareIn = (pose: PoseValues): void => {
    poser.evaluate(pose);
    compare(pose, poser.world);
  };
  compare({}, bench.evaluatedRest);
  const bySteps: PoseDraft = { ...mirroredPose(compared, bench, 5, 0.4) };
  for (const solver of rig.solvers) if ('blend' in solver) putAmount(bySteps, solver.blend, 0, bench);
  compareIn(bySteps);
  compareIn(mirroredPose(compared, bench, 11, 0.7));
  return tally.result();
}
