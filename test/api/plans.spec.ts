import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { plan, wholePlan } from '../../shared/contracts/plan.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { addRegion, cleanList, importList, settled, upload } from '../support/lists.ts';
import { sentReceiver } from '../support/receivers.ts';
import { sentSite } from '../support/sites.ts';

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
});
afterAll(() => server.close());

const idOf = async (client: ApiClient, path: string, draft: object): Promise<number> =>
  (await client.post(path, draft).expect(201)).body.id as number;

async function benchOf(client: ApiClient) {
  const receiverId = await idOf(client, '/api/receivers', sentReceiver());
  const siteId = await idOf(client, '/api/sites', sentSite());
  return { receiverId, siteId, path: `/api/receivers/${receiverId}/plans` };
}

const draftOf = (siteId: number, change: object = {}) => ({
  name: 'Move it',
  note: 'retune the BFO',
  siteId,
  everyChannelDb: 70,
  period: 'night',
  ifHz: 460_000,
  ...change,
});

describe('POST /api/receivers/:id/plans', () => {
  it('keeps what the server computes from receiver, site and edition', async () => {
    const { siteId, path } = await benchOf(person);
    const editionId = await importList(person, await addRegion(person), cleanList(200), 'Spring');
    const draft = draftOf(siteId, { everyChannelDb: null, editionId });

    const { body, headers } = await person.post(path, draft).expect(201);

    const kept = wholePlan.parse(body);
    expect(kept).toMatchObject({
      name: 'Move it',
      ifHz: 460_000,
      siteName: 'Attic',
      site: { latitude: 50 },
      editionId,
      editionLabel: 'Spring',
      receiver: { ifHz: 455_000 },
      results: { present: { ifHz: 455_000 }, chosen: { ifHz: 460_000 } },
      editable: true,
    });
    expect(kept.results.night.usable).toBeGreaterThan(0);
    expect(headers['location']).toBe(`${path}/${kept.id}`);
    await person.get(`${path}/${kept.id}`).expect(200, body);
    const { body: list } = await person.get(path).expect(200);
    const { stations: _stations, judged: _judged, ...head } = body;
    expect(list).toEqual({ items: [head], total: 1 });
    expect(plan.parse(list.items[0])).toEqual(plan.parse(head));
  });

  it('judges the chosen IF as an assessment of the realigned set does', async () => {
    const { siteId, path } = await benchOf(person);
    const { name: _name, ...site } = sentSite();

    const { body } = await person.post(path, draftOf(siteId)).expect(201);
    const { body: day } = await person
      .post('/api/assessments', {
        receiver: sentReceiver({ ifHz: 460_000 }),
        site,
        everyChannelDb: 70,
        period: 'day',
      })
      .expect(200);

    const { stations, results } = wholePlan.parse(body);
    const named = (verdict: typeof results.day) =>
      verdict.harmed.map(({ station, ...rest }) => ({
        ...rest,
        name: stations[station]?.name,
      }));
    expect(results.day).toMatchObject({
      usable: day.verdict.usable,
      deficitDb: day.verdict.deficitDb,
    });
    expect(named(results.day).map(({ dialHz }) => dialHz)).toEqual(
      day.verdict.harmed.map(({ dialHz }: { dialHz: number }) => dialHz),
    );
    for (const { name, dialHz } of named(results.day)) expect(name).toBe(`${dialHz / 1000} kHz`);
  });

  it.each([
    ['ifHz', { ifHz: 0 }],
    ['editionId', { editionId: 1 }],
    ['editionId', { everyChannelDb: null }],
    ['period', { period: 'noon' }],
    ['results', { results: {} }],
  ])('with a bad %s, answers 400 and names it', async (issue, change) => {
    const { siteId, path } = await benchOf(person);

    const { body } = await person.post(path, draftOf(siteId, change)).expect(400);

    expect(body.issues[0].path).toBe(issue);
  });

  it('refuses an IF at which an oscillator would reach zero', async () => {
    const { siteId } = await benchOf(person);
    const low = { name: 'Low', lowHz: 600_000, highHz: 900_000, oscillator: 'below' as const };
    const id = await idOf(person, '/api/receivers', sentReceiver({ bands: [low] }));

    const { body } = await person
      .post(`/api/receivers/${id}/plans`, draftOf(siteId, { ifHz: 700_000 }))
      .expect(400);

    expect(body.issues[0].path).toBe('ifHz');
  });

  it('knows no receiver, site or edition of others', async () => {
    const mine = await benchOf(person);
    const stranger = await server.newcomer();
    const theirs = await benchOf(stranger);
    const editionId = await importList(stranger, await addRegion(stranger), cleanList(2));

    await person.post(theirs.path, draftOf(mine.siteId)).expect(404);
    await person.post(mine.path, draftOf(theirs.siteId)).expect(404);
    const withTheirs = draftOf(mine.siteId, { everyChannelDb: null, editionId });
    await person.post(mine.path, withTheirs).expect(404);
    await person.get(theirs.path).expect(404);
  });
});

