import type { z } from 'zod';
import { Refusal } from '../refusal';

/** Reads one part of a request by its schema; refuses with every issue and the way to it. */
export function parseInput<Schema extends z.ZodType>(
  part: 'query' | 'body',
  schema: Schema,
  value: unknown,
): z.output<Schema> {
  const read = schema.safeParse(value);
  if (read.success) return read.data;
  const issues = read.error.issues.map(({ path, message }) => ({
    path: [part, ...path.map((key) => (typeof key === 'symbol' ? String(key) : key))],
    message,
  }));
  throw new Refusal({ code: 'invalid-input', issues });
}
