import { z } from 'zod';

/** The process answers. */
export const healthSchema = z.object({ status: z.literal('ok') });

/** The process can do its work: the database answers and has every migration. */
export const readinessSchema = z.object({ status: z.literal('ready') });