describe('a plan', () => {
  it('stays as it was when receiver, site and edition go', async () => {
    const { receiverId, siteId, path } = await benchOf(person);
    const regionId = await addRegion(person);
    const list = await upload(person, regionId, cleanList(20));
    await person.put(list.path, { label: 'Spring' }).expect(200);
    await person.post(`${list.path}/commit`).expect(202);
    const { editionId } = await settled(person, list.path);
    const draft = draftOf(siteId, { everyChannelDb: null, editionId });
    const { body: kept } = await person.post(path, draft).expect(201);

    await person.delete(list.path).expect(204);
    await person.delete(`/api/sites/${siteId}`).expect(204);
    await person
      .put(`/api/receivers/${receiverId}`, { ...sentReceiver({ ifHz: 470_000 }), version: 1 })
      .expect(200);

    const { body } = await person.get(`${path}/${kept.id}`).expect(200);
    expect(body).toEqual({
      ...kept,
      editionId: null,
      siteId: null,
      standing: {
        newerEdition: null,
        isEditionCorrected: false,
        isReceiverChanged: true,
        isSiteChanged: true,
      },
    });
    await person.delete(`/api/receivers/${receiverId}`).expect(204);
    await person.get(`${path}/${kept.id}`).expect(404);
  });

  it('is deleted by who kept it or an admin', async () => {
    const { admin, librarian, member } = await club(server);
    const { siteId, path } = await benchOf(librarian);
    const first = await idOf(librarian, path, draftOf(siteId));
    const second = await idOf(librarian, path, draftOf(siteId));

    await member.delete(`${path}/${first}`).expect(403);
    await librarian.delete(`${path}/${first}`).expect(204);
    await admin.delete(`${path}/${second}`).expect(204);
    const { body } = await librarian.get(path).expect(200);
    expect(body).toEqual({ items: [], total: 0 });
  });
});

describe('a plan', () => {
  it('can be read alone: stations by name, call sign and frequency, responses with working', async () => {
    const { siteId, path } = await benchOf(person);
    const editionId = await importList(person, await addRegion(person), cleanList(200), 'Alone');
    const draft = draftOf(siteId, { everyChannelDb: null, editionId });

    const kept = wholePlan.parse((await person.post(path, draft).expect(201)).body);

    expect(kept.edition).toMatchObject({ label: 'Alone', regionName: 'Vale', stations: 200 });
    const heard = kept.judged?.night.bands.flatMap(({ responses }) => responses) ?? [];
    expect(heard.length).toBeGreaterThan(10);
    for (const { station, wantedStation, ledger } of heard) {
      expect(kept.stations[station]?.name).toMatch(/^Radio Vale \d+$/);
      expect(kept.stations[station]?.frequencyHz).toBeGreaterThan(500_000);
      if (wantedStation !== null) expect(kept.stations[wantedStation]).toBeDefined();
      expect(ledger.length).toBeGreaterThan(0);
    }
  });

  it('is judged with the set-up on trial, beside the one that is saved', async () => {
    const { siteId, path } = await benchOf(person);
    const sharp = { qLow: 120, qHigh: 120 };
    const trial = sentReceiver();
    trial.bands = trial.bands.map((band) => ({ ...band, circuits: [sharp, sharp] }));

    const { body } = await person.post(path, draftOf(siteId, { receiver: trial })).expect(201);
    const plain = await person.post(path, draftOf(siteId)).expect(201);

    const [kept, saved] = [wholePlan.parse(body), wholePlan.parse(plain.body)];
    expect(kept.receiver.bands[0]?.circuits).toEqual([sharp, sharp]);
    expect(kept.savedReceiver?.bands[0]?.circuits).toHaveLength(1);
    expect(kept.standing.isReceiverChanged).toBe(false);
    expect(saved.savedReceiver).toBeNull();
    expect(kept.results.night.deficitDb).toBeLessThan(saved.results.night.deficitDb);
    expect(kept.results.before?.night.deficitDb).toBe(saved.results.before?.night.deficitDb);
    await person.post(path, draftOf(siteId, { receiver: { ifHz: 1 } })).expect(400);
  });

  it('says that a newer edition of its list exists, and that receiver or site changed', async () => {
    const { siteId, receiverId, path } = await benchOf(person);
    const region = await addRegion(person);
    const editionId = await importList(person, region, cleanList(20), 'Old');
    const draft = draftOf(siteId, { everyChannelDb: null, editionId });
    const { body: kept } = await person.post(path, draft).expect(201);
    expect(kept.standing).toEqual({
      newerEdition: null,
      isEditionCorrected: false,
      isReceiverChanged: false,
      isSiteChanged: false,
    });

    const newer = await importList(person, region, cleanList(21), 'New');
    await person.put(`/api/sites/${siteId}`, sentSite({ noise: 'city' })).expect(200);
    await person
      .put(`/api/receivers/${receiverId}`, { ...sentReceiver({ ifRange: 0.1 }), version: 1 })
      .expect(200);

    const { body } = await person.get(`${path}/${kept.id}`).expect(200);
    expect(body.standing).toMatchObject({
      newerEdition: { id: newer, label: 'New' },
      isReceiverChanged: true,
      isSiteChanged: true,
    });
  });

  it('says that stations of its list were corrected by hand since, not only remarked on', async () => {
    const { siteId, path } = await benchOf(person);
    const region = await addRegion(person);
    const editionId = await importList(person, region, cleanList(20), 'Spring');
    const draft = draftOf(siteId, { everyChannelDb: null, editionId });
    const { body: kept } = await person.post(path, draft).expect(201);
    const { body: stations } = await person.get(`/api/editions/${editionId}/stations`).expect(200);
    const stationId = stations.items[0].id;
    const isCorrected = async () => {
      const { body } = await person.get(`${path}/${kept.id}`).expect(200);
      const { body: all } = await person.get(path).expect(200);
      expect(all.items[0].standing).toEqual(body.standing);
      return body.standing.isEditionCorrected;
    };

    const corrections = `/api/regions/${region}/corrections`;
    await person.post(corrections, { kind: 'heard', stationId, note: 'Weak.' }).expect(201);
    expect(await isCorrected()).toBe(false);
    const { body: off } = await person
      .post(corrections, { kind: 'off-air', stationId, note: 'Mast down.' })
      .expect(201);
    expect(await isCorrected()).toBe(true);
    await person.delete(`${corrections}/${off.id}`).expect(204);
    expect(await isCorrected()).toBe(false);
  });
});
