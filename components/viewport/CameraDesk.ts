import { MathUtils, type PerspectiveCamera, Vector3 } from 'three';
import type { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import { axisDirection, type RigScene, type Vec3 } from '@/compiler';

/** Where the viewer may stand. */
export type Standpoint = 'free' | 'front' | 'side' | 'top';

/** Room left around what is framed, as a factor on its size. */
const MARGIN = 1.12;

/** The camera stays so far before what is framed, as a share of half its depth: points in one line of sight need it. */
const CLEARANCE = 0.05;

/** A point by its place across one direction of the picture, and towards the camera. */
type Seen = readonly [across: number, towards: number];

/**
 * How far back a camera must be at least to see points between two edges that part by `slope` on each side: each edge
 * is moved back until it touches its outermost point, and the camera stands where both edges meet.
 */
function leastBack(points: readonly Seen[], slope: number): number {
  const high = Math.max(...points.map(([across, towards]) => towards + across / slope));
  const low = Math.max(...points.map(([across, towards]) => towards - across / slope));
  return (high + low) / 2;
}

/** Where a camera so far back must be across the picture, for the outermost points to be as far from either edge. */
function middleAcross(points: readonly Seen[], back: number): number {
  let low = Math.min(...points.map(([across]) => across));
  let high = Math.max(...points.map(([across]) => across));
  // Halved until doubles can tell no more.
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    const slopes = points.map(([across, towards]) => (across - middle) / (back - towards));
    if (Math.max(...slopes) + Math.min(...slopes) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
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
    const places = points.map((point) => new Vector3(...point));
    const seenAlong = (axis: Vector3): readonly Seen[] =>
      places.map((place) => [place.dot(axis), place.dot(direction)]);
    const [sideways, upwards] = [seenAlong(right), seenAlong(upward)];
    const tall = Math.tan(MathUtils.degToRad(this.camera.fov) / 2) / MARGIN;
    const depths = sideways.map(([, towards]) => towards);
    const [near, far] = [Math.max(...depths), Math.min(...depths)];
    const clear = near + ((near - far) / 2) * CLEARANCE + 1e-6;
    const back = Math.max(leastBack(sideways, tall * this.camera.aspect), leastBack(upwards, tall), clear);
    const distance = back - (near + far) / 2;
    this.controls.target
      .copy(direction)
      .multiplyScalar((near + far) / 2)
      .addScaledVector(right, middleAcross(sideways, back))
      .addScaledVector(upward, middleAcross(upwards, back));
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
