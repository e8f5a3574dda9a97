import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { differencesAnswer } from '../../shared/contracts/edition-differences.ts';
import { receiverVerdicts } from '../../shared/contracts/edition-verdicts.ts';
import { edition } from '../../shared/contracts/region.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { addRegion, cleanList, HEADER, importList, upload } from '../support/lists.ts';
import { sentReceiver } from '../support/receivers.ts';

const PLACE = { latitude: 50.1, longitude: 8, ground: 'average', noise: 'rural', ituRegion: 1 };

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
});
afterAll(() => server.close());

const list = (...rows: string[]): string => [HEADER, ...rows].join('\n');

describe('an edition', () => {
  it('takes another label, date and note from a librarian, and is judged by the raster of its date', async () => {
    const { member, librarian } = await club(server);
    const id = await addRegion(librarian);
    const editionId = await importList(librarian, id, list('Vale,910,50,8,1,1'));
    const rasters = [
      { from: '1990-01-01', ranges: [{ lowHz: 540_000, highHz: 1_600_000, stepHz: 10_000 }] },
      { from: null, ranges: [{ lowHz: 531_000, highHz: 1_602_000, stepHz: 9000 }] },
    ];
    await librarian.put(`/api/regions/${id}`, { name: 'Vale', ituRegion: 1, rasters }).expect(200);
    const change = { label: 'Old list', date: '1980-05-01', note: 'From the attic.' };

    const { body } = await librarian.put(`/api/editions/${editionId}`, change).expect(200);
    const { body: page } = await member.get(`/api/editions/${editionId}/stations`).expect(200);

    expect(edition.parse(body)).toMatchObject({ ...change, source: 'vale.csv', editable: true });
    expect(body.raster).toEqual(rasters[1]?.ranges);
    expect(page.items[0].onRaster).toBe(false);
    await member.put(`/api/editions/${editionId}`, change).expect(403);
    await member.delete(`/api/editions/${editionId}`).expect(403);
    await librarian.put(`/api/editions/${editionId}`, { ...change, date: 'May' }).expect(400);
    await person.put(`/api/editions/${editionId}`, change).expect(404);
  });

  it('is deleted, unless a plan names it', async () => {
    const region = await addRegion(person);
    const editionId = await importList(person, region, list('Vale,909,50,8,1,1'));
    const { body: receiver } = await person.post('/api/receivers', sentReceiver()).expect(201);
    const { body: site } = await person.post('/api/sites', { name: 'Attic', ...PLACE }).expect(201);
    const plan = { name: 'To 460', siteId: site.id, editionId, period: 'night', ifHz: 460_000 };
    const { body: kept } = await person
      .post(`/api/receivers/${receiver.id}/plans`, plan)
      .expect(201);

    const { body } = await person.delete(`/api/editions/${editionId}`).expect(409);
    await person.delete(`/api/receivers/${receiver.id}/plans/${kept.id}`).expect(204);
    await person.delete(`/api/editions/${editionId}`).expect(204);

    expect(body).toMatchObject({ plans: [{ id: kept.id, name: 'To 460' }] });
    expect(body.title).toContain('“To 460”');
    await person.get(`/api/editions/${editionId}`).expect(404);
  });
});

