import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { TestProject } from 'vitest/node';
import { ensureBuild } from '../../bin/host/build.mjs';
import { anyPort } from '../../bin/host/ports.mjs';
import { run } from '../../bin/host/run.mjs';
import { startPostgres } from './postgres';

declare module 'vitest' {
  interface ProvidedContext {
    /** Address of the built application, on a throw-away database filled with the demo. */
    applicationUrl: string;
  }
}

const root = fileURLToPath(new URL('../..', import.meta.url));
/** Beside the folder of a started application, which a test run must leave alone. */
const FOLDER = '.tmp/next';

/** Gives the end-to-end tests the built application with the demo in a throw-away database. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const database = await startPostgres();
  const port = await anyPort();
  const applicationUrl = `http://127.0.0.1:${port}`;
  const env = {
    ...process.env,
    DATABASE_URL: database.url,
    AUTH_SECRET: 'a secret for one test run and nothing else',
    NEXTAUTH_SECRET: 'a secret for one test run and nothing else',
    NEXTAUTH_URL: applicationUrl,
    NEXT_TELEMETRY_DISABLED: '1',
    LOG_LEVEL: 'error',
    PINTLE_DIST_DIR: FOLDER,
    NODE_ENV: 'production' as const,
  };
  const code = await run(`${root}/node_modules/.bin/tsx`, [`${root}/bin/prepareDatabase.ts`, '--demo'], {
    cwd: root,
    env,
  });
  if (code !== 0) throw new Error('the database could not be prepared');
  if (!(await ensureBuild(root, FOLDER, env))) throw new Error('the application could not be built');

  const next = `${root}/node_modules/next/dist/bin/next`;
  const server = spawn(process.execPath, [next, 'start', '-H', '127.0.0.1', '-p', String(port)], {
    cwd: root,
    env,
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  const ended = new Promise((resolve) => server.once('exit', resolve));
  for (let tries = 0; ; tries += 1) {
    const isReady = await fetch(`${applicationUrl}/api/v1/ready`).then(
      (response) => response.ok,
      () => false,
    );
    if (isReady) break;
    if (tries > 300 || server.exitCode !== null) throw new Error('the application did not start');
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  project.provide('applicationUrl', applicationUrl);
  return async () => {
    server.kill('SIGTERM');
    await ended;
    await database.stop();
  };
}
