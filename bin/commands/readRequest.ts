import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { type CompileRequest, findBaseReference, type SourceText } from '../../compiler/index';
import { readText } from './readText';

/**
 * The recipe of a file with the versions it extends, which lie beside it as `name@number.recipe.yaml`. A base that
 * is not there is left out: the compiler says so at the place where it is named.
 */
export function readRequest(
  path: string,
): Pick<CompileRequest, 'recipe'> & { readonly bases: Record<string, SourceText> } {
  const recipe = readText(path);
  const bases: Record<string, SourceText> = {};
  let reference = findBaseReference(recipe);
  while (reference && !Object.hasOwn(bases, reference.text)) {
    const beside = join(dirname(path), `${reference.text}.recipe.yaml`);
    if (!existsSync(beside)) break;
    const base = readText(beside);
    bases[reference.text] = base;
    reference = findBaseReference(base);
  }
  return { recipe, bases };
}
