import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './run.mjs';

/** Where the hash of the lock file stands that node_modules was installed from. */
const STAMP = 'node_modules/.installed-from';

/** @param {string} root */
function lockHash(root) {
  return createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex');
}

/**
 * Installs the packages of the lock file, unless they are there already. Gives true when packages are in place.
 * @param {string} root
 */
export async function ensurePackages(root) {
  const stamp = join(root, STAMP);
  const wanted = lockHash(root);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return true;
  console.log('Installing packages…');
  // Also where NODE_ENV is "production": the build checks types, and those packages count as needed for development.
  const code = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { cwd: root });
  if (code !== 0) {
    console.error('The packages could not be installed. Look at what npm says above, then try again.');
    return false;
  }
  writeFileSync(stamp, wanted);
  return true;
}
