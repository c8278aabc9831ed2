import { distance } from 'fastest-levenshtein';

const MOST_SUGGESTIONS = 3;

/**
 * The names most like `name`, closest first, at most three. A name counts as close when at most a third of its
 * letters (but at least one) would have to change; beyond that a suggestion misleads more than it helps.
 */
export function closestNames(name: string, candidates: Iterable<string>): readonly string[] {
  const allowed = Math.max(1, Math.floor(name.length / 3));
  const close: { readonly candidate: string; readonly edits: number }[] = [];
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - name.length) > allowed) continue;
    const edits = distance(name, candidate);
    if (edits <= allowed && edits > 0) close.push({ candidate, edits });
  }
  close.sort((a, b) => a.edits - b.edits || (a.candidate < b.candidate ? -1 : 1));
  const best = close[0]?.edits ?? 0;
  return close
    .filter((item) => item.edits <= best + 1)
    .slice(0, MOST_SUGGESTIONS)
    .map((item) => item.candidate);
}
