import type { NextRequest } from 'next/server';
import { sessionPerson } from '../auth/sessionPerson';
import type { Caller } from '../caller';
import { applicationDatabase } from '../database';
import { loadViewer } from '../viewer';
import { remoteAddress } from './remoteAddress';

/** Who sent the request, with the roles the database has at this moment. */
export async function callerOf(request: NextRequest): Promise<Caller> {
  const database = applicationDatabase();
  const personId = await sessionPerson(request);
  return {
    database,
    viewer: personId === null ? null : await loadViewer(database, personId),
    address: remoteAddress(request.headers),
  };
}

/** Somebody who need not say who they are; asks nothing of the database. */
export function nobody(request: NextRequest): Caller {
  return { database: applicationDatabase(), viewer: null, address: remoteAddress(request.headers) };
}
