import { MathUtils, type PerspectiveCamera, Vector3 } from 'three';
import type { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import type { RigScene, Vec3 } from '@/compiler';
import { axisOf } from './Ground';

/** Where the viewer may stand. */
export type Standpoint = 'free' | 'front' | 'side' | 'top';

export interface Box {
  readonly low: Vec3;
  readonly high: Vec3;
}

/** Room left around what is framed, as a factor on its size. */
const MARGIN = 1.12;

/** The eight corners of a box. */
function cornersOf({ low, high }: Box): readonly Vector3[] {
  return [0, 1, 2, 3, 4, 5, 6, 7].map(
    (corner) =>
      new Vector3(
        corner & 1 ? high[0] : low[0],
        corner & 2 ? high[1] : low[1],
        corner & 4 ? high[2] : low[2],
      ),
  );
}

/** Moves the camera of one viewport: standpoints, framing, and small steps for the keyboard. */
export class CameraDesk {
  constructor(
    private readonly camera: PerspectiveCamera,
    private readonly controls: OrbitControls,
    private readonly scene: Pick<RigScene, 'up' | 'forward'>,
    private readonly redraw: () => void,
  ) {
    this.camera.up.set(...axisOf(scene.up));
  }

  #direction(standpoint: Standpoint): Vector3 {
    const up = new Vector3(...axisOf(this.scene.up));
    const forward = new Vector3(...axisOf(this.scene.forward));
    const left = new Vector3().crossVectors(up, forward);
    switch (standpoint) {
      case 'front':
        return forward;
      case 'side':
        return left;
      case 'top':
        // A hair off the vertical keeps "up" on the screen defined.
        return up.addScaledVector(forward, 1e-3).normalize();
      default:
        return forward.addScaledVector(left, 0.75).addScaledVector(up, 0.35).normalize();
    }
  }

  /** Stands at a standpoint and frames a box. */
  stand(standpoint: Standpoint, box: Box): void {
    this.#frame(box, this.#direction(standpoint));
  }

  /** Frames a box from where the camera stands. */
  frame(box: Box): void {
    this.#frame(box, this.camera.position.clone().sub(this.controls.target).normalize());
  }

  /** The least distance from the box's middle at which all its corners are in the picture. */
  #distanceTo(box: Box, target: Vector3, direction: Vector3): number {
    const right = new Vector3().crossVectors(this.camera.up, direction).normalize();
    const upward = new Vector3().crossVectors(direction, right);
    const tall = Math.tan(MathUtils.degToRad(this.camera.fov) / 2);
    const wide = tall * this.camera.aspect;
    const needs = cornersOf(box).map((corner) => {
      const from = corner.sub(target);
      const needed = Math.max(Math.abs(from.dot(right)) / wide, Math.abs(from.dot(upward)) / tall);
      return needed * MARGIN + from.dot(direction);
    });
    return Math.max(...needs, 1e-6);
  }

  #frame(box: Box, direction: Vector3): void {
    const target = new Vector3(...box.low).add(new Vector3(...box.high)).multiplyScalar(0.5);
    const distance = this.#distanceTo(box, target, direction);
    this.controls.target.copy(target);
    this.camera.position.copy(target).addScaledVector(direction, distance);
    this.camera.near = distance / 200;
    this.camera.far = distance * 50;
    this.camera.updateProjectionMatrix();
    this.controls.update();
    this.redraw();
  }

  /** Turns about the target by degrees: sideways and upwards. */
  orbit(sideways: number, upwards: number): void {
    const up = this.camera.up.clone().normalize();
    const offset = this.camera.position.clone().sub(this.controls.target);
    offset.applyAxisAngle(up, MathUtils.degToRad(-sideways));
    const right = new Vector3().crossVectors(up, offset).normalize();
    const pitched = offset.clone().applyAxisAngle(right, MathUtils.degToRad(-upwards));
    // Never over the pole: there the picture would turn upside down.
    if (Math.abs(pitched.clone().normalize().dot(up)) < 0.999) offset.copy(pitched);
    this.camera.position.copy(this.controls.target).add(offset);
    this.controls.update();
    this.redraw();
  }

  /** Moves the picture by shares of its height. */
  pan(sideways: number, upwards: number): void {
    const distance = this.camera.position.distanceTo(this.controls.target);
    const right = new Vector3().setFromMatrixColumn(this.camera.matrix, 0);
    const upward = new Vector3().setFromMatrixColumn(this.camera.matrix, 1);
    const move = right.multiplyScalar(sideways * distance).addScaledVector(upward, upwards * distance);
    this.camera.position.add(move);
    this.controls.target.add(move);
    this.controls.update();
    this.redraw();
  }

  /** Comes nearer by a factor; below one, goes back. */
  approach(factor: number): void {
    const offset = this.camera.position.clone().sub(this.controls.target);
    this.camera.position.copy(this.controls.target).addScaledVector(offset, 1 / factor);
    this.controls.update();
    this.redraw();
  }
}
