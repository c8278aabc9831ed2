'use client';

import { useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, Color } from 'three';
import type { Side } from '@/compiler';
import type { Colours } from './colours';
import type { JointMark } from './drawing';
import { ringTexture } from './ringTexture';

/** Width of a joint's circle on the screen, in pixels. */
const WIDTH = 11;

function pointGeometry(joints: readonly JointMark[], colourOf: (side: Side) => string): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute(
    'position',
    new BufferAttribute(new Float32Array(joints.flatMap(({ at }) => [...at])), 3),
  );
  const tints = joints.flatMap(({ side }) => new Color(colourOf(side)).toArray());
  geometry.setAttribute('color', new BufferAttribute(new Float32Array(tints), 3));
  return geometry;
}

/** Joints as small open circles, broken on the right side; filled with paper so that strokes end at their rim. */
export function Joints({
  joints,
  colours,
}: {
  readonly joints: readonly JointMark[];
  readonly colours: Colours;
}) {
  const textures = useMemo(
    () => ({ ring: ringTexture('ring'), broken: ringTexture('broken'), disc: ringTexture('disc') }),
    [],
  );
  const parts = useMemo(() => {
    const right = joints.filter(({ side }) => side === 'right');
    const others = joints.filter(({ side }) => side !== 'right');
    return {
      discs: pointGeometry(joints, () => colours.sheet),
      rings: pointGeometry(others, (side) => colours[side]),
      broken: pointGeometry(right, (side) => colours[side]),
    };
  }, [joints, colours]);

  useEffect(
    () => () => {
      for (const geometry of Object.values(parts)) geometry.dispose();
    },
    [parts],
  );

  const layer = (geometry: BufferGeometry, texture: keyof typeof textures, order: number, width: number) => (
    <points geometry={geometry} renderOrder={order}>
      <pointsMaterial
        map={textures[texture]}
        vertexColors
        size={width}
        sizeAttenuation={false}
        alphaTest={0.35}
        transparent
        depthTest={false}
        toneMapped={false}
      />
    </points>
  );

  return (
    <>
      {layer(parts.discs, 'disc', 2, WIDTH)}
      {layer(parts.rings, 'ring', 3, WIDTH)}
      {layer(parts.broken, 'broken', 3, WIDTH)}
    </>
  );
}
