import type { Fix } from '@/compiler/findings/Finding';

/** The text after all edits of one fix; later places are edited first, so that earlier ones keep theirs. */
export function applyFix(text: string, { edits }: Fix): string {
  return [...edits]
    .sort((a, b) => b.span.start - a.span.start)
    .reduce(
      (before, { span, newText }) => before.slice(0, span.start) + newText + before.slice(span.end),
      text,
    );
}
