import { z } from 'zod';
import { instantSchema } from './common';
import { recipeTextSchema } from './recipeText';

/** One person's unsaved work on a recipe. */
export const draftSchema = z.object({
  text: z.string(),
  /** Number of the version the work began from. */
  basedOn: z.number().int().min(1),
  updatedAt: instantSchema,
  /** Grows with every write; the ETag is this number in double quotes. */
  revision: z.number().int().min(1),
});
export type Draft = z.infer<typeof draftSchema>;

export const putDraftRequestSchema = z.strictObject({
  text: recipeTextSchema,
  basedOn: z.number().int().min(1),
});
export type PutDraftRequest = z.infer<typeof putDraftRequestSchema>;
