import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Files below `folder` whose name ends in `suffix`, whatever their depth, without those of generated folders. */
export function filesEndingIn(folder: string, suffix: string): readonly string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((path) => path.endsWith(suffix) && !path.includes('generated'))
    .map((path) => join(folder, path))
    .sort();
}

/** A module that exports one record of texts, by file name without the suffix, sorted. */
export function textModule(exportName: string, folder: string, suffix: string): string {
  const entries = filesEndingIn(folder, suffix)
    .map(
      (path) => [path.slice(path.lastIndexOf('/') + 1, -suffix.length), readFileSync(path, 'utf8')] as const,
    )
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, text]) => `  ${JSON.stringify(name)}: ${JSON.stringify(text)},`);
  return [
    `// Made by bin/generate.ts from the files *${suffix}. Change those, not this.`,
    `export const ${exportName}: Readonly<Record<string, string>> = {`,
    ...entries,
    '};',
    '',
  ].join('\n');
}
