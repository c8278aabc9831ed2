import { MathUtils, type PerspectiveCamera, Vector3 } from 'three';
import type { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import { axisDirection, type RigScene, type Vec3 } from '@/compiler';

/** Where the viewer may stand. */
export type Standpoint = 'free' | 'front' | 'side' | 'top';

/** Room left around what is framed, as a factor on its size. */
const MARGIN = 1.12;

/** The camera stays outside of what is framed, by this factor on half its depth: points in one line of sight need it. */
const CLEARANCE = 1.05;

/** Where a camera must be across one direction of its picture, and how far back, to hold all points between its edges. */
interface Fit {
  readonly across: number;
  readonly back: number;
}

/**
 * Fits points, given by their places across the picture and towards the camera, between the two edges of a view
 * that widens by `slope` on each side: each edge is moved back until it touches its outermost point, and the camera
 * stands where both edges meet.
 */
function fitBetween(points: readonly (readonly [across: number, towards: number])[], slope: number): Fit {
  const high = Math.max(...points.map(([across, towards]) => towards + across / slope));
  const low = Math.max(...points.map(([across, towards]) => towards - across / slope));
  return { across: ((high - low) * slope) / 2, back: (high + low) / 2 };
}

/** Moves the camera of one viewport: standpoints, framing, and small steps for the keyboard. */
export class CameraDesk {
  #isTouched = false;

  constructor(
    private readonly camera: PerspectiveCamera,
    private readonly controls: OrbitControls,
    private readonly scene: Pick<RigScene, 'up' | 'forward'>,
    private readonly redraw: () => void,
  ) {
    this.camera.up.set(...axisDirection(scene.up));
  }

  /** Whether somebody has moved the camera. */
  get isTouched(): boolean {
    return this.#isTouched;
  }

  /** Says that somebody moves the camera; from then on it stays where it is put. */
  touch(): this {
    this.#isTouched = true;
    return this;
  }

  #direction(standpoint: Standpoint): Vector3 {
    const up = new Vector3(...axisDirection(this.scene.up));
    const forward = new Vector3(...axisDirection(this.scene.forward));
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

  /** Stands at a standpoint and frames points. */
  stand(standpoint: Standpoint, points: readonly Vec3[]): void {
    this.#frame(points, this.#direction(standpoint));
  }

  /** Frames points from the side on which the camera stands. */
  frame(points: readonly Vec3[]): void {
    this.#frame(points, this.camera.position.clone().sub(this.controls.target).normalize());
  }

  #frame(points: readonly Vec3[], direction: Vector3): void {
    const right = new Vector3().crossVectors(this.camera.up, direction).normalize();
    const upward = new Vector3().crossVectors(direction, right);
    const seen = points.map((point) => {
      const place = new Vector3(...point);
      return { across: place.dot(right), up: place.dot(upward), towards: place.dot(direction) };
    });
    const tall = Math.tan(MathUtils.degToRad(this.camera.fov) / 2) / MARGIN;
    const sideways = fitBetween(
      seen.map(({ across, towards }) => [across, towards]),
      tall * this.camera.aspect,
    );
    const upwards = fitBetween(
      seen.map(({ up, towards }) => [up, towards]),
      tall,
    );
    const depths = seen.map(({ towards }) => towards);
    const [near, far] = [Math.max(...depths), Math.min(...depths)];
    const middle = (near + far) / 2;
    const clear = ((near - far) / 2) * CLEARANCE + 1e-6;
    const distance = Math.max(sideways.back - middle, upwards.back - middle, clear);
    this.controls.target
      .copy(right)
      .multiplyScalar(sideways.across)
      .addScaledVector(upward, upwards.across)
      .addScaledVector(direction, middle);
    this.camera.position.copy(this.controls.target).addScaledVector(direction, distance);
    this.camera.near = distance / 200;
    this.camera.far = distance * 50;
    this.camera.updateProjectionMatrix();
    this.controls.update();
    this.redraw();
  }

  /** Turns about the target by degrees: sideways and upwards. */
  orbit(sideways: number, upwards: number): void {
    this.touch();
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
    this.touch();
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
    this.touch();
    const offset = this.camera.position.clone().sub(this.controls.target);
    this.camera.position.copy(this.controls.target).addScaledVector(offset, 1 / factor);
    this.controls.update();
    this.redraw();
  }
}
