import { axisDirection, leftDirection } from '../math/axisDirection';
import { positionOf } from '../math/mat4';
import { dot } from '../math/vec3';
import { restWorldMatrices } from '../pose/worldMatrices';
import type { Rig, RigNode, Side } from '../rig/Rig';

/** Okabe and Ito's colours for the sides, told apart by the line as well: left solid, right dashed. */
const COLOURS: Readonly<Record<Side, string>> = { left: '#0072b2', right: '#d55e00', centre: '#333333' };
const DASHES: Readonly<Record<Side, string>> = { left: '', right: '5 3', centre: '' };

/** Longest side of the picture, in its own units. */
const SIZE = 640;
const MARGIN = 40;

export interface PictureOptions {
  /** Numbers to write at controls, by name; controls that have none are not drawn. */
  readonly numbers?: ReadonlyMap<string, number>;
  /** Joints to draw; all when left out. */
  readonly shows?: (id: string) => boolean;
}

function round(value: number): number {
  return Math.round(value * 10) / 10 + 0;
}

/**
 * A rig at rest seen from the front as an SVG image: bones as lines, controls as rings with their numbers. Colours and
 * dashes tell the sides; the character's left is on the right of the picture. Holds no text that a person wrote.
 */
export function frontPicture(
  rig: Rig,
  { numbers = new Map(), shows = () => true }: PictureOptions = {},
): string {
  const left = leftDirection(rig.scene);
  const up = axisDirection(rig.scene.up);
  const world = restWorldMatrices(rig);
  const flat = world.map((matrix) => [dot(positionOf(matrix), left), -dot(positionOf(matrix), up)] as const);
  const isDrawn = ({ kind, name, id }: RigNode): boolean =>
    kind === 'joint' ? shows(id) : numbers.has(name);
  const drawn = flat.filter((_, index) => isDrawn(rig.nodes[index] as RigNode));
  const [lowX, highX] = [Math.min(0, ...drawn.map(([x]) => x)), Math.max(0, ...drawn.map(([x]) => x))];
  const [lowY, highY] = [Math.min(0, ...drawn.map(([, y]) => y)), Math.max(0, ...drawn.map(([, y]) => y))];
  const factor = (SIZE - 2 * MARGIN) / Math.max(highX - lowX, highY - lowY, 1e-9);
  const at = (index: number): readonly [number, number] => {
    const [x, y] = flat[index] as readonly [number, number];
    return [round(MARGIN + (x - lowX) * factor), round(MARGIN + (y - lowY) * factor)];
  };
  const width = round(2 * MARGIN + (highX - lowX) * factor);
  const height = round(2 * MARGIN + (highY - lowY) * factor);
  const indexOf = new Map(rig.nodes.map(({ name }, index) => [name, index]));

  const bones: string[] = [];
  const joints: string[] = [];
  const marks: string[] = [];
  rig.nodes.forEach((node, index) => {
    const [x, y] = at(index);
    const colour = COLOURS[node.side];
    const dash = DASHES[node.side] === '' ? '' : ` stroke-dasharray="${DASHES[node.side]}"`;
    if (node.kind === 'joint' && shows(node.id)) {
      joints.push(`<circle cx="${x}" cy="${y}" r="2.5" fill="${colour}"/>`);
      const parent = node.parent === null ? undefined : indexOf.get(node.parent);
      const above = parent === undefined ? undefined : rig.nodes[parent];
      if (parent !== undefined && above?.kind === 'joint' && shows(above.id)) {
        const [px, py] = at(parent);
        bones.push(`<path d="M${px} ${py}L${x} ${y}" stroke="${colour}"${dash}/>`);
      }
    } else if (node.kind === 'control' && numbers.has(node.name)) {
      marks.push(
        `<circle cx="${x}" cy="${y}" r="9" fill="#ffffff" fill-opacity="0.85" stroke="${colour}"${dash}/>` +
          `<text x="${x}" y="${y + 3}" text-anchor="middle" font-size="9" fill="#111111">${numbers.get(node.name)}</text>`,
      );
    }
  });
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" font-family="sans-serif">`,
    `<rect width="${width}" height="${height}" fill="#ffffff"/>`,
    `<path d="M0 ${round(MARGIN - lowY * factor)}H${width}" stroke="#bbbbbb" stroke-dasharray="1 4"/>`,
    `<g fill="none" stroke-width="2">${bones.join('')}</g>`,
    `<g>${joints.join('')}</g>`,
    `<g stroke-width="1.5">${marks.join('')}</g>`,
    '</svg>',
  ].join('');
}
