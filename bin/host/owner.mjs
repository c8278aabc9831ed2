import { execFileSync } from 'node:child_process';

/**
 * PostgreSQL refuses to run as root, so root runs it as its own user; anybody else runs it as themselves.
 * @returns {{ uid?: number, gid?: number }}
 */
export function clusterOwner() {
  if (process.getuid?.() !== 0) return {};
  const idOf = (/** @type {string} */ option) =>
    Number(execFileSync('id', [option, 'postgres'], { encoding: 'utf8' }));
  return { uid: idOf('-u'), gid: idOf('-g') };
}
