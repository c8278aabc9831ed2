#!/usr/bin/env node
/**
 * Bundles the benchmarks as the application is bundled, then runs them: measured through a loader that compiles on
 * the fly, every closure would carry that loader's cost.
 */
import { dirname, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'esbuild';

process.chdir(dirname(dirname(fileURLToPath(import.meta.url))));
const outfile = join('.tmp', 'bench.mjs');
await build({
  entryPoints: ['tests/bench/main.ts'],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  packages: 'external',
  logLevel: 'warning',
});
await import(pathToFileURL(outfile).href);
