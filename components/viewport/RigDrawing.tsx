'use client';

import { useCallback, useEffect, useMemo } from 'react';
import { BackSide, Color, DoubleSide } from 'three';
import type { Side } from '@/compiler';
import type { Colours } from './colours';
import type { Drawing, JointMark } from './drawing';
import { FatLines } from './FatLines';
import { Joints } from './Joints';
import { sideColour } from './sideColour';
import { casingGeometry, strokeGeometry } from './strokes';

const NO_ENDS: readonly number[] = [];
const SIDES = ['left', 'right', 'centre'] as const;
/** Width of the ink around a control's stroke, in pixels. */
const CASING = 2.8;

export interface RigDrawingProps {
  readonly drawing: Drawing;
  readonly colours: Colours;
  /** Indices of the chosen nodes. */
  readonly chosen: readonly number[];
}

/** A rig as drawn strokes: bones, joints, controls, leaders, and the chosen ones in the signal colour. */
export function RigDrawing({ drawing, colours, chosen }: RigDrawingProps) {
  const { inkSoft, sheet, signal } = colours;
  const strokes = useMemo(() => {
    const boneColour = (side: Side, isShown: boolean) => sideColour(colours, side, isShown);
    return {
      lines: strokeGeometry(drawing, boneColour, colours.inkSoft),
      casing: casingGeometry(drawing, colours.inkSoft),
    };
  }, [drawing, colours]);
  useEffect(
    () => () => {
      strokes.lines.dispose();
      strokes.casing.dispose();
    },
    [strokes],
  );

  const leaders = useMemo(() => drawing.leaders.flatMap(({ from, to }) => [...from, ...to]), [drawing]);
  const chosenOnes = useMemo(() => {
    const nodes = new Set(chosen);
    return {
      outlines: chosen.flatMap((node) => [...(drawing.outlines.get(node) ?? NO_ENDS)]),
      leaders: drawing.leaders
        .filter(({ node }) => nodes.has(node))
        .flatMap(({ from, to }) => [...from, ...to]),
      joints: drawing.joints.filter(({ node }) => nodes.has(node)),
    };
  }, [drawing, chosen]);

  const colourOf = useCallback(
    ({ side, isShown }: JointMark) => sideColour(colours, side, isShown),
    [colours],
  );
  const signalColour = useCallback(() => new Color(signal), [signal]);
  const { size, controls } = drawing;

  return (
    <>
      <mesh geometry={strokes.lines}>
        <meshBasicMaterial vertexColors side={DoubleSide} toneMapped={false} />
      </mesh>
      <mesh geometry={strokes.casing}>
        <meshBasicMaterial vertexColors side={BackSide} toneMapped={false} />
      </mesh>
      {/* Sky blue and orange alone are too light on paper; an ink casing gives every stroke its contrast. */}
      {SIDES.map((side) => (
        <FatLines key={side} ends={controls[side]} colour={inkSoft} width={CASING} dash={null} isCasing />
      ))}
      <FatLines ends={controls.left} colour={colours.left} width={1.6} dash={null} />
      <FatLines
        ends={controls.right}
        colour={colours.right}
        width={1.6}
        dash={[size * 0.012, size * 0.007]}
      />
      <FatLines ends={controls.centre} colour={colours.centre} width={1.6} dash={null} />
      <FatLines ends={leaders} colour={inkSoft} width={1.4} dash={[size * 0.003, size * 0.009]} />
      <FatLines ends={chosenOnes.outlines} colour={signal} width={3} dash={null} />
      <FatLines ends={chosenOnes.leaders} colour={signal} width={2.4} dash={[size * 0.003, size * 0.006]} />
      <Joints joints={drawing.joints} width={12} sheet={sheet} ink={inkSoft} colourOf={colourOf} layer={2} />
      <Joints
        joints={chosenOnes.joints}
        width={18}
        sheet={sheet}
        ink={inkSoft}
        colourOf={signalColour}
        layer={10}
      />
    </>
  );
}
