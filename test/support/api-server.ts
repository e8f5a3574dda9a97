import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { createApp } from '../../server/app.ts';
import { readConfig } from '../../server/config.ts';
import { connectDatabase } from '../../server/db/connection.ts';
import { migrate } from '../../server/db/migrator.ts';
import { createLogger } from '../../server/logger.ts';
import { createServices, type Services } from '../../server/services.ts';
import { ApiClient } from './api-client.ts';
import { type FreshDatabase, freshDatabase } from './database.ts';

const UNLIMITED = '1000000000';

let accountsMade = 0;

/** The whole server over a database of its own, listening on a free port. */
export interface ApiServer {
  readonly url: string;
  readonly app: ReturnType<typeof createApp>;
  readonly services: Services;
  readonly databaseUrl: string;
  /** Folder of uploads and the like. */
  readonly dataFolder: string;
  /** Runs SQL behind the server's back. */
  readonly sql: (statement: string) => Promise<unknown>;
  /** Somebody without a session. */
  readonly visitor: () => Promise<ApiClient>;
  /** Somebody new, signed in, admin of a workshop of his or her own. */
  readonly newcomer: () => Promise<ApiClient>;
  readonly close: () => Promise<void>;
}

/**
 * @param settings Settings other than the tests' own, such as `{ LIMIT_SIGN_IN: '3' }`.
 * @param own A database to use instead of a fresh one.
 */
export async function startApiServer(
  settings: NodeJS.ProcessEnv = {},
  own?: FreshDatabase,
): Promise<ApiServer> {
  const { url: databaseUrl, drop } = own ?? (await freshDatabase());
  const dataFolder = mkdtempSync(join(tmpdir(), 'fallow-data-'));
  const config = readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl,
    DATA_DIR: dataFolder,
    WORKER_PROCESS: 'false',
    LIMIT_SIGN_IN: UNLIMITED,
    LIMIT_SIGN_IN_ADDRESS: UNLIMITED,
    LIMIT_REGISTER: UNLIMITED,
    LIMIT_COMPUTE_VISITOR: UNLIMITED,
    LIMIT_COMPUTE_ACCOUNT: UNLIMITED,
    LIMIT_SHARED_PLANS: UNLIMITED,
    ...settings,
  });
  const log = createLogger(process.env['TEST_LOG_LEVEL'] ?? 'silent');
  const database = connectDatabase(databaseUrl, 10, log);
  await migrate(database, databaseUrl);
  const services = createServices(database, config, log);
  const app = createApp(services, database, config, log);
  const server = await listen(app);
  const url = addressOf(server);
  return {
    url,
    app,
    services,
    databaseUrl,
    dataFolder,
    sql: (statement) => database.query(statement),
    visitor: () => ApiClient.open(url),
    newcomer: async () => register(await ApiClient.open(url)),
    close: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await services.importWorker.stop();
      await services.engine.close();
      await services.passwords.close();
      await database.close();
      await drop();
      rmSync(dataFolder, { recursive: true });
    },
  };
}

async function register(client: ApiClient): Promise<ApiClient> {
  accountsMade += 1;
  await client
    .post('/api/accounts', {
      email: `restorer${accountsMade}@example.org`,
      name: `Restorer ${accountsMade}`,
      password: 'amber dial glass',
    })
    .expect(201);
  return client;
}

const listen = (app: ReturnType<typeof createApp>): Promise<Server> =>
  new Promise((resolve) => {
    const server = app.listen(0, '127.0.0.1', () => resolve(server));
  });

function addressOf(server: Server): string {
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('The server has no port.');
  return `http://127.0.0.1:${address.port}`;
}
