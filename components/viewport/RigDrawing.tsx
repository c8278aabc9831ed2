'use client';

import { useEffect, useMemo } from 'react';
import { DoubleSide } from 'three';
import type { Colours } from './colours';
import type { Drawing } from './drawing';
import { FatLines } from './FatLines';
import { Joints } from './Joints';
import { strokeGeometry } from './strokes';

const NO_ENDS: readonly number[] = [];
const SIDES = ['left', 'right', 'centre'] as const;
/** Width of the ink around a control's stroke, in pixels. */
const CASING = 3.2;

export interface RigDrawingProps {
  readonly drawing: Drawing;
  readonly colours: Colours;
  /** Indices of the chosen nodes. */
  readonly chosen: readonly number[];
}

/** A rig as drawn strokes: bones, joints, controls, leaders, and the chosen ones in the signal colour. */
export function RigDrawing({ drawing, colours, chosen }: RigDrawingProps) {
  const strokes = useMemo(() => strokeGeometry(drawing, colours, colours.inkSoft), [drawing, colours]);
  useEffect(() => () => strokes.dispose(), [strokes]);

  const leaders = useMemo(() => drawing.leaders.flatMap(({ from, to }) => [...from, ...to]), [drawing]);
  const chosenOutlines = useMemo(
    () => chosen.flatMap((node) => [...(drawing.outlines.get(node) ?? NO_ENDS)]),
    [drawing, chosen],
  );
  const chosenLeaders = useMemo(
    () =>
      drawing.leaders.filter(({ node }) => chosen.includes(node)).flatMap(({ from, to }) => [...from, ...to]),
    [drawing, chosen],
  );
  const chosenJoints = useMemo(
    () =>
      drawing.joints
        .filter(({ node }) => chosen.includes(node))
        .map((joint) => ({ ...joint, side: 'centre' as const })),
    [drawing, chosen],
  );
  const signalColours = useMemo(() => ({ ...colours, centre: colours.signal }), [colours]);
  const { size } = drawing;

  return (
    <>
      <mesh geometry={strokes}>
        <meshBasicMaterial vertexColors side={DoubleSide} toneMapped={false} />
      </mesh>
      {/* Sky blue and orange alone are too light on paper; an ink casing gives every stroke its contrast. */}
      {SIDES.map((side) => (
        <FatLines
          key={side}
          ends={drawing.controls[side]}
          colour={colours.inkSoft}
          width={CASING}
          dash={null}
          isCasing
        />
      ))}
      <FatLines ends={drawing.controls.left} colour={colours.left} width={1.8} dash={null} />
      <FatLines
        ends={drawing.controls.right}
        colour={colours.right}
        width={1.6}
        dash={[size * 0.012, size * 0.007]}
      />
      <FatLines ends={drawing.controls.centre} colour={colours.centre} width={1.8} dash={null} />
      <FatLines ends={leaders} colour={colours.inkSoft} width={1.4} dash={[size * 0.003, size * 0.009]} />
      <FatLines ends={chosenOutlines} colour={colours.signal} width={3} dash={null} />
      <FatLines
        ends={chosenLeaders}
        colour={colours.signal}
        width={2.4}
        dash={[size * 0.003, size * 0.006]}
      />
      <Joints joints={drawing.joints} colours={colours} />
      <Joints joints={chosenJoints} colours={signalColours} />
    </>
  );
}
