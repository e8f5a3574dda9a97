import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';

import { importCheck, importState } from '../../shared/contracts/list-import.ts';
import { listedStation } from '../../shared/contracts/station-list.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import {
  addRegion,
  cleanList,
  HEADER,
  importList,
  rowsOf,
  settled,
  upload,
} from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());

const uploadsKept = () => readdirSync(join(server.dataFolder, 'uploads')).length;

describe('a clean list', () => {
  it('goes in whole: proposed, checked, committed, listed', async () => {
    const regionId = await addRegion(librarian);

    const { path, ...proposal } = await upload(librarian, regionId, cleanList(120));
    expect(proposal).toMatchObject({
      encoding: 'UTF-8',
      delimiter: ',',
      decimalMark: '.',
      complete: true,
    });
    expect(proposal.columns.map(({ field, unit }) => [field, unit])).toEqual([
      ['name', null],
      ['frequency', 'kHz'],
      ['latitude', 'degrees'],
      ['longitude', 'degrees'],
      ['powerDay', 'kW'],
      ['powerNight', 'kW'],
    ]);

    const { body: check } = await librarian
      .put(path, { label: 'Spring list', date: '2026-03-01' })
      .expect(200);
    const nothing = { changed: 0, same: 0, rejected: 0, duplicate: 0, merged: 0, gone: 0, kept: 0 };
    expect(importCheck.parse(check)).toEqual({
      rows: {
        total: 120,
        new: 120,
        ...nothing,
        offRaster: 0,
        withoutPlace: 0,
        withoutPower: 0,
      },
      faults: [],
      causes: [],
      remarks: [],
    });
    const nothingYet = await librarian.get(`/api/regions/${regionId}/editions`).expect(200);
    expect(nothingYet.body).toEqual({ items: [], total: 0 });

    await librarian.post(`${path}/commit`).expect(202);
    const state = importState.parse(await settled(librarian, path));
    expect(state).toMatchObject({ state: 'committed', progress: 1, reason: null });

    const { body: edition } = await librarian.get(`/api/editions/${state.editionId}`).expect(200);
    expect(edition).toMatchObject({
      regionId,
      regionName: 'Vale',
      label: 'Spring list',
      date: '2026-03-01',
      source: 'vale.csv',
      stations: 120,
    });
    const { body: page } = await librarian
      .get(`/api/editions/${state.editionId}/stations?pageSize=1&page=2`)
      .expect(200);
    expect(page.total).toBe(120);
    expect(listedStation.parse(page.items[0])).toMatchObject({
      name: 'Radio Vale 1',
      frequencyHz: 540_000,
      latitude: 50.0001,
      longitude: 8.0001,
      powerDayW: 2000,
      powerNightW: 100,
      onRaster: true,
    });
  });

  it('is found by name, call sign or frequency', async () => {
    const regionId = await addRegion(librarian);
    const list =
      'name,call_sign,frequency_khz\nNorth Mill,XQA,531\nSouth Mill,XQB,612.5\n50%,XQC,999';
    const editionId = await importList(librarian, regionId, list);
    const names = async (search: string) => {
      const query = new URLSearchParams({ search });
      const { body } = await librarian
        .get(`/api/editions/${editionId}/stations?${query}`)
        .expect(200);
      return body.items.map(({ name }: { name: string }) => name);
    };

    expect(await names('mill')).toEqual(['North Mill', 'South Mill']);
    expect(await names('xqb')).toEqual(['South Mill']);
    expect(await names('612,5 kHz')).toEqual(['South Mill']);
    expect(await names('0.531 MHz')).toEqual(['North Mill']);
    expect(await names('0%')).toEqual(['50%']);
  });

  it('of 20,000 rows goes in', async () => {
    const regionId = await addRegion(librarian);

    const editionId = await importList(librarian, regionId, cleanList(20_000));

    const { body } = await librarian.get(`/api/editions/${editionId}`).expect(200);
    expect(body.stations).toBe(20_000);
  });

  it('without labels and dates is called as its file, dated today', async () => {
    const { path } = await upload(librarian, await addRegion(librarian), cleanList(1));

    await librarian.put(path, {}).expect(200);

    const { body } = await librarian.get(path).expect(200);
    expect(body.label).toBe('vale');
    expect(body.date).toBe(new Date().toISOString().slice(0, 10));
  });
});

