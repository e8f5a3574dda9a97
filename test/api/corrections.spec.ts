import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import { correction } from '../../shared/contracts/correction.ts';
import type { ListedStation } from '../../shared/contracts/station-list.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { addRegion, HEADER, importList, rowsOf } from '../support/lists.ts';

const ROWS = [
  'Vale,909,50.0,8.0,10,1',
  'Abbey,612,50.5,8.0,5,5',
  'Chain,747,50.0,8.0,1,1',
  'Chain,747,55.0,8.0,1,1',
];
const LIST = [HEADER, ...ROWS].join('\n');
const PLACE = {
  latitude: 50.1,
  longitude: 8,
  ground: 'average',
  noise: 'rural',
  ituRegion: 1,
};
const BEACON = { name: 'Beacon', callSign: 'QB', frequencyHz: 455_000, powerDayW: 100 };

let server: ApiServer;
let people: Awaited<ReturnType<typeof club>>;
let regionId: number;
let editionId: number;
let path: string;

beforeAll(async () => {
  server = await startApiServer();
  people = await club(server);
});
afterAll(() => server.close());

beforeEach(async () => {
  regionId = await addRegion(people.librarian);
  editionId = await importList(people.librarian, regionId, LIST);
  path = `/api/regions/${regionId}/corrections`;
});

async function stations(query = '', id = editionId): Promise<ListedStation[]> {
  return (await people.member.get(`/api/editions/${id}/stations?${query}`).expect(200)).body.items;
}

async function idOf(name: string, latitude?: number): Promise<number> {
  const found = (await stations()).find(
    (each) => each.name === name && (latitude === undefined || each.latitude === latitude),
  );
  return found?.id ?? 0;
}

const add = async (body: object, who: ApiClient = people.librarian) =>
  correction.parse((await who.post(path, body).expect(201)).body);

const addBeacon = () => add({ kind: 'added', station: BEACON, note: 'Heard at the pier.' });

const fieldsOf = async (id = editionId) => {
  const { body } = await people.member
    .post('/api/field-strengths', { site: PLACE, editionId: id, period: 'day' })
    .expect(200);
  return body.fields as {
    name: string;
    station: number;
    fieldDb: number | null;
    notes: string[];
  }[];
};

