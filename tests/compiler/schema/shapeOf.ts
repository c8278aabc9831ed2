import type { Finding } from '@/compiler';
import { FindingList } from '@/compiler/findings/FindingList';
import { mergeDocuments } from '@/compiler/merge/mergeDocuments';
import { checkHouseShape, checkRecipeShape } from '@/compiler/schema/checkShape';
import { parseDocument } from '@/compiler/syntax/parseDocument';

/** A finding beside the very text that its span covers. */
export interface Covered {
  readonly finding: Finding;
  readonly text: string;
}

export const HEAD = 'format: 1\nrecipe: hare\n';

/** Checks the shape of one text and gives what was found, what was refused, and what is left. */
export function shapeOf(text: string, kind: 'recipe' | 'house' = 'recipe') {
  const findings = new FindingList();
  const document = mergeDocuments([parseDocument({ name: 'a.yaml', text }, findings)]);
  const shape = (kind === 'recipe' ? checkRecipeShape : checkHouseShape)(document, findings);
  const found: readonly Covered[] = findings.all.map((finding) => ({
    finding,
    text: text.slice(finding.span.start, finding.span.end),
  }));
  return { found, poisoned: [...shape.poisoned].sort(), isSound: shape.isSound, value: shape.value };
}
