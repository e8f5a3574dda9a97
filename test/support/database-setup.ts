import type { TestProject } from 'vitest/node';

import { startDatabaseServer } from './database-server.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** A MariaDB for the tests alone, as a user who may create databases. */
    readonly databaseServer: string;
  }
}

/** One private MariaDB for a run; each spec file makes a database of its own in it. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { url, stop } = await startDatabaseServer();
  project.provide('databaseServer', url);
  return stop;
}
