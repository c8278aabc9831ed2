import type { Axis, Vec3 } from '../rig/Rig';
import type { Recipe } from '../schema/generated/recipeTypes';
import { expandFindings } from './findings';
import type { StageContext } from './StageContext';
import type { SceneFrame } from './types';

const DIRECTIONS: Readonly<Record<Axis, Vec3>> = {
  '+x': [1, 0, 0],
  '-x': [-1, 0, 0],
  '+y': [0, 1, 0],
  '-y': [0, -1, 0],
  '+z': [0, 0, 1],
  '-z': [0, 0, -1],
};

/** The unit direction an axis name stands for. */
export function axisDirection(axis: Axis): Vec3 {
  return DIRECTIONS[axis];
}

/** Whether two axis names lie on one line. */
export function areParallel(first: Axis, second: Axis): boolean {
  return first[1] === second[1];
}

/** Reads the scene's axes; left is up × forward. Parallel axes are a finding and forward falls back. */
export function readSceneFrame(scene: Recipe['scene'], context: StageContext): SceneFrame {
  const upAxis: Axis = scene?.up ?? '+y';
  let forwardAxis: Axis = scene?.forward ?? (upAxis[1] === 'z' ? '-y' : '+z');
  if (areParallel(upAxis, forwardAxis)) {
    const key = scene?.forward === undefined ? 'up' : 'forward';
    context.findings.report(expandFindings, 'axes-parallel', context.document.spanAt(['scene', key]), {
      first: upAxis,
      second: forwardAxis,
      what: 'the scene',
    });
    forwardAxis = upAxis[1] === 'z' ? '-y' : '+z';
  }
  const up = DIRECTIONS[upAxis];
  const forward = DIRECTIONS[forwardAxis];
  const left: Vec3 = [
    up[1] * forward[2] - up[2] * forward[1] + 0,
    up[2] * forward[0] - up[0] * forward[2] + 0,
    up[0] * forward[1] - up[1] * forward[0] + 0,
  ];
  return { upAxis, forwardAxis, unit: scene?.unit ?? 'cm', up, forward, left };
}
