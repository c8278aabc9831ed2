'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useMemo } from 'react';
import { LineMaterial } from 'three/examples/jsm/lines/LineMaterial.js';
import { LineSegments2 } from 'three/examples/jsm/lines/LineSegments2.js';
import { LineSegmentsGeometry } from 'three/examples/jsm/lines/LineSegmentsGeometry.js';

export interface FatLinesProps {
  /** Line ends in pairs, three numbers each. */
  readonly ends: readonly number[];
  readonly colour: string;
  /** In pixels of the screen. */
  readonly width: number;
  /** Lengths of dash and gap in scene units; null for an unbroken line. */
  readonly dash: readonly [number, number] | null;
  readonly opacity?: number;
  /** Lies beneath whatever else is drawn at the same place: the casing of another line. */
  readonly isCasing?: boolean;
}

/** Straight strokes of an even width on the screen, unbroken or dashed. */
export function FatLines({ ends, colour, width, dash, opacity = 1, isCasing = false }: FatLinesProps) {
  const invalidate = useThree((state) => state.invalidate);
  const [dashSize, gapSize] = dash ?? [1, 0];
  const isDashed = dash !== null;

  const lines = useMemo(() => {
    const geometry = new LineSegmentsGeometry();
    geometry.setPositions(new Float32Array(ends));
    const drawn = new LineSegments2(geometry, new LineMaterial());
    drawn.computeLineDistances();
    return drawn;
  }, [ends]);

  useEffect(() => {
    const { material } = lines;
    material.color.set(colour);
    material.linewidth = width;
    material.dashed = isDashed;
    material.dashSize = dashSize;
    material.gapSize = gapSize;
    material.transparent = opacity < 1;
    material.opacity = opacity;
    // A casing leaves no depth behind, so that its line, at the very same depth, is always drawn over it.
    material.depthWrite = !isCasing;
    lines.renderOrder = isCasing ? -1 : 0;
    material.needsUpdate = true;
    invalidate();
  }, [lines, colour, width, isDashed, dashSize, gapSize, opacity, isCasing, invalidate]);

  useEffect(
    () => () => {
      lines.geometry.dispose();
      lines.material.dispose();
    },
    [lines],
  );

  return ends.length === 0 ? null : <primitive object={lines} />;
}
