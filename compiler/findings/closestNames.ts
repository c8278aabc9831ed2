import { distance } from 'fastest-levenshtein';

const MOST_SUGGESTIONS = 3;

/**
 * The names most like `name`, at most three, all equally close. A name counts as close when at most a third of its
 * letters would have to change, but always two of four or more (swapped letters count as two) and one of fewer;
 * beyond that a suggestion misleads more than it helps.
 */
export function closestNames(name: string, candidates: Iterable<string>): readonly string[] {
  const allowed = Math.max(name.length < 4 ? 1 : 2, Math.floor(name.length / 3));
  const close: { readonly candidate: string; readonly edits: number }[] = [];
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - name.length) > allowed) continue;
    const edits = distance(name, candidate);
    if (edits <= allowed && edits > 0) close.push({ candidate, edits });
  }
  close.sort((a, b) => a.edits - b.edits || (a.candidate < b.candidate ? -1 : 1));
  const best = close[0]?.edits ?? 0;
  return close
    .filter((item) => item.edits === best)
    .slice(0, MOST_SUGGESTIONS)
    .map((item) => item.candidate);
}
