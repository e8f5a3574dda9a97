import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import {
  type ListedStation,
  listedStation,
  type StationPlaces,
  stationPlaces,
} from '../../shared/contracts/station-list.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, HEADER, importList } from '../support/lists.ts';

const LIST = [
  HEADER,
  'Vale,909,50.0,8.0,10,0',
  'Abbey,612,50.5,8.0,5,5',
  'Brook,1215,53.0,8.0,200,100',
  'Crag,612.5,,,1,1',
  'Dune,918,50.2,8.1,,',
  'Éclair,1503,51.0,9.0,0.5,0',
].join('\n');

let server: ApiServer;
let person: ApiClient;
let editionId: number;
let site: number;

beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
  editionId = await importList(person, await addRegion(person), LIST);
  site = await addSite(person);
});
afterAll(() => server.close());

async function addSite(client: ApiClient): Promise<number> {
  const place = { latitude: 50.1, longitude: 8, ground: 'average', noise: 'rural', ituRegion: 1 };
  return (await client.post('/api/sites', { name: 'Attic', ...place }).expect(201)).body.id;
}

async function asked(query: string, id = editionId): Promise<ListedStation[]> {
  const { body } = await person.get(`/api/editions/${id}/stations?${query}`).expect(200);
  return body.items.map((item: unknown) => listedStation.parse(item));
}

const names = async (query: string): Promise<string[]> =>
  (await asked(query)).map(({ name }) => name);

describe('GET /api/editions/:id/stations', () => {
  it.each([
    ['', ['Abbey', 'Crag', 'Vale', 'Dune', 'Brook', 'Éclair']],
    ['direction=desc', ['Éclair', 'Brook', 'Dune', 'Vale', 'Crag', 'Abbey']],
    ['sort=name', ['Abbey', 'Brook', 'Crag', 'Dune', 'Éclair', 'Vale']],
    ['sort=power', ['Brook', 'Vale', 'Abbey', 'Crag', 'Éclair', 'Dune']],
    ['sort=power&direction=asc', ['Dune', 'Éclair', 'Crag', 'Abbey', 'Vale', 'Brook']],
    ['search=bro', ['Brook']],
    ['search=612', ['Abbey']],
    ['search=612,5 kHz', ['Crag']],
    ['fromHz=900000&toHz=1215000', ['Vale', 'Dune', 'Brook']],
    ['only=off-raster', ['Crag']],
    ['only=without-place', ['Crag']],
    ['only=without-power', ['Dune']],
    ['only=corrected', []],
  ])('with "%s" finds and orders', async (query, expected) => {
    expect(await names(query)).toEqual(expected);
  });

  it('with a site says how far and how strong each is there, as the computing calls do', async () => {
    const items = await asked(`site=${site}&period=day`);
    const { body: stored } = await person.get(`/api/sites/${site}`).expect(200);
    const { id: _id, editable: _editable, name: _name, ...place } = stored;

    const { body } = await person
      .post('/api/field-strengths', { site: place, editionId, period: 'day' })
      .expect(200);

    const byId = new Map(
      body.fields.map((field: { station: number }) => [field.station, field] as const),
    );
    for (const { id, distanceM, fieldDb } of items) {
      expect({ distanceM, fieldDb }).toEqual({
        distanceM: (byId.get(id) as ListedStation).distanceM,
        fieldDb: (byId.get(id) as ListedStation).fieldDb,
      });
    }
  });

  it.each([
    ['sort=distance', ['Vale', 'Dune', 'Abbey', 'Éclair', 'Brook', 'Crag']],
    ['sort=distance&direction=desc', ['Brook', 'Éclair', 'Abbey', 'Dune', 'Vale', 'Crag']],
    ['maxDistanceM=50000', ['Abbey', 'Vale', 'Dune']],
    ['maxDistanceM=50000&sort=name', ['Abbey', 'Dune', 'Vale']],
    ['maxDistanceM=50000&sort=power', ['Vale', 'Abbey', 'Dune']],
    ['maxDistanceM=50000&search=e&fromHz=900000', ['Vale', 'Dune']],
    ['minFieldDb=60&period=day&sort=field', ['Vale', 'Abbey']],
  ])('with a site and "%s" picks by what is received', async (query, expected) => {
    expect(await names(`site=${site}&${query}`)).toEqual(expected);
  });

  it('orders by the field of the period that is asked for', async () => {
    const day = await asked(`site=${site}&sort=field&period=day`);
    const night = await asked(`site=${site}&sort=field&period=night`);

    expect(day[0]?.name).toBe('Vale');
    expect(night[0]?.name).toBe('Abbey');
    expect(night.map(({ fieldDb }) => fieldDb)).toEqual(
      night.map(({ fieldDb }) => fieldDb).sort((a, b) => (b ?? -1e9) - (a ?? -1e9)),
    );
  });

  it.each(['', `site=@&sort=distance&`, `site=@&maxDistanceM=20000000&sort=name&`])(
    'with "%s" gives every station once over its pages, deep ones too',
    async (query) => {
      const id = await importList(person, await addRegion(person), cleanList(12_345));
      const asking = `${query.replace('@', String(site))}pageSize=500`;
      const seen = new Set<number>();
      for (const page of [25, 1, 11, 24, 2, 10, 12, 21, 20]) {
        for (const { id: each } of await asked(`${asking}&page=${page}`, id)) seen.add(each);
      }
      const { body } = await person.get(`/api/editions/${id}/stations?${asking}`).expect(200);

      expect(seen.size).toBe(8 * 500 + 345);
      expect(body.total).toBe(12_345);
      expect(await asked(`${asking}&page=26`, id)).toEqual([]);
    },
  );

  it.each([
    ['sort', 'sort=distance'],
    ['maxDistanceM', 'maxDistanceM=5'],
    ['minFieldDb', 'minFieldDb=5'],
    ['sort', 'sort=colour'],
    ['only', 'only=red'],
    ['fromHz', 'fromHz=low'],
    ['direction', 'direction=up'],
    ['colour', 'colour=red'],
    ['page', 'page=0'],
  ])('with a bad %s answers 400 and names it', async (path, query) => {
    const { body } = await person.get(`/api/editions/${editionId}/stations?${query}`).expect(400);

    expect(body.issues[0].path).toBe(path);
  });

  it('knows no site and no edition of another workshop', async () => {
    const stranger = await server.newcomer();
    const theirs = await addSite(stranger);

    await person.get(`/api/editions/${editionId}/stations?site=${theirs}`).expect(404);
    await stranger.get(`/api/editions/${editionId}/stations?site=${theirs}`).expect(404);
    await stranger.get(`/api/editions/${editionId}/stations.csv`).expect(404);
  });
});

