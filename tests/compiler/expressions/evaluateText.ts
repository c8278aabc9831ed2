import type { Finding } from '@/compiler';
import { evaluateRecipe } from '@/compiler/expressions/evaluateRecipe';
import { FindingList } from '@/compiler/findings/FindingList';
import { mergeDocuments } from '@/compiler/merge/mergeDocuments';
import { checkRecipeShape } from '@/compiler/schema/checkShape';
import { parseDocument } from '@/compiler/syntax/parseDocument';

/** A recipe with its two first lines and `body`, checked and evaluated; findings stand beside the text they cover. */
export function evaluateText(body: string, given: Readonly<Record<string, number>> = {}) {
  const text = `format: 1\nrecipe: demo\n${body}\n`;
  const findings = new FindingList();
  const document = mergeDocuments([parseDocument({ name: 'demo.yaml', text }, findings)]);
  const shape = checkRecipeShape(document, findings);
  if (!shape.value) throw new Error('the text is no map');
  const recipe = evaluateRecipe(shape.value, given, { document, findings, poisoned: shape.poisoned });
  const textOf = ({ start, end }: Finding['span']): string => text.slice(start, end);
  const found = findings.all.map((finding) => ({ ...finding, covered: textOf(finding.span) }));
  return { text, recipe, found, textOf, poisoned: [...shape.poisoned].sort() };
}

/** Parameters and landmarks that the expressions of these tests read. */
export const WORLD = `params:
  x: { default: 3 }
  half: { default: 0.5 }
landmarks:
  hips: { at: [0, 50, 4] }
  knee: { side: left, at: [8, 26, 6] }
  elbow: { side: left, at: [20, 78, -2], right: [-21, 77, -3] }`;

/** The value of one expression where a number belongs; null when it has none. */
export function numberOf(expression: string): number | null {
  const { recipe } = evaluateText(`${WORLD}\ncontrols: { c: { size: ${JSON.stringify(`=${expression}`)} } }`);
  return recipe.controls?.c?.size ?? null;
}

/** The value of one expression where a point belongs; null when it has none. */
export function pointOf(expression: string): readonly number[] | null {
  const { recipe } = evaluateText(`${WORLD}\n  made: { at: ${JSON.stringify(`=${expression}`)} }`);
  return recipe.landmarks?.made?.at ?? null;
}

/** What is found about one expression where a number belongs, code and covered text first. */
export function faultsOf(expression: string) {
  const { found } = evaluateText(`${WORLD}\ncontrols: { c: { size: ${JSON.stringify(`=${expression}`)} } }`);
  return found;
}
