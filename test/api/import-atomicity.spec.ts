import { randomUUID } from 'node:crypto';
import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';

import { createConnection } from 'mariadb';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';

import { EditionWriter } from '../../server/editions/edition-writer.ts';
import { failHopeless } from '../../server/imports/import-claims.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, rowsOf, settled, upload } from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());
afterEach(() => vi.restoreAllMocks());

async function checked(rows: number, regionId?: number) {
  const region = regionId ?? (await addRegion(librarian));
  const { path, id } = await upload(librarian, region, cleanList(rows));
  await librarian.put(path, { label: 'List' }).expect(200);
  return { path, id, regionId: region };
}

const stored = async () => [await rowsOf(server, 'editions'), await rowsOf(server, 'stations')];

/** Does something in the middle of storing: after the first thousands of rows were sent. */
function inTheMiddle(what: () => Promise<void>): void {
  const append = EditionWriter.prototype.append;
  let calls = 0;
  vi.spyOn(EditionWriter.prototype, 'append').mockImplementation(async function (
    this: EditionWriter,
    ...given
  ) {
    await append.apply(this, given);
    calls += 1;
    if (calls === 2) await what();
  });
}

/** Ends the connections to our database that have written much and not committed it. */
async function killWriters(): Promise<number[]> {
  const connection = await createConnection(server.databaseUrl);
  try {
    const writers = await connection.query<{ id: bigint }[]>(
      `SELECT trx_mysql_thread_id AS id FROM information_schema.innodb_trx
       JOIN information_schema.processlist ON processlist.id = trx_mysql_thread_id
       WHERE trx_rows_modified > 1000 AND db = DATABASE()`,
    );
    const ids = writers.map(({ id }) => Number(id));
    for (const id of ids) await connection.query(`KILL ${id}`);
    return ids;
  } finally {
    await connection.end();
  }
}

describe('storing a list', () => {
  it('that fails in the middle leaves nothing behind and can be tried again', async () => {
    const { path } = await checked(5000);
    const before = await stored();
    inTheMiddle(() => Promise.reject(new Error('the disk is on fire')));

    await librarian.post(`${path}/commit`).expect(202);

    expect(await settled(librarian, path)).toMatchObject({
      state: 'failed',
      editionId: null,
      reason: 'The list could not be stored, and nothing of it was. Commit it again.',
    });
    expect(await stored()).toEqual(before);

    vi.restoreAllMocks();
    await librarian.post(`${path}/commit`).expect(202);
    expect((await settled(librarian, path)).state).toBe('committed');
  });

  it('whose connection to the database is killed is begun anew and stored once', async () => {
    const { path } = await checked(5000);
    const [editions = 0, stations = 0] = await stored();
    const killed: number[] = [];
    inTheMiddle(async () => void killed.push(...(await killWriters())));

    await librarian.post(`${path}/commit`).expect(202);

    expect((await settled(librarian, path)).state).toBe('committed');
    expect(killed).toHaveLength(1);
    expect(await stored()).toEqual([editions + 1, stations + 5000]);
  });

  it('shows progress, and is taken back when it is cancelled meanwhile', async () => {
    const { path } = await checked(20_000);
    const before = await stored();
    let seen: { state: string } | undefined;
    inTheMiddle(async () => {
      seen = (await librarian.get(path).expect(200)).body as { state: string };
      await librarian.delete(path).expect(204);
    });

    await librarian.post(`${path}/commit`).expect(202);
    await vi.waitUntil(async () => (await librarian.get(path)).body.state === 'cancelled');
    await vi.waitUntil(async () => String(await stored()) === String(before));

    expect(seen?.state).toBe('committing');
    expect((await librarian.get(path)).body).toMatchObject({ state: 'cancelled', editionId: null });
    expect(await stored()).toEqual(before);
  });

  it('whose worker died is taken up by the next when its lease has ended', async () => {
    const { path, id, regionId } = await checked(10);
    await server.sql(
      `UPDATE imports SET state = 'committing', worker = '${randomUUID()}',
         committing_region_id = ${regionId}, attempts = 1, lease_until = NOW(3) + INTERVAL 9 SECOND
       WHERE id = ${id}`,
    );
    server.services.importWorker.wake();
    expect((await librarian.get(path).expect(200)).body.state).toBe('committing');

    await server.sql(`UPDATE imports SET lease_until = NOW(3) WHERE id = ${id}`);
    server.services.importWorker.wake();

    expect((await settled(librarian, path)).state).toBe('committed');
  });

  it('that no worker survives ends with a sentence and can be committed again', async () => {
    const { path, id, regionId } = await checked(10);
    await server.sql(
      `UPDATE imports SET state = 'committing', worker = '${randomUUID()}',
         committing_region_id = ${regionId}, attempts = 3, lease_until = NOW(3) WHERE id = ${id}`,
    );

    await failHopeless();

    const { body } = await librarian.get(path).expect(200);
    expect(body).toMatchObject({
      state: 'failed',
      reason: 'Storing the list was stopped each time. Nothing was stored; commit it again.',
    });
    await librarian.post(`${path}/commit`).expect(202);
    expect((await settled(librarian, path)).state).toBe('committed');
  });

  it('goes by the file where another machine keeps the spool of the check', async () => {
    const { path } = await checked(30);
    const folder = join(server.dataFolder, 'uploads');
    for (const name of readdirSync(folder)) {
      if (name.endsWith('.spool')) rmSync(join(folder, name));
    }

    await librarian.post(`${path}/commit`).expect(202);

    const { editionId } = await settled(librarian, path);
    expect(await rowsOf(server, `stations WHERE edition_id = ${editionId}`)).toBe(30);
    expect(readdirSync(folder).filter((name) => name.includes('.spool'))).toEqual([]);
  });

  it('does not block or lose the other of two commits at once', async () => {
    const first = await checked(3000);
    const second = await checked(3000, first.regionId);

    const answers = await Promise.all([
      librarian.post(`${first.path}/commit`),
      librarian.post(`${second.path}/commit`),
      librarian.post(`${first.path}/commit`),
    ]);

    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses).toEqual([202, 409, 409]);
    await settled(librarian, first.path);
    await settled(librarian, second.path);
    expect(await rowsOf(server, `editions WHERE region_id = ${first.regionId}`)).toBe(1);
  });

  it('holds the region: changing it meanwhile is refused, reading it is not', async () => {
    const { path, regionId } = await checked(5000);
    const statuses: number[] = [];
    inTheMiddle(async () => {
      const region = `/api/regions/${regionId}`;
      statuses.push((await librarian.get(region)).status);
      statuses.push((await librarian.put(region, { name: 'New', ituRegion: 1 })).status);
      statuses.push((await librarian.delete(region)).status);
    });

    await librarian.post(`${path}/commit`).expect(202);

    expect((await settled(librarian, path)).state).toBe('committed');
    expect(statuses).toEqual([200, 409, 409]);
  });
});
