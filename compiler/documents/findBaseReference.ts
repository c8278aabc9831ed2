import { FindingList } from '../findings/FindingList';
import type { SourceText } from '../source/SourceText';
import { parseDocument } from '../syntax/parseDocument';
import { topLevelText } from './readRecipe';

/** A version of another recipe, as `extends` names it. */
export interface BaseReference {
  /** As written: `name@number`. */
  readonly text: string;
  readonly name: string;
  readonly number: number;
}

/**
 * The version a recipe extends, so that a caller can fetch its text before compiling; undefined when it extends
 * none, or in words that cannot name a version (the compile then says so).
 */
export function findBaseReference(recipe: SourceText): BaseReference | undefined {
  const text = topLevelText(parseDocument(recipe, new FindingList()), 'extends');
  const parts = text?.match(/^([a-z][a-z0-9_]*)@([1-9][0-9]{0,8})$/);
  const [, name, number] = parts ?? [];
  if (text === undefined || name === undefined || number === undefined) return undefined;
  return { text, name, number: Number(number) };
}
