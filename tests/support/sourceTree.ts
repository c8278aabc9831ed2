import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder. */
export const projectRoot = fileURLToPath(new URL('../..', import.meta.url));

/** What is installed, built or kept by a running application; as in .gitignore. */
const NOT_SOURCES = new Set(['node_modules', '.git', '.next', '.data', '.tmp', 'coverage', 'dist']);

/**
 * Every source file of the project, as a path from its root. Read from the disk, not asked of git, which may be
 * absent, or may refuse a folder that belongs to somebody else.
 */
export function listSources(folder = ''): readonly string[] {
  return readdirSync(join(projectRoot, folder), { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return NOT_SOURCES.has(entry.name) ? [] : listSources(path);
    return entry.isFile() && entry.name !== 'next-env.d.ts' ? [path] : [];
  });
}
