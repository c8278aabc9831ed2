import type { ChainSpecification, ControlSpecification, ExpandedRecipe } from '../expand/types';
import type { RelatedPlace } from '../findings/Finding';
import type { Path } from '../syntax/types';
import { resolveFindings } from './findings';
import type { ResolveContext } from './Reporter';

/** A joint with its chain and the joint before it in the chain. */
export interface JointPlace {
  readonly chain: ChainSpecification;
  readonly index: number;
  readonly before: string | null;
}

/** Everything of a recipe that can be referred to, by id. */
export interface Things {
  readonly joints: ReadonlyMap<string, JointPlace>;
  readonly controls: ReadonlyMap<string, ControlSpecification>;
  nodeIds(): Iterable<string>;
}

/** Lists joints and controls by id; an id used twice is a finding that shows both places. */
export function collectThings(recipe: ExpandedRecipe, context: ResolveContext): Things {
  const joints = new Map<string, JointPlace>();
  const controls = new Map<string, ControlSpecification>();
  const owners = new Map<string, { readonly what: string; readonly path: Path }>();

  const claim = (id: string, what: string, path: Path): boolean => {
    const owner = owners.get(id);
    if (!owner) {
      owners.set(id, { what, path });
      return true;
    }
    const related: RelatedPlace[] = [
      { span: context.document.spanAt(owner.path, 'key'), label: `the ${owner.what} "${id}"` },
    ];
    const span = context.document.spanAt(path, 'key');
    context.findings.report(
      resolveFindings,
      'id-taken',
      span,
      { id, first: owner.what, second: what },
      { related },
    );
    return false;
  };

  for (const chain of recipe.chains) {
    chain.jointIds.forEach((id, index) => {
      if (!claim(id, 'joint', chain.path)) return;
      joints.set(id, { chain, index, before: index === 0 ? null : (chain.jointIds[index - 1] ?? null) });
    });
  }
  for (const control of recipe.controls) {
    if (claim(control.id, 'control', control.path)) controls.set(control.id, control);
  }
  for (const line of recipe.guideLines) claim(line.id, 'guide line', line.path);
  for (const mesh of recipe.geometry) claim(mesh.id, 'mesh', mesh.path);

  return {
    joints,
    controls,
    *nodeIds() {
      yield* joints.keys();
      yield* controls.keys();
    },
  };
}
