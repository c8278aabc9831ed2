import { houseSchema, recipeSchema } from '../../compiler/index';
import { readParameters } from './readParameters';
import { WrongUse } from './WrongUse';

/** `schema [recipe|house]`: prints the JSON Schema (draft 2020-12) of the recipe or house-rules language. */
export function printSchema(parameters: readonly string[]): number {
  const { positionals } = readParameters(parameters, {});
  const [which = 'recipe', ...others] = positionals;
  if (others.length > 0 || (which !== 'recipe' && which !== 'house')) {
    throw new WrongUse('There are two schemas: recipe and house.');
  }
  console.log(JSON.stringify(which === 'recipe' ? recipeSchema : houseSchema, null, 2));
  return 0;
}
