import { execFileSync, spawn } from 'node:child_process';
import { chownSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import pg from 'pg';

/** A PostgreSQL of its own, for tests to do with as they like. */
export interface TestServer {
  /** Address of its maintenance database. */
  readonly url: string;
  stop(): Promise<void>;
}

/** Where Debian keeps PostgreSQL's programs; the newest version wins. */
function binaryFolder(): string {
  const root = '/usr/lib/postgresql';
  const versions = existsSync(root) ? readdirSync(root).map(Number) : [];
  const newest = Math.max(...versions);
  if (!Number.isFinite(newest)) throw new Error('PostgreSQL is not installed: apt-get install postgresql');
  return join(root, String(newest), 'bin');
}

/** PostgreSQL refuses to run as root, so root runs it as its own user. */
function owner(): { uid?: number; gid?: number } {
  if (process.getuid?.() !== 0) return {};
  const idOf = (option: string) => Number(execFileSync('id', [option, 'postgres'], { encoding: 'utf8' }));
  return { uid: idOf('-u'), gid: idOf('-g') };
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => (typeof address === 'object' && address ? resolve(address.port) : reject()));
    });
  });
}

async function waitUntilReady(url: string): Promise<void> {
  for (let tries = 0; ; tries += 1) {
    const client = new pg.Client({ connectionString: url });
    try {
      await client.connect();
      await client.end();
      return;
    } catch (cause) {
      if (tries === 200) throw new Error('the test PostgreSQL did not come up', { cause });
      await wait(50);
    }
  }
}

/** Starts a PostgreSQL in a fresh folder, on a free port of the loopback, without regard to power cuts. */
export async function startPostgres(): Promise<TestServer> {
  const folder = mkdtempSync(join(tmpdir(), 'pintle-postgres-'));
  const identity = owner();
  if (identity.uid !== undefined && identity.gid !== undefined) chownSync(folder, identity.uid, identity.gid);
  const binaries = binaryFolder();
  const options = { ...identity, cwd: folder, stdio: 'ignore' as const };
  const initial = [
    '-D',
    folder,
    '-U',
    'pintle',
    '-A',
    'trust',
    '-E',
    'UTF8',
    '--locale=C.UTF-8',
    '--no-sync',
  ];
  execFileSync(join(binaries, 'initdb'), initial, options);
  const port = await freePort();
  const settings = ['listen_addresses=127.0.0.1', 'unix_socket_directories=', 'fsync=off'];
  const server = spawn(
    join(binaries, 'postgres'),
    ['-D', folder, '-p', String(port), ...settings.flatMap((setting) => ['-c', setting])],
    options,
  );
  const ended = new Promise<void>((resolve) => server.once('exit', () => resolve()));
  const url = `postgres://pintle@127.0.0.1:${port}/postgres`;
  await waitUntilReady(url);
  return {
    url,
    async stop() {
      server.kill('SIGINT');
      await ended;
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
