import { z } from 'zod';
import { idSchema, instantSchema, lineSchema, personReferenceSchema, slugSchema } from './common';
import { pageQuerySchema } from './paging';
import { recipeTextSchema } from './recipeText';
import { roleSchema } from './show';

/** The newest version of a recipe in short. */
export const latestVersionSchema = z.object({
  number: z.number().int().min(1),
  author: personReferenceSchema,
  createdAt: instantSchema,
  message: z.string(),
  errors: z.number().int().min(0),
  warnings: z.number().int().min(0),
});
export type LatestVersion = z.infer<typeof latestVersionSchema>;

export const recipeListItemSchema = z.object({
  id: idSchema,
  name: z.string(),
  title: z.string(),
  latest: latestVersionSchema.nullable(),
});
export type RecipeListItem = z.infer<typeof recipeListItemSchema>;

export const recipeListSchema = z.object({
  items: z.array(recipeListItemSchema),
  nextCursor: z.string().nullable(),
  /** Recipes that match the search, on all pages together. */
  total: z.number().int().min(0),
});
export type RecipeList = z.infer<typeof recipeListSchema>;

export const recipeListQuerySchema = pageQuerySchema.extend({
  search: z.string().trim().max(100).default(''),
  sort: z.enum(['name', 'title', 'changed']).default('name'),
  direction: z.enum(['asc', 'desc']).default('asc'),
});
export type RecipeListQuery = z.infer<typeof recipeListQuerySchema>;

/** Name of a recipe: what `extends` and file names use; unique in its show. */
export const recipeNameSchema = z
  .string()
  .trim()
  .min(1)
  .max(60)
  .regex(/^[a-z][a-z0-9_]*$/, 'Use lower-case letters, digits and underscores, a letter first.');

export const recipeTitleSchema = lineSchema({ min: 1, max: 120 });

export const createRecipeRequestSchema = z.strictObject({
  name: recipeNameSchema,
  title: recipeTitleSchema,
  text: recipeTextSchema,
  message: lineSchema({ min: 1, max: 500 }),
});
export type CreateRecipeRequest = z.infer<typeof createRecipeRequestSchema>;

export const recipeSchema = z
  .object({
    id: idSchema,
    show: z.object({ slug: slugSchema, title: z.string() }),
    name: z.string(),
    title: z.string(),
    /** The strongest role the asking person holds in the recipe's show. */
    role: roleSchema,
    latest: latestVersionSchema.nullable(),
  })
  .meta({ id: 'Recipe' });
export type Recipe = z.infer<typeof recipeSchema>;

export const recipePathSchema = z.strictObject({ recipeId: idSchema });
