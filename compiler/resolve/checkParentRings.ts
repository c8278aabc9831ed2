import type { ChainSpecification, ControlSpecification } from '../expand/types';
import { resolveFindings } from './findings';
import type { ResolveContext } from './Reporter';
import type { Things } from './things';

type Owner = ChainSpecification | ControlSpecification;

/** The chain or control that an owner's parent belongs to. */
function parentOwner(owner: Owner, things: Things): Owner | null {
  if (owner.parent === null) return null;
  return things.joints.get(owner.parent)?.chain ?? things.controls.get(owner.parent) ?? null;
}

/**
 * Finds parents that form a ring, each ring once, and returns the ids of the owners on them, whose parents must
 * not be followed. Every owner has at most one parent, so one walk with three colours finds all rings.
 */
export function checkParentRings(
  owners: readonly Owner[],
  things: Things,
  context: ResolveContext,
): ReadonlySet<string> {
  const settled = new Set<string>();
  const onRing = new Set<string>();
  for (const first of owners) {
    const walk: Owner[] = [];
    const position = new Map<string, number>();
    let owner: Owner | null = first;
    while (owner && !settled.has(owner.id) && !position.has(owner.id)) {
      position.set(owner.id, walk.length);
      walk.push(owner);
      owner = parentOwner(owner, things);
    }
    const start = owner ? position.get(owner.id) : undefined;
    if (owner && start !== undefined) {
      const ring = walk.slice(start);
      for (const { id } of ring) onRing.add(id);
      context.findings.report(
        resolveFindings,
        'parent-ring',
        context.document.spanAt([...owner.path, 'parent']),
        { ring: [...ring.map(({ id }) => `"${id}"`), `"${owner.id}"`].join(' → ') },
        {
          related: ring.slice(1).map(({ id, path }) => ({
            span: context.document.spanAt([...path, 'parent']),
            label: `parent of "${id}"`,
          })),
        },
      );
    }
    for (const { id } of walk) settled.add(id);
  }
  return onRing;
}
