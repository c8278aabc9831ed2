import {
  existsSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  truncateSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { runPintle } from '../support/pintle';

const walker = 'format: 1\nrecipe: walker\nparts:\n  root: { kind: root }\n';
let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'pintle-hostile-'));
  writeFileSync(join(folder, 'one.recipe.yaml'), walker);
  writeFileSync(join(folder, 'two.recipe.yaml'), walker);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));
const pintle = (...parameters: string[]) => runPintle(folder, parameters);

it('writes nothing when two recipes would write the same files, and names both', () => {
  const { status, stderr } = pintle('compile', 'one.recipe.yaml', 'two.recipe.yaml', '--out', 'both');
  expect(status).toBe(2);
  expect(stderr).toContain('one.recipe.yaml and two.recipe.yaml would both write walker.slip.');
  expect(existsSync(join(folder, 'both'))).toBe(false);
});

it('says so when --out is a file, and leaves that file alone', () => {
  const { status, stderr } = pintle('compile', 'one.recipe.yaml', '--out', 'two.recipe.yaml');
  expect(status).toBe(2);
  expect(stderr).toContain(
    'two.recipe.yaml cannot be written to: it is not a folder.\nUsage: pintle compile',
  );
  expect(readFileSync(join(folder, 'two.recipe.yaml'), 'utf8')).toBe(walker);
});

it('lets no character name lead out of the folder', () => {
  expect(pintle('compile', 'one.recipe.yaml', '--out', 'out', '--character', '../astray').status).toBe(1);
  expect(readdirSync(join(folder, 'out'))).toEqual(['walker.findings.sarif']);
  expect(readdirSync(folder).filter((name) => name.startsWith('astray'))).toEqual([]);
});

it('passes nothing to the terminal that could steer it', () => {
  writeFileSync(join(folder, 'steer.recipe.yaml'), 'format: 1\nrecipe: "\u001b]0;owned\u0007\u202e"\n');
  const { status, stdout } = pintle('check', 'steer.recipe.yaml');
  expect(status).toBe(1);
  expect(stdout).toContain('steer.recipe.yaml:2:');
  expect(stdout).not.toMatch(/[^\n\P{Cc}]|\u202e/u);
});

it('does not read a file of gigabytes into memory', () => {
  writeFileSync(join(folder, 'vast.yaml'), '');
  truncateSync(join(folder, 'vast.yaml'), 5 * 1024 ** 3);
  const { status, stderr } = pintle('check', 'vast.yaml');
  expect(status).toBe(2);
  expect(stderr).toContain('vast.yaml is larger than 64 MiB.');
});

it('reads no device without end', () => {
  const { status, stderr } = pintle('check', '/dev/zero');
  expect(status).toBe(2);
  expect(stderr).toContain('/dev/zero is larger than 64 MiB.');
});

it('comes back from a folder in which none can be made', () => {
  const { status, stderr } = pintle('compile', 'one.recipe.yaml', '--out', '/proc/astray/further');
  expect(status).toBe(2);
  expect(stderr).toContain('/proc/astray/further cannot be written to: ENOENT.');
});

it('finds the name of house rules that are nested beyond measure without falling over', () => {
  writeFileSync(join(folder, 'deep.house.yaml'), `house: ${'['.repeat(100_000)}`);
  const { status, stdout } = pintle('check', 'one.recipe.yaml', '--house', 'deep.house.yaml');
  expect(status).toBe(1);
  expect(stdout).toContain('deep.house.yaml:1:71 error nested-too-deep');
});
