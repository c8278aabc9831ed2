import type { TestProject } from 'vitest/node';
import { startPostgres } from './postgres';

declare module 'vitest' {
  interface ProvidedContext {
    /** Address of the maintenance database of a throw-away PostgreSQL. */
    databaseUrl: string;
  }
}

/** Gives the tests of a project one PostgreSQL for the run. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const server = await startPostgres();
  project.provide('databaseUrl', server.url);
  return () => server.stop();
}