describe('GET /api/editions/:id/stations.csv', () => {
  it('gives a file that imports back the same, formulas and odd numbers too', async () => {
    const region = await addRegion(person);
    const content = [
      'name,call_sign,frequency_khz,latitude,longitude,power_day_kw,power_night_kw,hours,note',
      '"=HYPERLINK(""x"")",@QB,455.123,-50.123456789,8.0000001,0.3333333,1e-7,"0600-1800, daily","-5 dB, ""old"""',
      "'=twice,-7,1602,,,,,,+1",
      'Ünï cödé;,Q2,1000,1,1,0,0,,',
    ].join('\n');
    const editionId = await importList(person, region, content);

    const file = await person.get(`/api/editions/${editionId}/stations.csv`).expect(200);
    const { path } = await upload(person, region, file.text);
    const { body } = await person.put(path, {}).expect(200);

    expect(file.headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(file.text).toContain(`'=HYPERLINK`);
    expect(body.rows).toMatchObject({ total: 3, same: 3, new: 0, changed: 0, rejected: 0 });
  });

  it('gives the patterns of aerials back too', async () => {
    const region = await addRegion(person);
    const bearings = Array.from({ length: 36 }, (_, index) => 10 * index);
    const headers = bearings.map((bearing) => `az${bearing} (dB)`).join(',');
    const gains = bearings.map((bearing) => (bearing % 50) / -3);
    const content = `name,frequency_khz,power_kw,${headers}\nMast,612,1,${gains.join(',')}\nRod,630,1`;
    const editionId = await importList(person, region, content);

    const file = await person.get(`/api/editions/${editionId}/stations.csv`).expect(200);
    const { path } = await upload(person, region, file.text);
    const { body } = await person.put(path, {}).expect(200);

    expect(body.rows).toMatchObject({ total: 2, same: 2 });
  });

  it('gives the list as corrected by hand, or as it was imported', async () => {
    const region = await addRegion(person);
    const editionId = await importList(person, region, cleanList(3));
    const path = `/api/editions/${editionId}/stations`;
    const [first, second] = (await person.get(path).expect(200)).body.items;
    const correct = (body: object) =>
      person.post(`/api/regions/${region}/corrections`, body).expect(201);
    await correct({ kind: 'off-air', stationId: first.id });
    await correct({ kind: 'changed', stationId: second.id, fields: { name: 'Better' } });
    await correct({ kind: 'added', station: { name: 'New', frequencyHz: 455_000 } });

    const corrected = await person.get(`${path}.csv`).expect(200);
    const official = await person.get(`${path}.csv?corrections=none`).expect(200);

    const namesIn = (text: string) =>
      text
        .trim()
        .split('\r\n')
        .slice(1)
        .map((line) => line.split(',')[0]);
    expect(namesIn(corrected.text)).toEqual(['Better', 'Radio Vale 2', 'New']);
    expect(namesIn(official.text)).toEqual(['Radio Vale 0', 'Radio Vale 1', 'Radio Vale 2']);
    await person.get(`${path}.csv?corrections=some`).expect(400);
  });
});

describe('GET /api/editions/:id/differences', () => {
  it('says what was added, is gone, moved, or changed power, frequency or anything else', async () => {
    const region = await addRegion(person);
    const header = `${HEADER},note`;
    const before = await importList(
      person,
      region,
      [
        header,
        'Same,531,50,8,1,1,',
        'Gone,540,50,8,1,1,',
        'Mover,549,50,8,1,1,',
        'Louder,558,50,8,1,1,',
        'Shifter,567,50,8,1,1,',
        'Noted,576,50,8,1,1,old',
        'Chain,585,50,8,1,1,',
        'Chain,585,60,8,1,1,',
      ].join('\n'),
    );
    const after = await importList(
      person,
      region,
      [
        header,
        'Same,531,50,8,1,1,',
        'Added,1000,50,8,1,1,',
        'Mover,549,51,8,1,1,',
        'Louder,558,50,8,10,1,',
        'Shifter,594,50.001,8,1,1,',
        'Noted,576,50,8,1,1,new',
        'Chain,585,60.01,8,2,1,',
        'Chain,585,50,8,1,1,',
      ].join('\n'),
    );
    const path = `/api/editions/${after}/differences?against=${before}`;

    const answer = differencesAnswer.parse((await person.get(path).expect(200)).body);
    const { body: moved } = await person.get(`${path}&kind=moved&pageSize=1`).expect(200);

    expect(answer.counts).toEqual({
      added: 1,
      gone: 1,
      moved: 3,
      'changed-power': 2,
      'changed-frequency': 1,
      'changed-other': 1,
    });
    expect(answer).toMatchObject({ total: 7, same: 2 });
    expect(
      answer.items.map(({ before: b, after: a, kinds }) => [b?.name ?? a?.name, ...kinds]),
    ).toEqual([
      ['Gone', 'gone'],
      ['Mover', 'moved'],
      ['Louder', 'changed-power'],
      ['Noted', 'changed-other'],
      ['Chain', 'moved', 'changed-power'],
      ['Shifter', 'moved', 'changed-frequency'],
      ['Added', 'added'],
    ]);
    // A degree along the meridian at 50.5 degrees north: WGS84, 111 239 m.
    expect(answer.items[1]?.movedM).toBeCloseTo(111_239, -2);
    expect(answer.items[2]).toMatchObject({ powerDayDb: 10, powerNightDb: 0 });
    expect(answer.items[4]?.before?.latitude).toBe(60);
    expect(moved).toMatchObject({ total: 3, items: [{ before: { name: 'Mover' } }] });
    const { body: usual } = await person.get(`/api/editions/${after}/differences`).expect(200);
    expect(usual.counts).toEqual(answer.counts);
    const { body: same } = await person
      .get(`/api/editions/${before}/differences?against=${after}&kind=gone`)
      .expect(200);
    expect(same.items).toMatchObject([{ before: { name: 'Added' }, after: null }]);
  });

  it('needs another edition of the same region', async () => {
    const one = await importList(person, await addRegion(person), cleanList(1));
    const other = await importList(person, await addRegion(person), cleanList(1));
    const stranger = await server.newcomer();
    const path = `/api/editions/${one}/differences`;

    for (const query of ['', `?against=${one}`, `?against=${other}`, '?against=x']) {
      const { body } = await person.get(path + query).expect(400);
      expect(body.issues[0].path).toBe('against');
    }
    await person.get(`${path}?against=999999`).expect(404);
    await stranger.get(`${path}?against=${other}`).expect(404);
  });
});

describe('POST /api/editions/:id/verdicts', () => {
  it('says whose verdict changes, before and after, and by which stations', async () => {
    const own = await server.newcomer();
    const region = await addRegion(own);
    const wanted = ['Abbey,612,50.3,8,5,5', 'Vale,909,50.3,8.3,5,5', 'Dune,1053,50.4,8,5,5'];
    const before = await importList(own, region, list(...wanted));
    const after = await importList(own, region, list(...wanted, 'Strong,455,50.1,8.02,9000,9000'));
    const { body: site } = await own.post('/api/sites', { name: 'Attic', ...PLACE }).expect(201);
    const receiver = { ...sentReceiver(), ifHz: 455_000, name: 'Set' };
    await own.post('/api/receivers', receiver).expect(201);
    const path = `/api/editions/${after}/verdicts`;

    const { body } = await own.post(path, { against: before, siteId: site.id }).expect(200);
    const [verdicts] = body.items.map((item: unknown) => receiverVerdicts.parse(item));

    expect(body.total).toBe(1);
    expect(verdicts).toMatchObject({ receiverName: 'Set', changed: true, reason: null });
    expect(verdicts.after.deficitDb).toBeGreaterThan(verdicts.before.deficitDb);
    expect(verdicts.after.harmed).toBeGreaterThan(verdicts.before.harmed);
    expect(verdicts.causes).toMatchObject([
      { name: 'Strong', frequencyHz: 455_000, edition: 'after', kinds: ['added'] },
    ]);

    const { body: assessed } = await own
      .post('/api/assessments', { receiver, site: PLACE, editionId: after })
      .expect(200);
    expect(verdicts.after.deficitDb).toBeCloseTo(assessed.verdict.deficitDb, 9);
    expect(verdicts.after.harmed).toBe(assessed.verdict.harmed.length);
  });

  it('keeps strangers out and refuses what it cannot compare', async () => {
    const region = await addRegion(person);
    const one = await importList(person, region, list('Vale,909,50,8,1,1'));
    const other = await importList(person, region, list('Vale,909,50,8,2,2'));
    const { body: site } = await person.post('/api/sites', { name: 'Attic', ...PLACE }).expect(201);
    const stranger = await server.newcomer();
    const path = `/api/editions/${one}/verdicts`;

    await stranger.post(path, { against: other, siteId: site.id }).expect(404);
    await person.post(path, { against: other, siteId: 999_999 }).expect(404);
    await person.post(path, { against: one, siteId: site.id }).expect(400);
    await person.post(path, { against: other, siteId: site.id, pageSize: 500 }).expect(400);
    await person.post(path, { against: other }).expect(400);
  });
});