describe('a list from another desk', () => {
  it('in Windows-1252 with semicolons and decimal commas is read as it was meant', async () => {
    const text =
      'Frequency (kHz);Station;Latitude;Longitude;Power day (kW);Power night (kW)\r\n' +
      '612,5;Mühlenbach Süd;48,1234;11,5678;10,5;1\r\n' +
      '1.359;Größenfeld;48,5;11,25;0,25;0\r\n';
    const regionId = await addRegion(librarian);

    const { path, ...proposal } = await upload(librarian, regionId, Buffer.from(text, 'latin1'));
    expect(proposal).toMatchObject({
      encoding: 'windows-1252',
      delimiter: ';',
      decimalMark: ',',
      complete: true,
    });
    await librarian.put(path, { label: 'List' }).expect(200);
    await librarian.post(`${path}/commit`).expect(202);
    const { editionId } = await settled(librarian, path);

    const { body } = await librarian.get(`/api/editions/${editionId}/stations`).expect(200);
    expect(body.items).toMatchObject([
      { name: 'Mühlenbach Süd', frequencyHz: 612_500, latitude: 48.1234, powerDayW: 10_500 },
      { name: 'Größenfeld', frequencyHz: 1_359_000, powerDayW: 250, powerNightW: 0 },
    ]);
  });

  it('whose unit is not told is asked about, never guessed', async () => {
    const regionId = await addRegion(librarian);
    const { path, complete } = await upload(librarian, regionId, 'station,frequency\nMill,612\n');

    const { body } = await librarian.put(path, { label: 'List' }).expect(400);
    const answered = await librarian.put(path, {
      label: 'List',
      columns: [
        { header: 'station', field: 'name', unit: null },
        { header: 'frequency', field: 'frequency', unit: 'kHz' },
      ],
    });

    expect(complete).toBe(false);
    expect(body.issues).toEqual([
      {
        path: 'columns.1.unit',
        message: 'Say in which unit "frequency" is given. Possible: kHz, MHz, Hz.',
      },
    ]);
    expect(answered.status).toBe(200);
    expect(answered.body.rows.new).toBe(1);
  });

  it('answers for a column it does not have, a doubled field and an unknown key', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, cleanList(1));
    const columns = [
      { header: 'colour', field: 'name' },
      { header: 'frequency_khz', field: 'frequency', unit: 'kHz' },
    ];

    const unknown = await librarian.put(path, { label: 'x', columns }).expect(400);
    const extra = await librarian.put(path, { label: 'x', colour: 'red' }).expect(400);
    const date = await librarian.put(path, { label: 'x', date: '2026-02-30' }).expect(400);

    expect(unknown.body.issues[0].path).toBe('columns.0.header');
    expect(extra.body.issues[0].path).toBe('colour');
    expect(date.body.issues[0].path).toBe('date');
  });
});

describe('a list with bad rows', () => {
  const bad = [
    HEADER,
    'Good,612,50,8,1,1',
    'Bad frequency,six,50,8,1,1',
    '',
    'Bad latitude,621,95,8,1,1',
    '"On\ntwo lines",630,50,200,1,1',
    'Bad power,639,50,8,-1,1',
    '=HYPERLINK(1),648,50,8,much,1',
    'Half a place,657,50,,1,1',
    'No place,666,,,1,',
    'Good,612,50,8,1,1',
    'Too many,675,50,8,1,1,9,9',
    ',684,50,8,1,1',
  ].join('\n');

  it('says for each fault the line, the column, the value and what is expected', async () => {
    const { path } = await upload(librarian, await addRegion(librarian), bad);

    const { body } = await librarian.put(path, { label: 'List' }).expect(200);

    expect(body.rows).toMatchObject({
      total: 11,
      new: 2,
      changed: 0,
      same: 0,
      rejected: 8,
      duplicate: 1,
      withoutPlace: 1,
    });
    expect(
      body.faults.map(({ line, column, value }: Record<string, unknown>) => [line, column, value]),
    ).toEqual([
      [3, 'frequency_khz', 'six'],
      [5, 'latitude', '95'],
      [6, 'longitude', '200'],
      [8, 'power_day_kw', '-1'],
      [9, 'power_day_kw', 'much'],
      [10, 'longitude', ''],
      [13, 'power_night_kw', '9 9'],
      [14, 'name', ''],
    ]);
    expect(body.faults[1].expected).toBe('degrees from -90 (south) to 90, with a decimal point');
    const { body: state } = await librarian.get(path).expect(200);
    expect(state.faults).toEqual(body.faults);
  });

  it('gives the rejected rows back to be mended and imported again', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, bad);
    await librarian.put(path, { label: 'List' }).expect(200);

    const { text, headers } = await librarian.get(`${path}/rejects`).expect(200);

    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    const lines = text.replace('\ufeff', '').split('\r\n');
    expect(lines[0]).toBe(`line,fault,${HEADER}`);
    expect(lines[2]).toMatch(/^5,"latitude: ""95"" is not degrees.*",Bad latitude,621,95,8,1,1$/);
    expect(text).toContain(",'=HYPERLINK(1),648,50,8,much,1\r\n");
    expect(text).toContain(',639,50,8,-1,1\r\n');

    const mended = text.replace(',621,95,', ',621,59,');
    const again = await upload(librarian, regionId, mended);
    const { body } = await librarian.put(again.path, { label: 'Mended' }).expect(200);
    expect(body.rows).toMatchObject({ total: 8, new: 1, rejected: 7 });
  });

  it('is refused where no row is good, and where it was not checked', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, `${HEADER}\nx,y,1,1,1,1`);

    const unchecked = await librarian.post(`${path}/commit`).expect(409);
    await librarian.put(path, { label: 'List' }).expect(200);
    const { body } = await librarian.post(`${path}/commit`).expect(409);

    expect(unchecked.body.title).toBe('Check the list first: say how its columns are to be read.');
    expect(body.title).toBe('No row of the list can be stored. Mend the file and upload it again.');
  });
});

