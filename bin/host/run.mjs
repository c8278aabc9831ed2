import { spawn } from 'node:child_process';

/**
 * Runs a program to its end with its output shown, and gives its exit code. Never throws for a program that fails;
 * a program that cannot be started at all counts as failed.
 * @param {string} command
 * @param {readonly string[]} parameters
 * @param {import('node:child_process').SpawnOptions} [options]
 * @returns {Promise<number>}
 */
export function run(command, parameters, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, parameters, { stdio: 'inherit', ...options });
    child.once('error', (error) => {
      console.error(`${command} cannot be started: ${error.message}`);
      resolve(127);
    });
    child.once('exit', (code, signal) => resolve(code ?? (signal ? 130 : 1)));
  });
}
