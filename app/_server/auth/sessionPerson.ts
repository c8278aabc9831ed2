import type { NextRequest } from 'next/server';
import { getToken } from 'next-auth/jwt';
import { z } from 'zod';
import { readEnvironment } from '../env';

/** Id of the person whose session the request carries; null without one, or when it is forged or expired. */
export async function sessionPerson(request: NextRequest): Promise<string | null> {
  const token = await getToken({ req: request, secret: readEnvironment().authSecret });
  const id = z.uuid().safeParse(token?.sub);
  return id.success ? id.data : null;
}
