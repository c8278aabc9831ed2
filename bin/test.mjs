#!/usr/bin/env node
/**
 * The whole gate: `npm test`, or `npm test -- unit` for one or more of vitest's projects. It installs what is
 * missing, never touches .data/, and ends with the line "N passed, N failed".
 */
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureDebianPackage, findChromium, findPostgresPrograms } from './host/debian.mjs';
import { ensurePackages } from './host/packages.mjs';
import { endRunning, run } from './host/run.mjs';

const root = dirname(dirname(fileURLToPath(import.meta.url)));
const projects = process.argv.slice(2);
const counts = { passed: 0, failed: 0 };

/** @param {string} words @param {() => Promise<boolean>} act */
async function step(words, act) {
  console.log(`\n── ${words}`);
  const passed = await act().catch((error) => {
    console.error(error);
    return false;
  });
  counts[passed ? 'passed' : 'failed'] += 1;
  if (!passed) console.error(`${words}: FAILED`);
  return passed;
}

/** @param {string} program @param {readonly string[]} parameters @param {NodeJS.ProcessEnv} [env] */
async function tool(program, parameters, env = {}) {
  const path = join(root, 'node_modules', '.bin', program);
  return (
    (await run(path, parameters, {
      cwd: root,
      env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
    })) === 0
  );
}

/** Runs vitest and adds its tests to the counts; a run that never reported counts as one failure. */
async function runTests() {
  const report = join(root, '.tmp', 'vitest.json');
  rmSync(report, { force: true });
  const chosen = projects.flatMap((project) => ['--project', project]);
  const ran = await tool('vitest', [
    'run',
    ...chosen,
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ]);
  const { numPassedTests, numFailedTests, numPendingTests, testResults } = JSON.parse(
    readFileSync(report, 'utf8'),
  );
  counts.passed += numPassedTests;
  counts.failed += numFailedTests + numPendingTests;
  // A file that could not even be loaded has no tests of its own to fail.
  const broken = testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.length === 0,
  ).length;
  counts.failed += broken;
  // Each failed test is counted already; an error outside of every test shows in vitest's exit code alone.
  return ran || numFailedTests + broken > 0;
}

async function main() {
  mkdirSync(join(root, '.tmp'), { recursive: true });
  const needsBrowser = projects.length === 0 || projects.includes('e2e');
  const isReady =
    (await step('Packages', () => ensurePackages(root))) &&
    (await step('PostgreSQL', () => ensureDebianPackage('postgresql', findPostgresPrograms))) &&
    (!needsBrowser || (await step('Chromium', () => ensureDebianPackage('chromium', findChromium))));
  if (isReady) {
    if (projects.length === 0) {
      await step('Generated files are fresh', () => tool('tsx', ['bin/generate.ts', '--check']));
      await step('Format and lint', () => tool('biome', ['check', '--error-on-warnings', '.']));
      await step('Types', async () => (await tool('next', ['typegen'])) && (await tool('tsc', ['--noEmit'])));
    }
    await step('Tests', runTests);
  }
  console.log(`\n${counts.passed} passed, ${counts.failed} failed`);
  process.exit(counts.failed > 0 ? 1 : 0);
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => void endRunning().then(() => process.exit(1)));
}
await main();