describe('a correction', () => {
  it('ticks a station as off the air: it stays in the list, and computing passes over it', async () => {
    const kept = await add(
      {
        kind: 'off-air',
        stationId: await idOf('Vale'),
        date: '2026-11-30',
        note: 'Dead carrier.',
      },
      people.member,
    );

    const [vale] = await stations('search=Vale');
    const fields = await fieldsOf();

    expect(kept).toMatchObject({
      kind: 'off-air',
      stationId: vale?.id,
      date: '2026-11-30',
      editable: true,
    });
    expect(vale).toMatchObject({
      offAir: true,
      corrections: [{ kind: 'off-air', note: 'Dead carrier.' }],
    });
    expect(fields.find(({ name }) => name === 'Vale')).toMatchObject({
      fieldDb: null,
      notes: [expect.stringContaining('off the air')],
    });
  });

  it('gives the latest word by date', async () => {
    const stationId = await idOf('Vale');
    await add({ kind: 'heard', stationId, date: '2026-11-30' }, people.member);
    await add({ kind: 'off-air', stationId, date: '2026-10-01' }, people.member);

    const [vale] = await stations('search=Vale');

    expect(vale?.offAir).toBe(false);
    expect(vale?.corrections.map(({ kind }) => kind)).toEqual(['off-air', 'heard']);
  });

  it('adds the station the list lacks, in its place in every order, and computes with it', async () => {
    const { stationId } = await add({
      kind: 'added',
      station: { ...BEACON, latitude: 50.1, longitude: 8.1 },
    });

    const byFrequency = await stations();
    const byName = await stations('sort=name&pageSize=2');
    const byPower = await stations('sort=power');
    const fields = await fieldsOf();

    expect(byFrequency.map(({ name }) => name)).toEqual([
      'Beacon',
      'Abbey',
      'Chain',
      'Chain',
      'Vale',
    ]);
    expect(byFrequency[0]?.id).toBe(stationId);
    expect(byName.map(({ name }) => name)).toEqual(['Abbey', 'Beacon']);
    expect(byPower.at(-1)?.name).toBe('Beacon');
    expect(fields.find(({ station }) => station === stationId)?.fieldDb).toBeGreaterThan(40);
    expect((await stations('search=qb')).length).toBe(1);
    expect((await stations('fromHz=600000')).length).toBe(4);
  });

  it('changes a wrong row under its own id and leaves the import as it was', async () => {
    const stationId = await idOf('Abbey');
    const before = await fieldsOf();
    await add({ kind: 'changed', stationId, fields: { powerDayW: 50, frequencyHz: 1_000_000 } });

    const [abbey] = await stations('search=Abbey');
    const official = await stations('search=Abbey&corrections=none');
    const after = await fieldsOf();

    expect(abbey).toMatchObject({
      id: stationId,
      powerDayW: 50,
      powerNightW: 5000,
      onRaster: false,
    });
    expect(official).toMatchObject([{ id: stationId, powerDayW: 5000, corrections: [] }]);
    expect(after.map(({ name }) => name)).toEqual(before.map(({ name }) => name));
    const fieldOf = (fields: typeof after) =>
      fields.find(({ station }) => station === stationId)?.fieldDb;
    expect(fieldOf(after)).toBeLessThan((fieldOf(before) ?? 0) - 19);
    expect(
      await rowsOf(server, `stations WHERE edition_id = ${editionId} AND power_day_w = 50`),
    ).toBe(0);
    expect((await stations('only=corrected')).map(({ name }) => name)).toEqual(['Abbey']);
  });

  it('means the nearest of transmitters in step, in next year’s list too', async () => {
    await add({ kind: 'off-air', stationId: await idOf('Chain', 55) });
    const next = await importList(
      people.librarian,
      regionId,
      [HEADER, 'Chain,747,50.0,8.0,2,2', 'Chain,747,55.001,8.0,2,2'].join('\n'),
    );

    const silent = (await stations('', next)).filter(({ offAir }) => offAir);

    expect(silent.map(({ latitude }) => latitude)).toEqual([55.001]);
  });

  it('outlives the import it was made on, and an added station gives way to the official one', async () => {
    const { id } = await addBeacon();
    const { stationId } = await add({ kind: 'off-air', stationId: await idOf('Beacon') });
    const next = await importList(
      people.librarian,
      regionId,
      [HEADER + ',call_sign', 'Beacon,455,50.0,8.0,2,2,QB'].join('\n'),
    );
    const { body } = await people.member.get(`${path}?kind=added`).expect(200);

    const [beacon, ...others] = await stations('search=Beacon', next);

    expect(others).toEqual([]);
    expect(beacon?.id).not.toBe(stationId);
    expect(beacon).toMatchObject({ offAir: true, powerDayW: 2000 });
    expect(body).toMatchObject({
      total: 1,
      items: [{ id, stationId: beacon?.id, fields: BEACON }],
    });
  });

  it('is taken back whole', async () => {
    const { id } = await addBeacon();
    await add({ kind: 'heard', stationId: await idOf('Beacon') }, people.member);

    await people.librarian.delete(`${path}/${id}`).expect(204);

    expect((await people.member.get(path).expect(200)).body).toEqual({ items: [], total: 0 });
    expect(await stations('search=Beacon')).toEqual([]);
    await people.member.get(`${path}/${id}`).expect(404);
  });

  it('is changed by who made it or a librarian', async () => {
    const stationId = await idOf('Vale');
    const tick = await add({ kind: 'heard', stationId }, people.member);
    const edit = await add({ kind: 'changed', stationId, fields: { name: 'Vale 1' } });

    const { body } = await people.member
      .put(`${path}/${tick.id}`, { date: '2026-11-01', note: 'Weak.' })
      .expect(200);
    await people.librarian.put(`${path}/${edit.id}`, { fields: { name: 'Vale 2' } }).expect(200);

    expect(body).toMatchObject({ date: '2026-11-01', note: 'Weak.' });
    expect((await stations('search=Vale')).map(({ name }) => name)).toEqual(['Vale 2']);
    await people.member.put(`${path}/${edit.id}`, { note: '' }).expect(403);
    await people.member.delete(`${path}/${edit.id}`).expect(403);
    await people.member.delete(`${path}/${tick.id}`).expect(204);
  });

  it('that edits is a librarian’s', async () => {
    const stationId = await idOf('Vale');
    await people.member.post(path, { kind: 'added', station: BEACON }).expect(403);
    await people.member
      .post(path, { kind: 'changed', stationId, fields: { name: 'A' } })
      .expect(403);
  });

  it.each([
    ['kind', { kind: 'moved' }],
    ['stationId', { kind: 'heard', stationId: 1_000_000_000 }],
    ['station.name', { kind: 'added', station: { frequencyHz: 455_000 } }],
    ['station.frequencyHz', { kind: 'added', station: { name: 'A', frequencyHz: 5 } }],
    [
      'station.longitude',
      { kind: 'added', station: { name: 'A', frequencyHz: 5000, latitude: 1 } },
    ],
    ['fields', { kind: 'changed', stationId: 1, fields: {} }],
    ['fields.longitude', { kind: 'changed', stationId: 1, fields: { latitude: 1 } }],
    ['date', { kind: 'heard', stationId: 1, date: 'today' }],
    ['colour', { kind: 'heard', stationId: 1, colour: 'red' }],
  ])('with a bad %s is refused, and it is named', async (at, body) => {
    const answer = await people.librarian.post(path, body).expect(400);

    expect(answer.body.issues[0].path).toBe(at);
  });

  it('refuses a change that is not of its kind', async () => {
    const { id } = await addBeacon();
    const { body } = await people.librarian
      .put(`${path}/${id}`, { fields: { name: 'A' } })
      .expect(400);

    expect(body.issues[0].path).toBe('fields');
  });

  it('is not there for another workshop', async () => {
    const { id } = await addBeacon();
    const stranger = await server.newcomer();

    await stranger.get(path).expect(404);
    await stranger.get(`${path}/${id}`).expect(404);
    await stranger.post(path, { kind: 'added', station: BEACON }).expect(404);
    await stranger.put(`${path}/${id}`, { note: '' }).expect(404);
    await stranger.delete(`${path}/${id}`).expect(404);
  });
});
