import { chmodSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterAll, afterEach, beforeAll, expect, it } from 'vitest';
import { anyPort } from '@/bin/host/ports.mjs';
import { startCluster } from '@/bin/host/postgres.mjs';

type Cluster = ReturnType<typeof startCluster>;
let data: string;
let folder: string;
const started: Cluster[] = [];
// One cluster for all: making one writes it to the disk for good, which takes its time.
beforeAll(() => {
  data = mkdtempSync(join(tmpdir(), 'pintle-cluster-'));
  // The user that PostgreSQL runs as must be able to enter.
  chmodSync(data, 0o755);
  folder = join(data, 'postgres');
  // What a making that was cut short leaves behind; were it taken for a cluster, nothing here would start.
  mkdirSync(`${folder}.new`);
  writeFileSync(join(`${folder}.new`, 'PG_VERSION'), '15\n');
});
afterEach(async () => {
  for (const cluster of started.splice(0)) await cluster.stop();
});
afterAll(() => rmSync(data, { recursive: true, force: true }));

async function start(): Promise<Cluster> {
  const cluster = startCluster({ folder, password: 'only for this test', port: await anyPort() });
  started.push(cluster);
  await cluster.ready();
  return cluster;
}

async function ask(url: string, sql: string): Promise<readonly unknown[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(sql)).rows.flatMap(Object.values);
  } finally {
    await client.end();
  }
}

it('keeps what was written from one start to the next, and refuses a wrong password', async () => {
  const first = await start();
  await ask(first.url, "create table kept as select 'marsh' as word");
  const wrong = new URL(first.url);
  wrong.password = 'guessed';
  await expect(ask(wrong.href, 'select 1')).rejects.toThrow('password authentication failed');
  await first.stop();
  expect(await ask((await start()).url, 'select word from kept')).toEqual(['marsh']);
});

it('listens on the loopback alone', async () => {
  const { url } = await start();
  expect(await ask(url, 'show listen_addresses')).toEqual(['127.0.0.1']);
  expect(await ask(url, 'show unix_socket_directories')).toEqual(['']);
});

it('refuses a second server on the same folder', async () => {
  const { pid } = await start();
  await expect(start()).rejects.toThrow(`already runs on ${folder} (process ${pid})`);
});

it('starts over a lock file left by a crash, though its number is by now another process’s', async () => {
  await (await start()).stop();
  writeFileSync(join(folder, 'postmaster.pid'), `${process.pid}\n${folder}\n`);
  expect(await ask((await start()).url, 'select 1')).toEqual([1]);
});
