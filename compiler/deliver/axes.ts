import { axisDirection } from '../math/axisDirection';
import { conjugateQuat, multiplyQuat, quatFromAxes, rotate } from '../math/quat';
import { cross, scale } from '../math/vec3';
import type { Axis, LengthUnit, Quat, RigScene, Vec3 } from '../rig/Rig';

const METRES: Readonly<Record<LengthUnit, number>> = { mm: 0.001, cm: 0.01, m: 1 };

/** Metres in one unit of length. */
export function metresPer(unit: LengthUnit): number {
  return METRES[unit];
}

/** Axes and unit of a file. */
export interface FileSpace {
  readonly up: Axis;
  readonly forward: Axis;
  readonly unit: LengthUnit;
}

/** The space of every glTF file: right-handed, Y up, Z forward, metres (glTF 2.0, section 3.4). */
export const GLTF_SPACE: FileSpace = { up: '+y', forward: '+z', unit: 'm' };

/** Carries places and turns of a scene into the axes and unit of a file. */
export interface SpaceChange {
  point(at: Vec3): Vec3;
  turn(turn: Quat): Quat;
  /** Factors along the axes, which change places with them. */
  size(factors: Vec3): Vec3;
}

function frameOf({ up, forward }: Pick<FileSpace, 'up' | 'forward'>): Quat {
  const y = axisDirection(up);
  const z = axisDirection(forward);
  return quatFromAxes(cross(y, z), y, z);
}

/** The change from a scene's axes and unit to a file's: left, up and forward of one become those of the other. */
export function spaceChange(scene: Pick<RigScene, 'up' | 'forward' | 'unit'>, file: FileSpace): SpaceChange {
  const change = multiplyQuat(frameOf(file), conjugateQuat(frameOf(scene)));
  const back = conjugateQuat(change);
  const factor = METRES[scene.unit] / METRES[file.unit];
  return {
    point: (at) => scale(rotate(change, at), factor),
    turn: (turn) => multiplyQuat(change, multiplyQuat(turn, back)),
    size: (factors) => rotate(change, factors).map(Math.abs) as unknown as Vec3,
  };
}
