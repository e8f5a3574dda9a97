import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { importCheck } from '../../shared/contracts/list-import.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, HEADER, settled, upload } from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());

async function stored(path: string): Promise<number> {
  await librarian.post(`${path}/commit`).expect(202);
  const { state, editionId } = await settled(librarian, path);
  expect(state).toBe('committed');
  return editionId ?? 0;
}

const namesOf = async (editionId: number): Promise<string[]> => {
  const { body } = await librarian
    .get(`/api/editions/${editionId}/stations?pageSize=100`)
    .expect(200);
  return (body.items as { name: string }[]).map(({ name }) => name);
};

describe('how a file is taken apart', () => {
  const text = 'Sender;kHz;Breite;L\u00e4nge\r\nF\u00e4hre;1.359;47,31;8,05\r\n';
  const latin = () => Buffer.from(text, 'latin1');

  it('can be chosen; the proposal and its sample follow', async () => {
    const { path, ...found } = await upload(librarian, await addRegion(librarian), latin());

    const { body } = await librarian
      .put(`${path}/reading`, { encoding: 'ISO-8859-2', delimiter: ',', decimalMark: '.' })
      .expect(200);
    const { body: back } = await librarian
      .put(`${path}/reading`, { encoding: 'windows-1252', delimiter: ';' })
      .expect(200);

    expect(found).toMatchObject({ encoding: 'windows-1252', decimalMark: ',', complete: true });
    expect(body).toMatchObject({ encoding: 'ISO-8859-2', delimiter: ',', decimalMark: '.' });
    expect(body.complete).toBe(false);
    expect(body.sample[0][0]).toBe('F\u00e4hre;1.359;47');
    expect(back).toMatchObject({ delimiter: ';', decimalMark: ',', complete: true });
    expect((await librarian.get(path)).body.proposal).toEqual(back);
  });

  it('can be said with the check, whose rows are read so', async () => {
    const { path } = await upload(librarian, await addRegion(librarian), latin());

    const wrong = await librarian.put(path, { decimalMark: '.' }).expect(200);
    const right = await librarian.put(path, { decimalMark: ',' }).expect(200);

    expect(wrong.body.rows).toMatchObject({ total: 1, rejected: 1 });
    expect(right.body.rows).toMatchObject({ total: 1, new: 1 });
    expect((await librarian.get(path)).body.proposal.decimalMark).toBe(',');
  });

  it('is refused as UTF-8 where it is not, and in encodings nobody knows', async () => {
    const { path } = await upload(librarian, await addRegion(librarian), latin());

    const strict = await librarian.put(`${path}/reading`, { encoding: 'UTF-8' }).expect(400);
    const unknown = await librarian.put(path, { encoding: 'EBCDIC' }).expect(400);
    const wide = await librarian.put(path, { delimiter: '#' }).expect(400);

    expect(strict.body.issues[0]).toMatchObject({ path: 'encoding' });
    expect(unknown.body.issues[0].path).toBe('encoding');
    expect(wide.body.issues[0].path).toBe('delimiter');
  });
});

describe('a matching', () => {
  const list = (row: string) => `stn,f,x,y\n${row}`;
  const columns = [
    { header: 'stn', field: 'name' },
    { header: 'f', field: 'frequency', unit: 'kHz' },
    { header: 'x', field: 'longitude', unit: 'degrees' },
    { header: 'y', field: 'latitude', unit: 'degrees' },
  ];

  it('is remembered for the next list of the region with the same headers, in any order', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, list('Mill,612,8,47'));
    expect(first).toMatchObject({ complete: false, remembered: false });
    await librarian.put(first.path, { columns }).expect(200);

    const next = await upload(librarian, regionId, 'f,stn,y,x\n621,Weir,47,8\n');
    const elsewhere = await upload(librarian, await addRegion(librarian), list('Mill,612,8,47'));

    expect(next).toMatchObject({ complete: true, remembered: true });
    expect(next.columns.map(({ field }) => field)).toEqual([
      'frequency',
      'name',
      'latitude',
      'longitude',
    ]);
    expect(elsewhere).toMatchObject({ complete: false, remembered: false });
  });
});

describe('a list beside the edition before it', () => {
  it('tells what is gone, off the raster, without place and without power', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, `${HEADER}\nA,612,47,8,1,1\nB,621,47,8,1,1`);
    await librarian.put(first.path, {}).expect(200);
    await stored(first.path);

    const next = await upload(librarian, regionId, `${HEADER}\nA,612,47,8,1,1\nC,615,,,,`);
    const { body } = await librarian.put(next.path, {}).expect(200);

    expect(importCheck.parse(body).rows).toMatchObject({
      new: 1,
      same: 1,
      gone: 1,
      offRaster: 1,
      withoutPlace: 1,
      withoutPower: 1,
    });
  });
});

