import { readdirSync, readFileSync } from 'node:fs';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { importCheck } from '../../shared/contracts/list-import.ts';
import type { ListedStation } from '../../shared/contracts/station-list.ts';
import { LISTS } from '../lists/expected.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, settled, upload } from '../support/lists.ts';

const FOLDER = new URL('../lists/', import.meta.url);
const contentOf = (file: string) => readFileSync(new URL(file, FOLDER));
const NOTHING = {
  changed: 0,
  same: 0,
  rejected: 0,
  duplicate: 0,
  merged: 0,
  gone: 0,
  kept: 0,
  offRaster: 0,
  withoutPlace: 0,
  withoutPower: 0,
};

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());

/** Brings a file in whole and answers the id of its edition. */
async function store(path: string): Promise<number> {
  await librarian.post(`${path}/commit`).expect(202);
  const { state, editionId } = await settled(librarian, path);
  expect(state).toBe('committed');
  return editionId ?? 0;
}

describe('a list in the shape of', () => {
  it.each(LISTS.map((list) => [list.file, list] as const))('%s', async (file, list) => {
    const regionId = await addRegion(librarian);
    const { path, ...proposal } = await upload(librarian, regionId, contentOf(file));
    expect(proposal).toMatchObject({ ...list.found, complete: list.asks === undefined });
    if (list.asks) {
      const { body } = await librarian.put(path, {}).expect(400);
      expect(body.issues.map((issue: { path: string }) => issue.path)).toEqual(list.asks);
    }

    const checked = await librarian.put(path, list.answers ?? {}).expect(200);
    const { rows, remarks, causes } = importCheck.parse(checked.body);
    expect(rows).toEqual({ ...NOTHING, ...list.rows });
    expect(remarks).toHaveLength(list.remarks?.length ?? 0);
    for (const [message, count] of list.remarks ?? []) {
      expect(remarks.find((each) => message.test(each.message))?.count).toBe(count);
    }
    expect(causes.length > 0).toBe(rows.rejected > 0);

    const editionId = await store(path);
    const { body } = await librarian.get(`/api/editions/${editionId}/stations`).expect(200);
    const found = (body.items as ListedStation[]).map((station) => [
      station.name || station.callSign,
      station.frequencyHz,
      station.latitude,
      station.longitude,
      station.powerDayW,
      station.powerNightW,
    ]);
    expect(found).toEqual(list.stations);
  });

  it('each file of the folder has an expectation', () => {
    const files = readdirSync(FOLDER).filter((name) => /\.(csv|txt)$/.test(name));

    expect(LISTS.map(({ file }) => file)).toEqual(files.sort());
  });
});
