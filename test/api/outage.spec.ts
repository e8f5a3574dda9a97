import { type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchMariaDB } from '../../server/dev/private-mariadb.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';

const folder = mkdtempSync(join(tmpdir(), 'fallow-outage-'));
const settings = {
  folder: join(folder, 'data'),
  password: 'outage',
  rights: 'own database',
  durable: true,
} as const;

let port: number;
let database: ChildProcess;
let server: ApiServer;
let person: ApiClient;

beforeAll(async () => {
  port = await anyFreePort('127.0.0.1');
  database = await launchMariaDB(settings, port);
  const url = databaseUrl(settings, port);
  server = await startApiServer({}, { url, drop: async () => undefined });
  person = await server.newcomer();
});
afterAll(async () => {
  await server.close();
  await endProcess(database, 10_000);
  rmSync(folder, { recursive: true });
});

describe('while the database is away', () => {
  it('the server lives, says so with 503, and is well again within two seconds', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver()).expect(201);
    await person.get('/readyz').expect(200, { status: 'ready' });

    const gone = once(database, 'exit');
    database.kill('SIGKILL');
    await gone;

    await person.get('/livez').expect(200);
    await person.get('/readyz').expect(503);
    for (let count = 0; count < 12; count += 1) {
      const { body, headers } = await person.get('/api/receivers').expect(503);
      expect(body.type).toBe('unavailable');
      expect(headers['retry-after']).toBe('1');
    }
    await person.post('/api/receivers', sentReceiver()).expect(503);

    database = await launchMariaDB(settings, port);
    const deadline = Date.now() + 2000;
    let status = 0;
    while (status !== 200 && Date.now() < deadline) {
      ({ status } = await person.get(`/api/receivers/${kept.id}`));
    }

    expect(status).toBe(200);
    const { body } = await person.get('/api/receivers').expect(200);
    expect(body.total).toBe(1);
  }, 60_000);
});
