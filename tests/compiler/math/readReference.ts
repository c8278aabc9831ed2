import { readFileSync } from 'node:fs';

/** Reads one of the small reference files under tests/data/numeric; each names its source within. */
export function readReference<T>(name: string): T {
  return JSON.parse(readFileSync(new URL(`../../data/numeric/${name}`, import.meta.url), 'utf8')) as T;
}
