import { readdirSync } from 'node:fs';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList, sendList, settled, upload } from '../support/lists.ts';

const WITH_A_BAD_ROW = `${cleanList(5)}\nRadio Nowhere,never,50,8,1,1`;

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());

const kept = () => readdirSync(join(server.dataFolder, 'uploads'));

async function committed(regionId: number, content: string) {
  const { path } = await upload(librarian, regionId, content);
  await librarian.put(path, {}).expect(200);
  await librarian.post(`${path}/commit`).expect(202);
  expect((await settled(librarian, path)).state).toBe('committed');
  return path;
}

describe('the file of a stored list', () => {
  it('leaves the disk at once where no row was rejected', async () => {
    const path = await committed(await addRegion(librarian), cleanList(5));

    await vi.waitUntil(() => kept().length === 0);
    const { text } = await librarian.get(`${path}/rejects`).expect(200);

    expect(text.trim().split(/\r?\n/)).toHaveLength(1);
  });

  it('stays for the download of its rejected rows, for a week', async () => {
    const path = await committed(await addRegion(librarian), WITH_A_BAD_ROW);
    const { text } = await librarian.get(`${path}/rejects`).expect(200);
    expect(text).toContain('Radio Nowhere');
    const [file = ''] = kept();

    await server.services.uploads.remove(file);
    const { body } = await librarian.get(`${path}/rejects`).expect(409);

    expect(body.title).toContain('until 7 days after the list was stored');
  });
});

describe('open imports', () => {
  it('are limited for all regions of a workshop together', async () => {
    const other = await server.newcomer();
    const regions = [await addRegion(other, 'One'), await addRegion(other, 'Two')];
    const first = await upload(other, regions[0] ?? 0, cleanList(1));
    for (let count = 1; count < 20; count++) {
      await sendList(other, regions[count % 2] ?? 0, cleanList(1)).expect(201);
    }

    const { body } = await sendList(other, regions[0] ?? 0, cleanList(1)).expect(409);
    expect(body.title).toContain('This workshop has 20 imports');

    await other.delete(first.path).expect(204);
    await sendList(other, regions[1] ?? 0, cleanList(1)).expect(201);
  });
});

describe('a list that completes an edition', () => {
  it('is refused once that edition is gone', async () => {
    const regionId = await addRegion(librarian);
    const old = await importList(librarian, regionId, cleanList(5), 'Old');
    await importList(librarian, regionId, cleanList(6), 'New');
    const { path } = await upload(librarian, regionId, cleanList(7));
    await librarian.put(path, { addsTo: old }).expect(200);
    await librarian.delete(`/api/editions/${old}`).expect(204);

    const { body } = await librarian.post(`${path}/commit`).expect(409);

    expect(body.title).toContain('no longer there. Check the list again.');
  });
});
