import { z } from 'zod';

/** Ids are random UUIDs in lower-case text form. */
export const idSchema = z.uuid();

/** A moment in UTC, ISO 8601 with milliseconds, e.g. `2026-12-01T09:30:00.000Z`. */
export const instantSchema = z.iso.datetime({ precision: 3 });

/** SHA-256 as 64 lower-case hexadecimal digits. */
export const sha256Schema = z.string().regex(/^[0-9a-f]{64}$/);

/** The short name of a show in addresses. */
export const slugSchema = z
  .string()
  .max(64)
  .regex(/^[a-z][a-z0-9_]*$/, 'Use lower-case letters, digits and underscores, a letter first.');

/** Who somebody is to the others of a show. */
export const personReferenceSchema = z.object({ id: idSchema, name: z.string() });
export type PersonReference = z.infer<typeof personReferenceSchema>;

/**
 * What PostgreSQL cannot keep (NUL) or would keep as something else (half of a surrogate pair). Refused at the
 * door, so that what is stored is byte for byte what was sent.
 */
const UNSTORABLE = /\0|\p{Surrogate}/u;

/** Any text PostgreSQL keeps unchanged. */
export function storableText(schema: z.ZodString): z.ZodString {
  return schema.refine(
    (text) => !UNSTORABLE.test(text),
    'Remove characters that are not valid Unicode text.',
  );
}

/** One line a person wrote for other people: trimmed, no line breaks or other control characters. */
export function lineSchema(limits: { readonly min: number; readonly max: number }): z.ZodString {
  return storableText(z.string().trim().min(limits.min).max(limits.max)).refine(
    (text) => !/\p{Cc}/u.test(text),
    'Write it on one line.',
  );
}
