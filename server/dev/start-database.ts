import { join } from 'node:path';

import type { PrivateDatabase } from './database-folder.ts';
import {
  DATABASE_GRACE_MS,
  databaseUrl,
  launchMariaDB,
  launchOnFreePort,
} from './private-mariadb.ts';
import { keepSecret } from './secret.ts';
import type { Ward } from './supervisor.ts';

/** Away from 3306, where a MariaDB of the machine's own may be. */
const DATABASE_PORT = 33_060;

/** The installation's own MariaDB, to be kept running. */
export interface OwnDatabase {
  readonly ward: Ward;
  /** Address for the API; known once it has been launched. */
  readonly url: () => string;
}

export function ownDatabase(dataFolder: string, say: (line: string) => void): OwnDatabase {
  const database: PrivateDatabase = {
    folder: join(dataFolder, 'mariadb'),
    password: keepSecret(dataFolder, 'database-password'),
    rights: 'own database',
    durable: true,
  };
  /** Chosen at the first launch and kept ever after, for the API knows it by then. */
  let port = 0;
  const launch = async () => {
    if (port !== 0) return launchMariaDB(database, port);
    const first = await launchOnFreePort(database, DATABASE_PORT);
    port = first.port;
    say(`MariaDB runs on 127.0.0.1:${port}, its data in ${database.folder}.`);
    return first.child;
  };
  const ward = { name: 'MariaDB', launch, graceMs: DATABASE_GRACE_MS };
  return { ward, url: () => databaseUrl(database, port) };
}
