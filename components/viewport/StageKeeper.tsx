'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useRef } from 'react';
import type { PerspectiveCamera } from 'three';
import { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import type { RigScene, Vec3 } from '@/compiler';
import { CameraDesk } from './CameraDesk';

/** The camera of a picture, for the page around it. */
export interface Stage {
  readonly camera: PerspectiveCamera;
  readonly desk: CameraDesk;
}

export interface StageKeeperProps {
  readonly scene: Pick<RigScene, 'up' | 'forward'>;
  /** The points that are framed at first. */
  wholeRig(): readonly Vec3[];
  onStage(stage: Stage | null): void;
}

/**
 * Lends the canvas's camera and controls to the page around it. Until somebody moves the camera the rig is framed
 * anew whenever the picture's size changes; afterwards the view is theirs.
 */
export function StageKeeper({ scene, wholeRig, onStage }: StageKeeperProps) {
  const camera = useThree((state) => state.camera) as PerspectiveCamera;
  const canvas = useThree((state) => state.gl.domElement);
  const invalidate = useThree((state) => state.invalidate);
  const { width, height } = useThree((state) => state.size);
  const desk = useRef<CameraDesk | null>(null);
  const { up, forward } = scene;

  useEffect(() => {
    const controls = new OrbitControls(camera, canvas);
    controls.enableDamping = false;
    controls.addEventListener('change', () => invalidate());
    const kept = new CameraDesk(camera, controls, { up, forward }, () => invalidate());
    controls.addEventListener('start', () => kept.touch());
    desk.current = kept;
    onStage({ camera, desk: kept });
    return () => {
      controls.dispose();
      desk.current = null;
      onStage(null);
    };
  }, [camera, canvas, invalidate, onStage, up, forward]);

  useEffect(() => {
    if (width > 0 && height > 0 && desk.current && !desk.current.isTouched) {
      desk.current.stand('free', wholeRig());
      invalidate();
    }
  }, [width, height, wholeRig, invalidate]);

  return null;
}
