import type { ChainSpecification, ControlSpecification } from '../expand/types';
import { resolveFindings } from './findings';
import type { ResolveContext } from './Reporter';
import type { Things } from './things';

export type Owner = ChainSpecification | ControlSpecification;

/** The chain or control that an owner's parent belongs to. */
function parentOwner(owner: Owner, things: Things): Owner | null {
  if (owner.parent === null) return null;
  return things.joints.get(owner.parent)?.chain ?? things.controls.get(owner.parent) ?? null;
}

/**
 * Finds parents that form a ring, each ring once, and returns the owners on them, whose parents must
 * not be followed. Every owner has at most one parent, so one walk with three colours finds all rings.
 */
export function checkParentRings(
  owners: readonly Owner[],
  things: Things,
  context: ResolveContext,
): ReadonlySet<Owner> {
  const settled = new Set<Owner>();
  const onRing = new Set<Owner>();
  for (const first of owners) {
    const walk: Owner[] = [];
    const position = new Map<Owner, number>();
    let owner: Owner | null = first;
    while (owner && !settled.has(owner) && !position.has(owner)) {
      position.set(owner, walk.length);
      walk.push(owner);
      owner = parentOwner(owner, things);
    }
    const start = owner ? position.get(owner) : undefined;
    if (owner && start !== undefined) {
      const ring = walk.slice(start);
      for (const member of ring) onRing.add(member);
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
    for (const member of walk) settled.add(member);
  }
  return onRing;
}
