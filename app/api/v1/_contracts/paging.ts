import { z } from 'zod';

/** Rows a page holds when nothing else was asked. */
export const DEFAULT_PAGE_SIZE = 25;
export const MAXIMUM_PAGE_SIZE = 100;

/** Where the page before ended; opaque, only ever taken from an earlier answer's `nextCursor`. */
export const cursorSchema = z
  .string()
  .min(1)
  .max(2000)
  .regex(/^[A-Za-z0-9_-]+$/);

/** Query of every list: where to go on and how many rows to give. */
export const pageQuerySchema = z.strictObject({
  cursor: cursorSchema.optional(),
  limit: z.coerce.number().int().min(1).max(MAXIMUM_PAGE_SIZE).default(DEFAULT_PAGE_SIZE),
});
export type PageQuery = z.infer<typeof pageQuerySchema>;
