import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import type { TestProject } from 'vitest/node';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchOnFreePort } from '../../server/dev/private-mariadb.ts';
import { keepSecret } from '../../server/dev/secret.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** A MariaDB for the tests alone, as a user who may create databases. */
    readonly databaseServer: string;
  }
}

/** One private MariaDB for a run; each spec file makes a database of its own in it. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(join(tmpdir(), 'fallow-mariadb-'));
  const database = {
    folder: join(folder, 'data'),
    password: keepSecret(folder, 'password'),
    rights: 'whole server',
    durable: false,
  } as const;
  const { child, port } = await launchOnFreePort(database, await anyFreePort('127.0.0.1'));
  project.provide('databaseServer', databaseUrl(database, port));
  return async () => {
    await endProcess(child, 10_000);
    rmSync(folder, { recursive: true, force: true });
  };
}
