import { createConnection } from 'mariadb';
import { expect, vi } from 'vitest';

import {
  type ImportProposal,
  importProposal,
  importState,
} from '../../shared/contracts/list-import.ts';
import type { ApiClient, Reply } from './api-client.ts';
import type { ApiServer } from './api-server.ts';

export const HEADER = 'name,frequency_khz,latitude,longitude,power_day_kw,power_night_kw';

/** A clean list of invented stations, each on a frequency and at a place of its own. */
export const cleanList = (rows: number): string =>
  [
    HEADER,
    ...Array.from(
      { length: rows },
      (_, index) =>
        `Radio Vale ${index},${531 + 9 * (index % 120)},${(50 + index / 1e4).toFixed(4)},` +
        `${(8 + index / 1e4).toFixed(4)},${1 + (index % 50)},${(index % 5) / 10}`,
    ),
  ].join('\n');

/** A region of the client's workshop. */
export async function addRegion(client: ApiClient, name = 'Vale'): Promise<number> {
  const { body } = await client.post('/api/regions', { name, ituRegion: 1 }).expect(201);
  return body.id as number;
}

/** Sends a file to a region's imports, in the field a browser would use. */
export const sendList = (
  client: ApiClient,
  regionId: number,
  content: string | Buffer,
  name = 'vale.csv',
): Reply =>
  client
    .change('post', `/api/regions/${regionId}/imports`)
    .attach('file', Buffer.from(content), name);

export async function upload(
  client: ApiClient,
  regionId: number,
  content: string | Buffer,
): Promise<ImportProposal & { path: string }> {
  const { body } = await sendList(client, regionId, content).expect(201);
  const proposal = importProposal.parse(body);
  return { ...proposal, path: `/api/regions/${regionId}/imports/${proposal.id}` };
}

/** Waits until an import has reached a state it stays in. */
export async function settled(client: ApiClient, path: string) {
  const state = async () => importState.parse((await client.get(path).expect(200)).body);
  const isSettled = async () => (await state()).state !== 'committing';
  await vi.waitUntil(isSettled, { timeout: 60_000, interval: 20 });
  return state();
}

/** Brings a list in whole and answers the id of its edition. */
export async function importList(
  client: ApiClient,
  regionId: number,
  content: string | Buffer,
  label = 'Spring list',
): Promise<number> {
  const { path } = await upload(client, regionId, content);
  await client.put(path, { label }).expect(200);
  await client.post(`${path}/commit`).expect(202);
  const { state, editionId } = await settled(client, path);
  expect(state).toBe('committed');
  return editionId as number;
}

/** Number of rows of a table, counted behind the server's back. */
export async function rowsOf(server: ApiServer, tableAndCondition: string): Promise<number> {
  const connection = await createConnection(server.databaseUrl);
  try {
    const sql = `SELECT COUNT(*) AS n FROM ${tableAndCondition}`;
    const [row] = await connection.query<{ n: bigint }[]>(sql);
    return Number(row?.n);
  } finally {
    await connection.end();
  }
}
