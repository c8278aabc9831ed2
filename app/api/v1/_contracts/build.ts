import { z } from 'zod';
import { sha256Schema } from './common';
import { versionPathSchema } from './version';

export const buildFileSchema = z.object({
  name: z.string(),
  mediaType: z.string(),
  bytes: z.number().int().min(0),
  sha256: sha256Schema,
});
export type BuildFile = z.infer<typeof buildFileSchema>;

/** What one compile of a version produced; the same inputs always have the same key. */
export const buildSchema = z
  .object({
    key: sha256Schema,
    character: z.string(),
    files: z.array(buildFileSchema),
  })
  .meta({ id: 'Build' });
export type Build = z.infer<typeof buildSchema>;

export const buildFilePathSchema = versionPathSchema.extend({ name: z.string().min(1).max(200) });
