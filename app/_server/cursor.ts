import type { z } from 'zod';
import { Refusal } from './refusal';

/** Packs the place where a page ended into an opaque word for the next request. */
export function encodeCursor(place: Readonly<Record<string, string | number>>): string {
  return Buffer.from(JSON.stringify(place), 'utf8').toString('base64url');
}

/** Reads a cursor back; refuses one that was not made for this very list and order. */
export function decodeCursor<Place extends z.ZodType>(cursor: string, schema: Place): z.infer<Place> {
  const place = parseJson(Buffer.from(cursor, 'base64url').toString('utf8'));
  const read = schema.safeParse(place);
  if (!read.success) throw new Refusal({ code: 'invalid-cursor' });
  return read.data;
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new Refusal({ code: 'invalid-cursor' });
  }
}

/**
 * Splits what a query for one row more than a page found: the page's rows, and the last of them when there are
 * more to come.
 */
export function cutPage<Row>(rows: readonly Row[], limit: number): { items: readonly Row[]; last?: Row } {
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  return rows.length > limit && last !== undefined ? { items, last } : { items };
}
