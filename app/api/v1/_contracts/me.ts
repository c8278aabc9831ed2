import { z } from 'zod';
import { idSchema } from './common';

/** Who is signed in. */
export const meSchema = z.object({ id: idSchema, name: z.string(), email: z.string() });
export type Me = z.infer<typeof meSchema>;
