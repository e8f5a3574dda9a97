import { once } from 'node:events';

import { createConnection } from 'mariadb';
import { afterAll, afterEach, beforeAll, expect, it, vi } from 'vitest';

import { ApiClient } from '../support/api-client.ts';
import { addRegion, cleanList, settled, upload } from '../support/lists.ts';
import { listening, type ServerProcesses, serverProcesses } from '../support/server-process.ts';

const credentials = { email: 'ada@example.org', password: 'a soldering iron' };
let processes: ServerProcesses;
beforeAll(async () => {
  processes = await serverProcesses();
});
afterEach(() => processes.stopAll());
afterAll(() => processes.remove());

async function sql<T>(statement: string): Promise<T> {
  const connection = await createConnection(processes.databaseUrl);
  try {
    return await connection.query<T>(statement);
  } finally {
    await connection.end();
  }
}

const count = async (table: string): Promise<number> =>
  Number((await sql<{ n: bigint }[]>(`SELECT COUNT(*) AS n FROM ${table}`))[0]?.n);

const ENOUGH = { timeout: 120_000 };

it('a server killed while it stores a list leaves nothing, another stores it', ENOUGH, async () => {
  const doomed = processes.start();
  const person = await ApiClient.open((await listening(doomed)).url);
  await person.post('/api/accounts', { ...credentials, name: 'Ada' }).expect(201);
  const { path } = await upload(person, await addRegion(person), cleanList(40_000));
  await person.put(path, { label: 'List' }).expect(200);

  await person.post(`${path}/commit`).expect(202);
  await vi.waitUntil(async () => (await person.get(path)).body.progress > 0, {
    timeout: 60_000,
    interval: 10,
  });
  doomed.child.kill('SIGKILL');
  await once(doomed.child, 'exit');

  const other = await ApiClient.open((await listening(processes.start())).url);
  await other.post('/api/session', credentials).expect(200);
  expect([await count('editions'), await count('stations')]).toEqual([0, 0]);
  await sql('UPDATE imports SET lease_until = NOW(3) - INTERVAL 1 SECOND');
  expect((await other.get(path).expect(200)).body).toMatchObject({
    state: 'failed',
    editionId: null,
  });

  await other.post(`${path}/commit`).expect(202);
  expect(await settled(other, path)).toMatchObject({ state: 'committed', progress: 1 });
  expect([await count('editions'), await count('stations')]).toEqual([1, 40_000]);
});
