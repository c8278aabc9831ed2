import type { Fix } from '../findings/Finding';
import type { MergedDocument } from '../merge/types';
import type { Side } from '../rig/Rig';
import type { Path } from '../syntax/types';
import { rewrite } from './rewrite';
import { textAt } from './textAt';

/** Whether one side is left and the other right. */
export function areOpposite(first: Side | undefined, second: Side | undefined): boolean {
  return (first === 'left' && second === 'right') || (first === 'right' && second === 'left');
}

/** The same id on the other side: `arm.left.hand` for `arm.right.hand`. */
function otherSide(id: string): string {
  const swapped = { left: 'right', right: 'left' } as const;
  return id
    .split('.')
    .map((segment) => (segment === 'left' || segment === 'right' ? swapped[segment] : segment))
    .join('.');
}

/** A fix that lets a reference name the same thing on the other side, where there is one. */
export function referToOtherSide(
  document: MergedDocument,
  path: Path,
  part: 'key' | 'value',
  exists: (id: string) => boolean,
): { readonly fix?: Fix } {
  // The text itself is turned round: for the right copy of an entry the id differs from what was written.
  const written = textAt(document, path, part);
  if (written === null) return {};
  const other = otherSide(written);
  if (other === written || !exists(other)) return {};
  return rewrite(document, `Write "${other}"`, [{ path, part, newText: other }]);
}
