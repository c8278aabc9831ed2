#!/usr/bin/env node
/**
 * `npm start`: installs what is missing, starts a private PostgreSQL, brings the database up to date, builds when
 * the sources changed, starts the web server, and says where it is. Ctrl-C ends all of it.
 *
 * DATABASE_URL, AUTH_SECRET and NEXTAUTH_URL point the same code at real services; then no database is started
 * and no demo is filled in.
 */
import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';
import { ensureBuild } from './host/build.mjs';
import { claimFolder } from './host/claimFolder.mjs';
import { clusterFolder } from './host/clusterFolder.mjs';
import { ensureDebianPackage, findPostgresPrograms } from './host/debian.mjs';
import { ensurePackages } from './host/packages.mjs';
import { anyPort, findPort } from './host/ports.mjs';
import { startCluster } from './host/postgres.mjs';
import { endRunning, run } from './host/run.mjs';

const root = dirname(dirname(fileURLToPath(import.meta.url)));
const data = join(root, '.data');

/** Ends what was started, the last first. @type {(() => Promise<void>)[]} */
const endings = [];
let isEnding = false;

/** @param {number} code @returns {Promise<never>} */
async function end(code) {
  if (isEnding) return wait(60_000).then(() => process.exit(1));
  isEnding = true;
  await endRunning();
  for (const ending of endings.reverse()) await ending().catch((error) => console.error(error.message));
  process.exit(code);
}

/**
 * Secrets of this installation, made once.
 * @returns {{ databasePassword: string, authSecret: string }}
 */
function readSecrets() {
  const file = join(data, 'secrets.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  mkdirSync(data, { recursive: true });
  const secret = () => randomBytes(32).toString('base64url');
  const secrets = { databasePassword: secret(), authSecret: secret() };
  writeFileSync(file, JSON.stringify(secrets), { mode: 0o600 });
  return secrets;
}

/** @param {string} databasePassword @param {import('./host/claimFolder.mjs').Hold} hold */
async function startOwnDatabase(databasePassword, hold) {
  const folder = clusterFolder(data);
  if (!folder.startsWith(data)) console.log(`The database lies in ${folder}: its user cannot enter ${data}.`);
  const cluster = startCluster({ folder, password: databasePassword, port: await anyPort() });
  endings.push(() => cluster.stop());
  hold.addServer(cluster.pid);
  await cluster.ready();
  return cluster.url;
}

/** @param {string} script @param {readonly string[]} parameters @param {NodeJS.ProcessEnv} env */
function runScript(script, parameters, env) {
  return run(join(root, 'node_modules/.bin/tsx'), [join(root, 'bin', script), ...parameters], {
    cwd: root,
    env,
  });
}

/** @param {string} origin @param {import('node:child_process').ChildProcess} server */
async function untilReady(origin, server) {
  for (let tries = 0; tries < 600; tries += 1) {
    if (server.exitCode !== null) return false;
    const isReady = await fetch(`${origin}/api/v1/ready`).then(
      (response) => response.ok,
      () => false,
    );
    if (isReady) return true;
    await wait(100);
  }
  return false;
}

/** @param {string} what @returns {Promise<never>} */
function fail(what) {
  // What fails because it was told to end has nothing to report.
  if (!isEnding) console.error(what);
  return end(1);
}

async function main() {
  const began = Date.now();
  const hold = await claimFolder(data);
  endings.push(async () => hold.release());
  if (!(await ensurePackages(root))) return fail('Pintle was not started.');
  const isDemo = !process.env.DATABASE_URL;
  if (isDemo && !(await ensureDebianPackage('postgresql', findPostgresPrograms)))
    return fail('Pintle was not started.');

  const secrets = readSecrets();
  const databaseUrl = process.env.DATABASE_URL ?? (await startOwnDatabase(secrets.databasePassword, hold));
  const port = await findPort(Number(process.env.PORT ?? 3000));
  const origin = process.env.NEXTAUTH_URL ?? `http://127.0.0.1:${port}`;
  const secret = process.env.AUTH_SECRET ?? secrets.authSecret;
  const env = {
    ...process.env,
    DATABASE_URL: databaseUrl,
    AUTH_SECRET: secret,
    NEXTAUTH_SECRET: secret,
    NEXTAUTH_URL: origin,
    NEXT_TELEMETRY_DISABLED: '1',
    NODE_ENV: /** @type {const} */ ('production'),
  };
  if ((await runScript('prepareDatabase.ts', isDemo ? ['--demo'] : [], env)) !== 0) {
    return fail('The database could not be brought up to date.');
  }
  if (!(await ensureBuild(root, '.next', env))) return fail('The application could not be built.');

  if (isEnding) return fail('');
  const next = join(root, 'node_modules/next/dist/bin/next');
  const server = spawn(process.execPath, [next, 'start', '-H', '127.0.0.1', '-p', String(port)], {
    cwd: root,
    env,
    stdio: ['ignore', 'ignore', 'inherit'],
    detached: true,
  });
  const ended = new Promise((resolve) => server.once('exit', resolve));
  hold.addServer(server.pid);
  endings.push(async () => {
    if (server.exitCode === null) server.kill('SIGTERM');
    await ended;
  });
  if (!(await untilReady(`http://127.0.0.1:${port}`, server))) return fail('The web server did not start.');

  console.log(`\nPintle is ready (${((Date.now() - began) / 1000).toFixed(1)} s).\n\n  Address   ${origin}`);
  if (isDemo) {
    console.log('  Accounts  of the demo, with their passwords:');
    await runScript('printAccounts.ts', [], env);
  }
  console.log('  Stop      Ctrl-C\n');
  await ended;
  if (!isEnding) return fail('The web server ended by itself.');
}

if (process.env.npm_lifecycle_event === 'start') {
  // Told to end, npm and its shell do so without passing it on: then the parent is another one from one look to the next.
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && void end(0), 500).unref();
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));
await main().catch((error) => fail(error.message));
