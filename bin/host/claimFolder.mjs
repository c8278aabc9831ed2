import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { processIdentity } from './processIdentity.mjs';

/**
 * Who started Pintle from a data folder, and which servers it started.
 * @typedef {{ pid: number, identity: string | null }} Process
 * @typedef {{ starter: Process, servers: readonly Process[] }} Claim
 * @typedef {{ addServer(pid: number | undefined): void, release(): void }} Hold
 */

/** @param {Process} process */
const isAlive = ({ pid, identity }) => identity !== null && processIdentity(pid) === identity;

/** @param {number} pid @returns {Process} */
const describe = (pid) => ({ pid, identity: processIdentity(pid) });

/** @param {string} file @returns {Claim | null} */
function readClaim(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * Ends servers whose starter was killed before it could end them.
 * @param {readonly Process[]} servers
 */
async function endServers(servers) {
  // PostgreSQL and the web server both take SIGINT as "finish and go"; the last started goes first.
  for (const server of [...servers].reverse()) {
    if (isAlive(server)) process.kill(server.pid, 'SIGINT');
    for (let tries = 0; isAlive(server) && tries < 300; tries += 1) await wait(100);
  }
}

/**
 * Makes this process the only one that starts Pintle from a data folder. What an earlier start left running, because
 * it was killed outright, is ended first. Throws, in words for people, when another start is alive.
 * @param {string} data
 * @returns {Promise<Hold>}
 */
export async function claimFolder(data) {
  mkdirSync(data, { recursive: true });
  const file = join(data, 'started.json');
  const draft = join(data, `started.${process.pid}.json`);
  /** @type {{ starter: Process, servers: Process[] }} */
  const claim = { starter: describe(process.pid), servers: [] };
  const write = () => writeFileSync(draft, JSON.stringify(claim));

  write();
  for (let isHeld = false; !isHeld; ) {
    try {
      // A link appears whole or not at all, and never over another start's.
      linkSync(draft, file);
      isHeld = true;
    } catch (error) {
      if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
      const other = readClaim(file);
      if (other && isAlive(other.starter)) {
        rmSync(draft);
        throw new Error(
          `Pintle is already started from this folder (process ${other.starter.pid}). Use that one, or stop it first.`,
        );
      }
      const left = `${draft}.left`;
      renameSync(file, left);
      await endServers(other?.servers ?? []);
      rmSync(left);
    }
  }
  rmSync(draft);
  return {
    addServer(pid) {
      if (pid === undefined) return;
      claim.servers.push(describe(pid));
      write();
      renameSync(draft, file);
    },
    release: () => rmSync(file, { force: true }),
  };
}
