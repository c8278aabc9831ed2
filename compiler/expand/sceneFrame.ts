import { axisDirection, leftDirection } from '../math/axisDirection';
import type { Axis } from '../rig/Rig';
import type { Recipe } from '../schema/generated/recipeTypes';
import { expandFindings } from './findings';
import type { StageContext } from './StageContext';
import type { SceneFrame } from './types';

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
  const up = axisDirection(upAxis);
  const forward = axisDirection(forwardAxis);
  const left = leftDirection({ up: upAxis, forward: forwardAxis });
  return { upAxis, forwardAxis, unit: scene?.unit ?? 'cm', up, forward, left };
}
