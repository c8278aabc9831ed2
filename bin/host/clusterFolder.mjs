import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { join } from 'node:path';
import { clusterOwner } from './owner.mjs';

/** Home of Debian's `postgres` user, which that user can always reach. */
const HOME = '/var/lib/postgresql';

/**
 * Where the private cluster lies: in the project's data folder, or, when root started Pintle from a place that the
 * user `postgres` cannot enter (as root's own home is), in that user's home, under a name made of the project's path.
 * @param {string} data the project's data folder, which exists
 */
export function clusterFolder(data) {
  const owner = clusterOwner();
  const canEnter = owner.uid === undefined || spawnSync('test', ['-x', data], owner).status === 0;
  if (canEnter) return join(data, 'postgres');
  const name = createHash('sha256').update(data).digest('hex').slice(0, 12);
  return join(HOME, `pintle-${name}`);
}
