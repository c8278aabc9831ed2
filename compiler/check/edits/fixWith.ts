import type { Fix } from '../../findings/Finding';

/** A fix of these edits, to be spread into a report; nothing when one of them cannot be made. */
export function fixWith(
  title: string,
  kind: 'safe' | 'asks',
  edits: readonly (Fix['edits'][number] | null)[],
): { readonly fix?: Fix } {
  const made = edits.filter((edit) => edit !== null);
  return made.length === edits.length && made.length > 0
    ? { fix: { title, safe: kind === 'safe', edits: made } }
    : {};
}
