import { z } from 'zod';
import { storableText } from './common';

/** Characters a recipe may have; the compiler refuses longer ones too. */
export const MAXIMUM_RECIPE_LENGTH = 1024 * 1024;

/** Text of a recipe. It need not compile: a broken state may be kept as well. */
export const recipeTextSchema = storableText(z.string().max(MAXIMUM_RECIPE_LENGTH));
