import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './run.mjs';

const POSTGRES_ROOT = '/usr/lib/postgresql';

/** Folder of PostgreSQL's programs, of the newest version there is; null when none is installed. */
export function findPostgresPrograms() {
  const versions = existsSync(POSTGRES_ROOT)
    ? readdirSync(POSTGRES_ROOT).map(Number).filter(Number.isFinite)
    : [];
  for (const version of versions.sort((a, b) => b - a)) {
    const programs = join(POSTGRES_ROOT, String(version), 'bin');
    if (existsSync(join(programs, 'initdb')) && existsSync(join(programs, 'postgres'))) return programs;
  }
  return null;
}

/** Path of Debian's Chromium; null when it is not installed. */
export function findChromium() {
  return existsSync('/usr/bin/chromium') ? '/usr/bin/chromium' : null;
}

/**
 * Installs a Debian package when `find` finds nothing. Only root can; anybody else is told what to type.
 * Gives true when it is there in the end.
 * @param {string} name
 * @param {() => string | null} find
 */
export async function ensureDebianPackage(name, find) {
  if (find()) return true;
  if (process.getuid?.() !== 0) {
    console.error(`${name} is not installed. Ask somebody who may to run: apt-get install ${name}`);
    return false;
  }
  console.log(`Installing ${name} from Debian's packages…`);
  // A private cluster is made by us; the one Debian would start by itself is not wanted.
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', PG_CREATE_MAIN_CLUSTER: 'false' };
  const quiet = { env, quietly: true };
  await run('apt-get', ['update', '-q'], quiet);
  const code = await run('apt-get', ['install', '-y', '-q', '--no-install-recommends', name], quiet);
  if (code === 0 && find()) return true;
  console.error(`${name} could not be installed: apt-get ended with ${code}.`);
  return false;
}
