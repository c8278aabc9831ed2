'use client';

import { useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, Color } from 'three';
import type { JointMark } from './drawing';
import { type RingKind, ringTexture } from './ringTexture';

export interface JointsProps {
  readonly joints: readonly JointMark[];
  /** Width of a circle on the screen, in pixels. */
  readonly width: number;
  readonly sheet: string;
  /** Drawn around every circle, because sky blue and orange alone are too light on paper. */
  readonly ink: string;
  colourOf(joint: JointMark): Color;
  /** Joints with a greater layer are drawn over those with a lesser one. */
  readonly layer: number;
}

function pointGeometry(joints: readonly JointMark[], colourOf: (joint: JointMark) => Color): BufferGeometry {
  const geometry = new BufferGeometry();
  const places = joints.flatMap(({ at }) => [...at]);
  const tints = joints.flatMap((joint) => colourOf(joint).toArray());
  geometry.setAttribute('position', new BufferAttribute(new Float32Array(places), 3));
  geometry.setAttribute('color', new BufferAttribute(new Float32Array(tints), 3));
  return geometry;
}

const KINDS: readonly RingKind[] = ['disc', 'ringCasing', 'brokenCasing', 'ring', 'broken'];

/** Joints as small open circles, broken on the right side; filled with paper so that strokes end at their rim. */
export function Joints({ joints, width, sheet, ink, colourOf, layer }: JointsProps) {
  const textures = useMemo(() => KINDS.map((kind) => ({ kind, texture: ringTexture(kind) })), []);
  useEffect(
    () => () => {
      for (const { texture } of textures) texture.dispose();
    },
    [textures],
  );

  const geometries = useMemo<Readonly<Record<RingKind, BufferGeometry>>>(() => {
    const right = joints.filter(({ side }) => side === 'right');
    const others = joints.filter(({ side }) => side !== 'right');
    const inked = () => new Color(ink);
    return {
      disc: pointGeometry(joints, () => new Color(sheet)),
      ringCasing: pointGeometry(others, inked),
      brokenCasing: pointGeometry(right, inked),
      ring: pointGeometry(others, colourOf),
      broken: pointGeometry(right, colourOf),
    };
  }, [joints, sheet, ink, colourOf]);
  useEffect(
    () => () => {
      for (const geometry of Object.values(geometries)) geometry.dispose();
    },
    [geometries],
  );

  return textures.map(({ kind, texture }, order) => (
    <points key={kind} geometry={geometries[kind]} renderOrder={layer + order}>
      <pointsMaterial
        map={texture}
        vertexColors
        size={width}
        sizeAttenuation={false}
        alphaTest={0.35}
        transparent
        depthTest={false}
        toneMapped={false}
      />
    </points>
  ));
}
