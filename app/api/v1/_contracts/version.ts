import { z } from 'zod';
import { idSchema, instantSchema, lineSchema, personReferenceSchema, sha256Schema } from './common';
import { pageQuerySchema } from './paging';
import { recipeTextSchema } from './recipeText';

/** How far a version has come on its way to the animators. */
export const versionStateSchema = z.enum(['saved', 'proposed', 'approved', 'issued', 'withdrawn']);
export type VersionState = z.infer<typeof versionStateSchema>;

export const versionNumberSchema = z.coerce.number().int().min(1).max(2_147_483_647);

/** A version without its text. */
export const versionListItemSchema = z.object({
  number: z.number().int().min(1),
  /** Number of the version it was made from; null for the first. */
  parent: z.number().int().min(1).nullable(),
  message: z.string(),
  author: personReferenceSchema,
  createdAt: instantSchema,
  /** SHA-256 of the text in UTF-8. */
  contentHash: sha256Schema,
  compilerVersion: z.string(),
  /** Findings when it was saved. */
  errors: z.number().int().min(0),
  warnings: z.number().int().min(0),
  state: versionStateSchema,
});
export type VersionListItem = z.infer<typeof versionListItemSchema>;

export const versionListSchema = z.object({
  items: z.array(versionListItemSchema),
  nextCursor: z.string().nullable(),
});
export type VersionList = z.infer<typeof versionListSchema>;

export const versionListQuerySchema = pageQuerySchema;

export const versionSchema = versionListItemSchema.extend({ text: z.string() });
export type Version = z.infer<typeof versionSchema>;

/** The other side of a refused save. */
export const newestVersionSchema = z.object({
  number: z.number().int().min(1),
  text: z.string(),
  author: personReferenceSchema,
  createdAt: instantSchema,
});
export type NewestVersion = z.infer<typeof newestVersionSchema>;

export const createVersionRequestSchema = z.strictObject({
  /** Number of the version this text was made from; must be the newest. */
  parent: z.number().int().min(1),
  message: lineSchema({ min: 1, max: 500 }),
  text: recipeTextSchema,
});
export type CreateVersionRequest = z.infer<typeof createVersionRequestSchema>;

export const versionPathSchema = z.strictObject({ recipeId: idSchema, number: versionNumberSchema });
