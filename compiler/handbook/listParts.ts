import { frontPicture } from '../chart/frontPicture';
import { compile } from '../compile';
import type { Rig, RigNode } from '../rig/Rig';
import { PART_EXAMPLES } from './generated/partExamples';

/** A part with what the example of it makes. */
export interface PartEntry {
  readonly kind: string;
  /** Ids in the example, by what they are. */
  readonly makes: Readonly<Record<'joints' | 'controls' | 'solvers' | 'guide lines', readonly string[]>>;
  /** SVG of the joints that the example makes; empty for a part without joints. */
  readonly picture: string;
}

interface ExamplePart {
  readonly id: string;
  readonly kind: string;
}

/** The parts of the example, by what the recipe writes under `parts`. */
function exampleParts(text: string): readonly ExamplePart[] {
  const section = text.split('\nparts:\n')[1]?.split(/\n(?=[a-z])/)[0] ?? '';
  return [...section.matchAll(/^ {2}([a-z_]+):\s*(?:\{\s*|\n\s+)kind: ([a-z_]+)/gm)].map((match) => ({
    id: match[1] ?? '',
    kind: match[2] ?? '',
  }));
}

function isPart(id: string, part: string): boolean {
  return id === part || id.startsWith(`${part}.`);
}

/** What each kind of part makes, shown by an example that has all of them. */
export function listParts(): readonly PartEntry[] {
  const text = Object.values(PART_EXAMPLES)[0] ?? '';
  const { rig } = compile({ recipe: { name: 'every_part.example.yaml', text }, trials: false });
  if (!rig) return [];
  return exampleParts(text).map(({ id: part, kind }) => {
    const ids = (kindOfNode: RigNode['kind']): readonly string[] =>
      rig.nodes.filter((node) => node.kind === kindOfNode && isPart(node.id, part)).map(({ id }) => id);
    const joints = ids('joint');
    const shown = new Set(joints);
    return {
      kind,
      makes: {
        joints,
        controls: ids('control'),
        solvers: rig.solvers.filter(({ id }) => isPart(id, part)).map(({ id }) => id),
        'guide lines': ids('line'),
      },
      picture: joints.length > 0 ? pictureOf(rig, shown) : '',
    };
  });
}

function pictureOf(rig: Rig, shown: ReadonlySet<string>): string {
  return frontPicture(rig, { shows: (id) => shown.has(id) });
}