describe('the next edition', () => {
  it('tells new, changed and same rows; the same file again is nothing new', async () => {
    const regionId = await addRegion(librarian);
    const list = cleanList(50);
    await importList(librarian, regionId, list);
    const next = `${list.replace('Radio Vale 3,558,50.0003,8.0003,4,', 'Radio Vale 3,558,50.0003,8.0003,5,')}
Newcomer,999,50,8,1,1`;

    const same = await upload(librarian, regionId, list);
    const { body: nothingNew } = await librarian.put(same.path, { label: 'Again' }).expect(200);
    const { path } = await upload(librarian, regionId, next);
    const { body } = await librarian.put(path, { label: 'Autumn' }).expect(200);

    expect(nothingNew.rows).toMatchObject({ total: 50, new: 0, changed: 0, same: 50 });
    expect(body.rows).toMatchObject({ total: 51, new: 1, changed: 1, same: 49 });
  });

  it('is checked again where another one was stored meanwhile', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, cleanList(2));
    await librarian.put(first.path, { label: 'First' }).expect(200);
    await importList(librarian, regionId, cleanList(3));

    const { body } = await librarian.post(`${first.path}/commit`).expect(409);
    await librarian.put(first.path, { label: 'First' }).expect(200);
    await librarian.post(`${first.path}/commit`).expect(202);

    expect(body.type).toBe('edition-changed');
    expect((await settled(librarian, first.path)).state).toBe('committed');
  });
});

describe('DELETE of an import', () => {
  it('cancels what is not committed and removes the file', async () => {
    const regionId = await addRegion(librarian);
    const before = uploadsKept();
    const { path } = await upload(librarian, regionId, cleanList(5));
    await librarian.put(path, { label: 'List' }).expect(200);

    await librarian.delete(path).expect(204);

    expect((await librarian.get(path).expect(200)).body.state).toBe('cancelled');
    expect(uploadsKept()).toBe(before);
    await librarian.post(`${path}/commit`).expect(409);
    await librarian.put(path, { label: 'List' }).expect(409);
    await librarian.get(`${path}/rejects`).expect(409);
  });

  it('undoes what is committed as a whole', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, cleanList(500));
    await librarian.put(path, { label: 'List' }).expect(200);
    await librarian.post(`${path}/commit`).expect(202);
    const { editionId } = await settled(librarian, path);

    await librarian.delete(path).expect(204);

    expect((await librarian.get(path)).body).toMatchObject({ state: 'undone', editionId: null });
    await librarian.get(`/api/editions/${editionId}`).expect(404);
    await vi.waitUntil(
      async () => (await rowsOf(server, `editions WHERE id = ${editionId}`)) === 0,
    );
    expect(await rowsOf(server, `stations WHERE edition_id = ${editionId}`)).toBe(0);
  });
});

describe('GET of a region’s imports', () => {
  it('lists them, the latest first', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, cleanList(1));
    const second = await upload(librarian, regionId, cleanList(2));
    await librarian.delete(first.path).expect(204);

    const { body } = await librarian.get(`/api/regions/${regionId}/imports`).expect(200);

    expect(body).toMatchObject({
      total: 2,
      items: [
        { id: second.id, state: 'uploaded' },
        { id: first.id, state: 'cancelled' },
      ],
    });
  });
});

describe('a file that went away', () => {
  it('is asked for again', async () => {
    const { path } = await upload(librarian, await addRegion(librarian), cleanList(1));
    await librarian.put(path, { label: 'List' }).expect(200);
    const folder = join(server.dataFolder, 'uploads');
    for (const name of readdirSync(folder)) rmSync(join(folder, name));

    const { body } = await librarian.put(path, { label: 'List' }).expect(400);

    expect(body.title).toBe('The uploaded file is no longer there. Upload it again.');
  });
});