describe('GET /api/editions/:id/stations/places', () => {
  const placesAsked = async (query: string): Promise<StationPlaces> => {
    const { body } = await person
      .get(`/api/editions/${editionId}/stations/places?${query}`)
      .expect(200);
    return stationPlaces.parse(body);
  };

  it('gives the strongest first, by power without a site, and says how many have no place', async () => {
    const { items, total, withoutPlace } = await placesAsked('');

    expect(items.map(({ name }) => name)).toEqual(['Brook', 'Vale', 'Abbey', 'Éclair', 'Dune']);
    expect(items[0]).toMatchObject({ powerDayW: 200_000, onRaster: true, fieldDb: null });
    expect({ total, withoutPlace }).toEqual({ total: 6, withoutPlace: 1 });
  });

  it('at a site gives the fields and distances that the list gives', async () => {
    const listed = new Map((await asked(`site=${site}&period=day`)).map((each) => [each.id, each]));

    const { items } = await placesAsked(`site=${site}&period=day`);

    expect(items).toHaveLength(5);
    for (const { id, fieldDb, distanceM } of items) {
      const each = listed.get(id);
      expect(fieldDb ?? -999).toBeCloseTo(each?.fieldDb ?? -999, 1);
      expect(distanceM ?? -999).toBeCloseTo(each?.distanceM ?? -999, -2);
    }
  });

  it('takes the filter of the list', async () => {
    const { items } = await placesAsked(`site=${site}&maxDistanceM=20000&fromHz=910000`);

    expect(items.map(({ name }) => name)).toEqual(['Dune']);
    await person.get(`/api/editions/${editionId}/stations/places?maxDistanceM=20000`).expect(400);
  });
});

describe('GET /api/editions/:id/stations/:stationId', () => {
  it('says of one station what the list says of it', async () => {
    const [first] = await asked(`site=${site}&search=abbey`);

    const { body } = await person
      .get(`/api/editions/${editionId}/stations/${first?.id}?site=${site}`)
      .expect(200);

    expect(listedStation.parse(body)).toEqual(first);
    await person.get(`/api/editions/${editionId}/stations/999999`).expect(404);
  });

  it('keeps the imported values of a changed one beside the corrected', async () => {
    const { body: edition } = await person.get(`/api/editions/${editionId}`).expect(200);
    const [dune] = await asked('search=dune');
    const fields = { powerDayW: 2000, powerNightW: 500 };
    const { body: made } = await person
      .post(`/api/regions/${edition.regionId}/corrections`, {
        kind: 'changed',
        stationId: dune?.id,
        fields,
      })
      .expect(201);

    const { body } = await person.get(`/api/editions/${editionId}/stations/${dune?.id}`);
    const [listed] = await asked('search=dune');
    await person.delete(`/api/regions/${edition.regionId}/corrections/${made.id}`).expect(204);

    expect(body).toMatchObject({ ...fields, official: { powerDayW: null, powerNightW: null } });
    expect(listed?.official).toMatchObject({ name: 'Dune', powerDayW: null });
  });
});
