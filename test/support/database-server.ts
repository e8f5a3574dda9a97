import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchOnFreePort } from '../../server/dev/private-mariadb.ts';
import { keepSecret } from '../../server/dev/secret.ts';

/** A MariaDB for one run alone, as a user who may create databases. */
export async function startDatabaseServer(): Promise<{
  readonly url: string;
  readonly stop: () => Promise<void>;
}> {
  const folder = mkdtempSync(join(tmpdir(), 'fallow-mariadb-'));
  const database = {
    folder: join(folder, 'data'),
    password: keepSecret(folder, 'password'),
    rights: 'whole server',
    durable: false,
  } as const;
  const { child, port } = await launchOnFreePort(database, await anyFreePort('127.0.0.1'));
  const stop = async () => {
    await endProcess(child, 10_000);
    rmSync(folder, { recursive: true, force: true });
  };
  return { url: databaseUrl(database, port), stop };
}
