import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { claimFolder } from '@/bin/host/claimFolder.mjs';
import { processIdentity } from '@/bin/host/processIdentity.mjs';

let data: string;
const children: ChildProcess[] = [];
beforeEach(() => {
  data = mkdtempSync(join(tmpdir(), 'pintle-claim-'));
});
afterEach(() => {
  for (const child of children.splice(0)) child.kill('SIGKILL');
  rmSync(data, { recursive: true, force: true });
});

function startChild(...parameters: string[]): ChildProcess {
  const child = spawn(process.execPath, parameters, { stdio: ['ignore', 'pipe', 'inherit'] });
  children.push(child);
  return child;
}

const hasEnded = (child: ChildProcess) => new Promise((resolve) => child.once('exit', resolve));
const idle = 'setInterval(() => {}, 1000)';

/** A starter in a process of its own, which holds the folder with one server, and says so. */
async function startStarter(serverPid: number | undefined): Promise<ChildProcess> {
  const module = pathToFileURL(join(import.meta.dirname, '../../../bin/host/claimFolder.mjs')).href;
  const code = `const { claimFolder } = await import(${JSON.stringify(module)});
    const hold = await claimFolder(${JSON.stringify(data)});
    hold.addServer(${serverPid});
    console.log('held'); ${idle}`;
  const child = startChild('--input-type=module', '-e', code);
  await new Promise((resolve) => child.stdout?.once('data', resolve));
  return child;
}

it('lets nobody else start while a starter lives, and names it', async () => {
  const starter = await startStarter(undefined);
  await expect(claimFolder(data)).rejects.toThrow(
    `already started from this folder (process ${starter.pid})`,
  );
  expect(readdirSync(data)).toEqual(['started.json']);
});

it('ends what a killed starter left running, then holds the folder', async () => {
  const server = startChild('-e', idle);
  const serverEnded = hasEnded(server);
  const starter = await startStarter(server.pid);
  const starterEnded = hasEnded(starter);
  starter.kill('SIGKILL');
  await starterEnded;
  const hold = await claimFolder(data);
  await serverEnded;
  expect(server.signalCode).toBe('SIGINT');
  hold.release();
  expect(readdirSync(data)).toEqual([]);
});

it('spares a process that was given the number of a server of long ago', async () => {
  const stranger = startChild('-e', idle);
  const gone = { pid: 1, identity: null };
  const servers = [{ pid: stranger.pid, identity: `another-boot ${stranger.pid} 1` }];
  writeFileSync(join(data, 'started.json'), JSON.stringify({ starter: gone, servers }));
  await claimFolder(data);
  expect(processIdentity(stranger.pid ?? 0)).not.toBeNull();
  expect(stranger.signalCode).toBeNull();
});

it('takes a claim that nobody can read for a left-over', async () => {
  writeFileSync(join(data, 'started.json'), '{"starter":');
  const hold = await claimFolder(data);
  await expect(claimFolder(data)).rejects.toThrow(`process ${process.pid}`);
  hold.release();
  expect(existsSync(join(data, 'started.json'))).toBe(false);
});
