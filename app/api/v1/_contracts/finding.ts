import { z } from 'zod';

/** A stretch of a text; offsets from 0 in UTF-16 code units, lines and columns from 1. */
export const spanSchema = z
  .object({
    source: z.string(),
    start: z.number().int(),
    end: z.number().int(),
    startLine: z.number().int(),
    startColumn: z.number().int(),
    endLine: z.number().int(),
    endColumn: z.number().int(),
  })
  .meta({ id: 'Span' });

/** One diagnostic of the compiler, as it leaves the server. */
export const findingSchema = z
  .object({
    code: z.string(),
    severity: z.enum(['error', 'warning', 'info']),
    message: z.string(),
    span: spanSchema,
    related: z.array(z.object({ span: spanSchema, label: z.string() })),
    help: z.string(),
    fix: z
      .object({
        title: z.string(),
        safe: z.boolean(),
        edits: z.array(z.object({ span: spanSchema, newText: z.string() })),
      })
      .optional(),
  })
  .meta({ id: 'Finding' });
