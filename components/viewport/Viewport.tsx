'use client';

import { Canvas } from '@react-three/fiber';
import {
  type KeyboardEvent,
  type PointerEvent,
  useCallback,
  useEffect,
  useMemo,
  useRef,
  useState,
} from 'react';
import { Vector3 } from 'three';
import type { BuiltRig } from '@/components/worker/messages';
import type { Standpoint } from './CameraDesk';
import { type Colours, onSchemeChange, readColours } from './colours';
import { type Audience, drawRig } from './drawing';
import { pointsAround, pointsOf } from './framing';
import { Ground } from './Ground';
import { Legend } from './Legend';
import { nearestNode } from './nearestNode';
import { pressKey } from './pressKey';
import { RigDrawing } from './RigDrawing';
import { type Stage, StageKeeper } from './StageKeeper';
import { ViewBar } from './ViewBar';

export interface ViewportProps {
  readonly built: BuiltRig;
  /** True while the text has errors and the picture belongs to an earlier one. */
  readonly isOlder: boolean;
  /** Ids of the chosen nodes. */
  readonly chosen: readonly string[];
  onChoose(id: string | null): void;
}

/** The rig that the script built, drawn as on paper. Everything a pointer does here, keys do too. */
export function Viewport({ built, isOlder, chosen, onChoose }: ViewportProps) {
  const [audience, setAudience] = useState<Audience>('rigger');
  const [colours, setColours] = useState<Colours>(readColours);
  const [hovered, setHovered] = useState<{
    readonly id: string;
    readonly x: number;
    readonly y: number;
  } | null>(null);
  const [stage, setStage] = useState<Stage | null>(null);
  const frame = useRef<HTMLDivElement>(null);
  const pressedAt = useRef<readonly [number, number] | null>(null);

  useEffect(() => onSchemeChange(() => setColours(readColours())), []);

  const { rig, world } = built;
  const drawing = useMemo(() => drawRig({ rig, world }, audience), [rig, world, audience]);
  const chosenNodes = useMemo(() => {
    const ids = new Set(chosen);
    return rig.nodes.flatMap(({ id }, index) => (ids.has(id) ? [index] : []));
  }, [rig, chosen]);
  const latest = useRef(drawing);
  latest.current = drawing;

  const wholeRig = useCallback(() => pointsOf(latest.current), []);

  const nodeUnder = (event: PointerEvent): number | null => {
    const box = frame.current?.getBoundingClientRect();
    if (!box || !stage) return null;
    return nearestNode(
      drawing,
      stage.camera,
      box.width,
      box.height,
      event.clientX - box.left,
      event.clientY - box.top,
    );
  };

  const move = (event: PointerEvent): void => {
    if (event.buttons !== 0) return;
    const node = nodeUnder(event);
    const box = frame.current?.getBoundingClientRect();
    const id = node === null ? undefined : rig.nodes[node]?.id;
    if (id === undefined || node === null || !box || !stage) {
      setHovered(null);
      return;
    }
    const at = new Vector3(world[node * 16 + 12], world[node * 16 + 13], world[node * 16 + 14]).project(
      stage.camera,
    );
    setHovered({ id, x: ((at.x + 1) / 2) * box.width, y: ((1 - at.y) / 2) * box.height });
  };

  const release = (event: PointerEvent): void => {
    const [x, y] = pressedAt.current ?? [0, 0];
    const wasDrag = Math.hypot(event.clientX - x, event.clientY - y) > 4;
    if (event.button !== 0 || wasDrag) return;
    const node = nodeUnder(event);
    onChoose(node === null ? null : (rig.nodes[node]?.id ?? null));
  };

  const stand = (standpoint: Standpoint): void => stage?.desk.touch().stand(standpoint, pointsOf(drawing));
  const frameAll = (): void => stage?.desk.touch().frame(pointsOf(drawing));
  const frameChosen = (): void => stage?.desk.touch().frame(pointsAround(drawing, world, chosenNodes));
  const letGo = (): void => onChoose(null);

  const press = (event: KeyboardEvent): void => {
    if (!stage || event.ctrlKey || event.metaKey || event.altKey) return;
    const targets = { stand, frameAll, frameChosen, letGo };
    if (pressKey(event.key, event.shiftKey, stage.desk, targets)) event.preventDefault();
  };

  const hoveredNode = hovered ? rig.nodes.find(({ id }) => id === hovered.id) : undefined;

  return (
    <section aria-label="Picture of the rig" className="flex h-full min-h-0 flex-col">
      <ViewBar
        audience={audience}
        hasChosen={chosenNodes.length > 0}
        stand={stand}
        frameAll={frameAll}
        frameChosen={frameChosen}
        onAudience={setAudience}
      />
      <div ref={frame} className="relative min-h-0 flex-1">
        <Canvas
          role="application"
          aria-label={`Rig ${rig.scene.character}: arrows turn, shift and arrows move, plus and minus zoom, 1 to 4 change the standpoint, Home frames all, End frames what is chosen. The table shows the same in words.`}
          tabIndex={0}
          className="cursor-crosshair"
          data-testid="viewport"
          onKeyDown={press}
          onPointerMove={move}
          onPointerLeave={() => setHovered(null)}
          onPointerDown={(event) => {
            pressedAt.current = [event.clientX, event.clientY];
          }}
          onPointerUp={release}
          frameloop="demand"
          flat
          dpr={[1, 2]}
          camera={{ fov: 32 }}
          gl={{ antialias: true, alpha: false }}
        >
          <color attach="background" args={[colours.sheet]} />
          <StageKeeper scene={rig.scene} wholeRig={wholeRig} onStage={setStage} />
          <Ground scene={rig.scene} extent={drawing} rule={colours.rule} ink={colours.inkSoft} />
          <RigDrawing drawing={drawing} colours={colours} chosen={chosenNodes} />
        </Canvas>
        {hovered && hoveredNode && (
          <p
            data-testid="hovered"
            className="pointer-events-none absolute border border-ink bg-paper px-2 py-0.5 text-xs"
            style={{ left: hovered.x + 12, top: hovered.y - 12 }}
          >
            <span className="figures">{hoveredNode.id}</span>
            <span className="text-ink-soft"> in {hoveredNode.container}</span>
          </p>
        )}
        {isOlder && (
          <p role="status" className="absolute inset-x-0 top-0 bg-paper/90 px-3 py-1 text-signal text-sm">
            From the last text that compiled.
          </p>
        )}
        <Legend />
      </div>
    </section>
  );
}
