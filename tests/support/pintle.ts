import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** Runs the command line as the shell would, from a folder. */
export function runPintle(folder: string, parameters: readonly string[]) {
  const { status, stdout, stderr } = spawnSync(
    join(root, 'node_modules/.bin/tsx'),
    [join(root, 'bin/pintle.ts'), ...parameters],
    { cwd: folder, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 },
  );
  return { status, stdout, stderr };
}
