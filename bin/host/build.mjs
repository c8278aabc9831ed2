import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './run.mjs';

/** What the built application is made of. */
const SOURCES = [
  'app',
  'components',
  'compiler',
  'db',
  'templates',
  'public',
  'types',
  'proxy.ts',
  'package-lock.json',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'tsconfig.app.json',
];
const STAMP = 'pintle-sources';

/** @param {string} path @param {import('node:crypto').Hash} hash */
function addToHash(path, hash) {
  if (!existsSync(path)) return;
  if (statSync(path).isDirectory()) {
    for (const name of readdirSync(path).sort()) addToHash(join(path, name), hash);
    return;
  }
  hash.update(path).update('\0').update(readFileSync(path)).update('\0');
}

/** @param {string} root */
function sourceHash(root) {
  const hash = createHash('sha256');
  for (const source of SOURCES) addToHash(join(root, source), hash);
  return hash.digest('hex');
}

/**
 * Builds the application into a folder of the project, unless it holds a build of the very same sources.
 * Gives true when a good build is in place.
 * @param {string} root
 * @param {string} folder
 * @param {NodeJS.ProcessEnv} env
 */
export async function ensureBuild(root, folder, env) {
  const stamp = join(root, folder, STAMP);
  const wanted = sourceHash(root);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return true;
  console.log('Building the application…');
  const next = join(root, 'node_modules/next/dist/bin/next');
  const code = await run(process.execPath, [next, 'build'], {
    cwd: root,
    env: { ...env, PINTLE_DIST_DIR: folder, NEXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' },
    quietly: true,
  });
  if (code !== 0) return false;
  writeFileSync(stamp, wanted);
  return true;
}
