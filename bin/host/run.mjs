import { spawn } from 'node:child_process';

/** Programs that run at this moment, so that an end from outside can end them too. @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/**
 * Runs a program to its end and gives its exit code. Its output is shown as it comes, or, `quietly`, only when the
 * program fails. Never throws for a program that fails; one that cannot be started at all counts as failed.
 * @param {string} command
 * @param {readonly string[]} parameters
 * @param {import('node:child_process').SpawnOptions & { quietly?: boolean }} [options]
 * @returns {Promise<number>}
 */
export function run(command, parameters, { quietly = false, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, parameters, {
      stdio: quietly ? ['ignore', 'pipe', 'pipe'] : 'inherit',
      ...options,
    });
    running.add(child);
    /** @type {Buffer[]} */
    const said = [];
    for (const stream of [child.stdout, child.stderr]) stream?.on('data', (data) => said.push(data));
    child.once('error', (error) => {
      running.delete(child);
      console.error(`${command} cannot be started: ${error.message}`);
      resolve(127);
    });
    child.once('close', (code, signal) => {
      running.delete(child);
      if (code !== 0 && !signal) process.stderr.write(Buffer.concat(said));
      resolve(code ?? (signal ? 130 : 1));
    });
  });
}

/** Ends the programs that `run` is running, and comes back when they are gone. */
export async function endRunning() {
  await Promise.all(
    [...running].map(
      (child) =>
        new Promise((resolve) => {
          child.once('close', resolve);
          child.kill('SIGTERM');
        }),
    ),
  );
}
