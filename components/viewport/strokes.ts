import { BufferAttribute, BufferGeometry, Color, Vector3 } from 'three';
import type { Side } from '@/compiler';
import type { Drawing } from './drawing';

const FACETS = 6;
/** A right-side stroke is broken into this many dashes, so that sides differ in more than colour. */
const DASHES = 4;
const DASH_SHARE = 0.62;
/** Width of the ink around a stroke, as a share of the rig's size. */
const CASING = 0.0016;

interface Frustum {
  readonly from: Vector3;
  readonly to: Vector3;
  readonly fromRadius: number;
  readonly toRadius: number;
  readonly colour: Color;
}

/** The colour of a stroke, by side and by whether animators see it. */
export type StrokeColour = (side: Side, isShown: boolean) => Color;

interface StrokeStyle {
  readonly boneColour: StrokeColour;
  readonly leaderColour: Color;
  /** Added to every radius and end, in scene units. */
  readonly extra: number;
}

function sideways(direction: Vector3): readonly [Vector3, Vector3] {
  const helper = Math.abs(direction.y) < 0.9 ? new Vector3(0, 1, 0) : new Vector3(1, 0, 0);
  const first = new Vector3().crossVectors(direction, helper).normalize();
  return [first, new Vector3().crossVectors(direction, first)];
}

function addFrustum(
  { from, to, fromRadius, toRadius, colour }: Frustum,
  points: number[],
  colours: number[],
): void {
  const direction = to.clone().sub(from).normalize();
  const [first, second] = sideways(direction);
  const rim = (centre: Vector3, radius: number, facet: number): Vector3 => {
    const angle = (2 * Math.PI * facet) / FACETS;
    return centre
      .clone()
      .addScaledVector(first, Math.cos(angle) * radius)
      .addScaledVector(second, Math.sin(angle) * radius);
  };
  for (let facet = 0; facet < FACETS; facet += 1) {
    const corners = [
      rim(from, fromRadius, facet),
      rim(from, fromRadius, facet + 1),
      rim(to, toRadius, facet),
      rim(to, toRadius, facet + 1),
    ] as const;
    for (const corner of [0, 1, 2, 1, 3, 2] as const) {
      points.push(...corners[corner].toArray());
      colours.push(colour.r, colour.g, colour.b);
    }
  }
}

function bonesOf(drawing: Drawing, { boneColour, extra }: StrokeStyle): readonly Frustum[] {
  return drawing.bones.flatMap(({ side, isShown, from, to }) => {
    const start = new Vector3(...from);
    const end = new Vector3(...to);
    const length = start.distanceTo(end);
    if (length === 0) return [];
    const thick = Math.min(length * 0.1, drawing.size * 0.011);
    const pieces = side === 'right' ? DASHES : 1;
    const along = extra / length;
    return Array.from({ length: pieces }, (_, piece) => {
      const a = piece / pieces;
      const b = pieces === 1 ? 1 : a + DASH_SHARE / pieces;
      return {
        from: start.clone().lerp(end, a - along),
        to: start.clone().lerp(end, b + along),
        fromRadius: thick * (1 - a * 0.85) + extra,
        toRadius: thick * (1 - b * 0.85) + extra,
        colour: boneColour(side, isShown),
      };
    });
  });
}

function arrowheadsOf(drawing: Drawing, { leaderColour, extra }: StrokeStyle): readonly Frustum[] {
  const head = drawing.size * 0.014;
  return drawing.leaders.flatMap(({ from, to }) => {
    const tip = new Vector3(...to);
    const back = new Vector3(...from).sub(tip);
    if (back.length() === 0) return [];
    back.normalize();
    return [
      {
        from: tip.clone().addScaledVector(back, head * 1.6),
        to: tip.clone().addScaledVector(back, head * 0.3),
        fromRadius: head * 0.32 + extra,
        toRadius: extra,
        colour: leaderColour,
      },
    ];
  });
}

function toGeometry(drawing: Drawing, style: StrokeStyle): BufferGeometry {
  const points: number[] = [];
  const tints: number[] = [];
  for (const frustum of bonesOf(drawing, style)) addFrustum(frustum, points, tints);
  for (const frustum of arrowheadsOf(drawing, style)) addFrustum(frustum, points, tints);
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(new Float32Array(points), 3));
  geometry.setAttribute('color', new BufferAttribute(new Float32Array(tints), 3));
  return geometry;
}

/** Tapered strokes for bones and arrowheads for leaders, as one mesh with a colour for each corner. */
export function strokeGeometry(
  drawing: Drawing,
  boneColour: StrokeColour,
  leaderColour: string,
): BufferGeometry {
  return toGeometry(drawing, { boneColour, leaderColour: new Color(leaderColour), extra: 0 });
}

/** The same strokes a little wider, to be drawn from their inner side: what shows is an even edge of ink. */
export function casingGeometry(drawing: Drawing, ink: string): BufferGeometry {
  const colour = new Color(ink);
  return toGeometry(drawing, {
    boneColour: () => colour,
    leaderColour: colour,
    extra: drawing.size * CASING,
  });
}
