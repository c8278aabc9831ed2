import { z } from 'zod';
import { idSchema, slugSchema } from './common';

/** What a person may do in a show; the strongest first. */
export const roleSchema = z.enum(['admin', 'reviewer', 'rigger', 'operator', 'viewer']);
export type Role = z.infer<typeof roleSchema>;

/** A show as its member sees it; `role` is the strongest the person holds in it. */
export const showSchema = z
  .object({ id: idSchema, slug: slugSchema, title: z.string(), role: roleSchema })
  .meta({ id: 'Show' });
export type Show = z.infer<typeof showSchema>;

export const showListSchema = z.object({ items: z.array(showSchema) });
export type ShowList = z.infer<typeof showListSchema>;

export const showPathSchema = z.strictObject({ slug: slugSchema });