describe('37 bad rows of 60', () => {
  const row = (index: number, latitude: string) =>
    `Station ${index},${531 + 9 * index},${latitude},8,1,1`;
  const bad = [
    HEADER,
    ...Array.from({ length: 60 }, (_, index) => row(index, index < 37 ? '95' : '47')),
  ].join('\n');

  it('come back, are mended in a spreadsheet, and complete the edition they came from', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, bad);
    const { body } = await librarian.put(first.path, { label: 'Spring' }).expect(200);
    expect(body.rows).toMatchObject({ total: 60, new: 23, rejected: 37 });
    expect(body.causes).toMatchObject([{ column: 'latitude', count: 37, lines: [2, 3, 4, 5, 6] }]);
    const editionId = await stored(first.path);
    const { text } = await librarian.get(`${first.path}/rejects`).expect(200);

    const mended = await upload(librarian, regionId, text.replaceAll(',95,', ',48,'));
    expect(mended).toMatchObject({
      complete: true,
      completes: { editionId, label: 'Spring' },
      addsTo: null,
    });
    const { body: check } = await librarian.put(mended.path, { addsTo: editionId }).expect(200);
    const { body: state } = await librarian.get(mended.path).expect(200);
    const whole = await stored(mended.path);

    expect(check.rows).toMatchObject({ total: 37, new: 37, kept: 23, gone: 0, rejected: 0 });
    expect(state).toMatchObject({ label: 'Spring, completed', proposal: { addsTo: editionId } });
    const names = await namesOf(whole);
    expect(names).toHaveLength(60);
    expect(new Set(names).size).toBe(60);
    expect((await librarian.get(`/api/editions/${whole}`)).body.stations).toBe(60);
    expect(await namesOf(editionId)).toHaveLength(23);
  });
});

describe('rows that are added to an edition', () => {
  it('replace the station of their name, frequency and place, and join every other', async () => {
    const regionId = await addRegion(librarian);
    const list = `${HEADER}\nA,612,47,8,1,1\nB,621,47,8,1,1\nC,630,47,8,1,1`;
    const first = await upload(librarian, regionId, list);
    await librarian.put(first.path, {}).expect(200);
    const editionId = await stored(first.path);

    const rows = `${HEADER}\nA,612,47,8,5,5\nA,612,49,9,2,2\nB,621,47,8,1,1\nD,639,47,8,1,1`;
    const more = await upload(librarian, regionId, rows);
    const { body } = await librarian.put(more.path, { addsTo: editionId }).expect(200);
    const whole = await stored(more.path);

    expect(body.rows).toMatchObject({ new: 2, changed: 1, same: 1, kept: 2, gone: 0 });
    expect((await namesOf(whole)).sort()).toEqual(['A', 'A', 'B', 'C', 'D']);
  });

  it('need an edition of their own region', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, `${HEADER}\nA,612,47,8,1,1`);

    const { body } = await librarian.put(path, { addsTo: 999_999 }).expect(400);

    expect(body.issues[0].path).toBe('addsTo');
  });
});

describe('a formula in a cell', () => {
  it('comes back from a mended file as the text it was', async () => {
    const regionId = await addRegion(librarian);
    const first = await upload(librarian, regionId, `${HEADER}\n=SUM(A1),612,95,8,1,1`);
    await librarian.put(first.path, {}).expect(200);
    const { text } = await librarian.get(`${first.path}/rejects`).expect(200);
    expect(text).toContain("'=SUM(A1)");

    const mended = await upload(librarian, regionId, text.replace(',95,', ',47,'));
    await librarian.put(mended.path, {}).expect(200);

    expect(await namesOf(await stored(mended.path))).toEqual(['=SUM(A1)']);
  });
});

describe('a pattern', () => {
  it('goes through to computing, as gains every 10 degrees', async () => {
    const bearings = Array.from({ length: 36 }, (_, index) => index * 10);
    const headers = bearings.map((bearing) => `az${bearing} (dB)`).join(',');
    const gains = bearings.map((bearing) => (bearing === 90 ? -20 : 0));
    const list = `name,frequency_khz,power_kw,${headers}\nMast,612,1,${gains.join(',')}`;
    const { path, complete } = await upload(librarian, await addRegion(librarian), list);
    await librarian.put(path, {}).expect(200);

    const { body } = await librarian.get(`/api/editions/${await stored(path)}/stations`);
    const [station] = body.items;

    expect(complete).toBe(true);
    expect(station?.patternDb).toEqual(gains);
  });
});
