import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';

import { type SuppliedRaster, suppliedRaster } from '../../shared/contracts/raster.ts';
import { region } from '../../shared/contracts/region.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { addRegion, cleanList, importList, rowsOf } from '../support/lists.ts';

let server: ApiServer;
let admin: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  admin = await server.newcomer();
});
afterAll(() => server.close());

describe('POST /api/regions', () => {
  it.each([
    [1, [153_000, 531_000]],
    [2, [540_000]],
    [3, [153_000, 531_000]],
  ])('in ITU Region %i without a raster takes the Region’s own', async (ituRegion, lows) => {
    const { body } = await admin.post('/api/regions', { name: 'Vale', ituRegion }).expect(201);

    expect(region.parse(body)).toMatchObject({ name: 'Vale', editable: true, editions: 0 });
    expect(body.raster.map(({ lowHz }: { lowHz: number }) => lowHz)).toEqual(lows);
    await admin.get(`/api/regions/${body.id}`).expect(200, body);
  });

  it.each([
    ['name', { name: ' ' }],
    ['ituRegion', { ituRegion: 4 }],
    ['raster.0.highHz', { raster: [{ lowHz: 600_000, highHz: 500_000, stepHz: 9000 }] }],
    ['raster.0.stepHz', { raster: [{ lowHz: 500_000, highHz: 600_000, stepHz: 0 }] }],
    ['raster.0.stepHz', { raster: [{ lowHz: 500_000, highHz: 600_000, stepHz: 9000 }] }],
    [
      'raster.1.lowHz',
      {
        raster: [
          { lowHz: 500_000, highHz: 600_000, stepHz: 10_000 },
          { lowHz: 600_000, highHz: 700_000, stepHz: 10_000 },
        ],
      },
    ],
    ['rasters', { rasters: [] }],
    ['rasters.0.from', { rasters: [{ from: 'ever', ranges: [] }] }],
    [
      'rasters.1.from',
      {
        rasters: [
          { from: null, ranges: [] },
          { from: null, ranges: [] },
        ],
      },
    ],
    ['rasters', { raster: [], rasters: [{ from: null, ranges: [] }] }],
    ['colour', { colour: 'green' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const draft = { name: 'Vale', ituRegion: 1, ...change };

    const { body } = await admin.post('/api/regions', draft).expect(400);

    expect(body.issues[0].path).toBe(path);
  });
});

describe('a region', () => {
  it('is changed and removed with its editions', async () => {
    const id = await addRegion(admin, 'Old name');
    const editionId = await importList(admin, id, cleanList(10));
    const raster = [{ lowHz: 500_000, highHz: 1_600_000, stepHz: 10_000 }];

    const changed = await admin.put(`/api/regions/${id}`, { name: 'New', ituRegion: 2, raster });
    await admin.delete(`/api/regions/${id}`).expect(204);

    expect(changed.body).toMatchObject({ name: 'New', ituRegion: 2, raster, editions: 1 });
    await admin.get(`/api/regions/${id}`).expect(404);
    await admin.get(`/api/editions/${editionId}`).expect(404);
    server.services.importWorker.wake(); // As it does by itself in a process of its own.
    const left = () => rowsOf(server, `stations WHERE edition_id = ${editionId}`);
    await vi.waitUntil(async () => (await left()) === 0);
  });

  it('keeps dated rasters until others are given or the ITU Region changes', async () => {
    const path = `/api/regions/${await addRegion(admin)}`;
    const wide = [{ lowHz: 540_000, highHz: 1_600_000, stepHz: 10_000 }];
    const rasters = [
      { from: '2000-01-01', ranges: [] },
      { from: null, ranges: wide },
    ];
    const put = async (change: object) =>
      (await admin.put(path, { name: 'Vale', ituRegion: 1, ...change }).expect(200)).body;

    const dated = await put({ rasters });
    const renamed = await put({ name: 'Dale' });
    const single = await put({ raster: wide });
    const moved = await put({ ituRegion: 2 });

    expect(dated).toMatchObject({ raster: [], rasters: [rasters[1], rasters[0]] });
    expect(renamed.rasters).toEqual(dated.rasters);
    expect(single).toMatchObject({ raster: wide, rasters: [{ from: null, ranges: wide }] });
    expect(moved.raster).toMatchObject([{ highHz: 1_700_000 }]);
  });

  it('of another workshop is not there', async () => {
    const id = await addRegion(admin);
    const editionId = await importList(admin, id, cleanList(2));
    const stranger = await server.newcomer();

    const draft = { name: 'Mine', ituRegion: 1 };
    await stranger.get(`/api/regions/${id}`).expect(404);
    await stranger.put(`/api/regions/${id}`, draft).expect(404);
    await stranger.delete(`/api/regions/${id}`).expect(404);
    await stranger.get(`/api/regions/${id}/editions`).expect(404);
    await stranger.get(`/api/editions/${editionId}`).expect(404);
    await stranger.get(`/api/editions/${editionId}/stations`).expect(404);
    const { body } = await stranger.get('/api/editions').expect(200);
    expect(body).toEqual({ items: [], total: 0 });
  });

  it('is read by members and changed by librarians', async () => {
    const { member, librarian } = await club(server);
    const id = await addRegion(librarian);

    const { body } = await member.get(`/api/regions/${id}`).expect(200);
    expect(body.editable).toBe(false);
    await member.post('/api/regions', { name: 'Mine', ituRegion: 1 }).expect(403);
    await member.put(`/api/regions/${id}`, { name: 'Mine', ituRegion: 1 }).expect(403);
    await member.delete(`/api/regions/${id}`).expect(403);
  });
});

describe('GET /api/rasters', () => {
  it('offers those of the ITU Regions with their source, the latest as regions begin with', async () => {
    const { body } = await admin.get('/api/rasters').expect(200);
    const supplied: SuppliedRaster[] = body.items.map((each: unknown) =>
      suppliedRaster.parse(each),
    );

    expect(supplied).toHaveLength(body.total);
    for (const ituRegion of [1, 2, 3] as const) {
      const latest = supplied.filter(({ ituRegions }) => ituRegions.includes(ituRegion)).at(-1);
      expect(latest?.ranges).toEqual(defaultRaster(ituRegion));
      expect(latest?.source).toContain('ITU');
    }
    await (await server.visitor()).get('/api/rasters').expect(401);
  });
});

describe('GET /api/editions', () => {
  it('lists those of all regions, the newest first, by pages', async () => {
    const person = await server.newcomer();
    const [vale, coast] = [await addRegion(person, 'Vale'), await addRegion(person, 'Coast')];
    await importList(person, vale, cleanList(1), 'First');
    await importList(person, coast, cleanList(2), 'Second');

    const { body } = await person.get('/api/editions?pageSize=1').expect(200);
    const { body: second } = await person.get('/api/editions?pageSize=1&page=2').expect(200);
    const { body: ofVale } = await person.get(`/api/regions/${vale}/editions`).expect(200);

    expect(body).toMatchObject({ total: 2, items: [{ label: 'Second', regionName: 'Coast' }] });
    expect(second.items).toMatchObject([{ label: 'First', regionName: 'Vale', stations: 1 }]);
    expect(ofVale.total).toBe(1);
    await person.get('/api/editions?page=0').expect(400);
    await person.get('/api/editions?colour=red').expect(400);
  });
});
