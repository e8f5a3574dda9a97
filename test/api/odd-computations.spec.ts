/** What no sensible client sends, on every call that computes: a clear refusal, or finite numbers. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { assessment } from '../../shared/contracts/assessment.ts';
import { candidatesAnswer } from '../../shared/contracts/candidates.ts';
import { curesAnswer } from '../../shared/contracts/cures.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';
import { BARE_SITE, sentSite } from '../support/sites.ts';

let server: ApiServer;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

const { name: _name, ...SITE } = sentSite();
const receiver = sentReceiver();
const [band] = receiver.bands;
const withBand = (change: object) => ({ ...receiver, bands: [{ ...band, ...change }] });

const calls = [
  ['/api/assessments', assessment, {}],
  ['/api/if-candidates', candidatesAnswer, { fromHz: 450_000, toHz: 460_000, stepHz: 5000 }],
  ['/api/cures', curesAnswer, {}],
] as const;

describe.each(calls)('%s', (path, answer, more) => {
  const send = (change: object) =>
    visitor.post(path, { receiver, site: BARE_SITE, everyChannelDb: 60, ...more, ...change });

  it.each<[string, object]>([
    ['receiver.bands.0.circuits.0.qLow', withBand({ circuits: [{ qLow: 0, qHigh: 80 }] })],
    [
      'receiver.bands.0.circuits',
      withBand({ circuits: Array(10_000).fill({ qLow: 9, qHigh: 9 }) }),
    ],
    ['receiver.bands.0.highHz', withBand({ highHz: band?.lowHz })],
    ['receiver.ifHz', { ...receiver, ifHz: null }],
    ['receiver.ifHz', { ...receiver, ifHz: 'NaN' }],
    ['receiver.bands.0.assumedWantedDb', withBand({ assumedWantedDb: 1e9 })],
    ['receiver.trap.q', { ...receiver, trap: { kind: 'parallel', q: null } }],
  ])('refuses a bad %s by name', async (field, bad) => {
    const { body } = await send({ receiver: bad }).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(field);
  });

  const station = { frequencyHz: 900_000, powerDayW: 1000, powerNightW: 1000 };
  it.each<[string, object, object]>([
    ['at the site itself', {}, { latitude: 50, longitude: 8 }],
    ['at the antipodes', {}, { latitude: -50, longitude: -172 }],
    ['at a pole', {}, { latitude: 90, longitude: 0 }],
    ['of a site at a pole', { latitude: -90 }, { latitude: 90, longitude: 0 }],
    ['without a place', {}, {}],
    ['without power', {}, { latitude: 50, longitude: 9, powerDayW: null, powerNightW: null }],
    ['that is silent', {}, { latitude: 50, longitude: 9, powerDayW: 0, powerNightW: 0 }],
    ['on 1 kHz', {}, { latitude: 50, longitude: 9, frequencyHz: 1000 }],
    ['on 1 GHz', {}, { latitude: 50, longitude: 9, frequencyHz: 1_000_000_000 }],
  ])('answers finite numbers with a station %s', async (_where, place, change) => {
    const site = { ...SITE, ...place };
    const stations = [{ ...station, ...change }];

    const { body } = await send({ site, stations, everyChannelDb: undefined }).expect(200);

    // JSON writes what is not finite as null, which the schema refuses where a number is due.
    answer.parse(body);
  });

  it('answers for an empty list', async () => {
    const { body } = await send({ stations: [], everyChannelDb: undefined }).expect(200);

    answer.parse(body);
  });
});

describe('a list beyond all bounds', () => {
  it('is refused with what to leave out, before a thread is busy with it', async () => {
    const stations = Array.from({ length: 20_000 }, (_, index) => ({
      frequencyHz: 150_000 + 90 * index,
      fieldDb: 60,
    }));
    const request = { receiver, site: BARE_SITE, stations };
    const range = { fromHz: 450_000, toHz: 470_000, stepHz: 100 };

    const { body } = await visitor.post('/api/if-candidates', { ...request, ...range }).expect(400);

    expect(body.type).toBe('too-costly');
    expect(body.issues.map((each: { path: string }) => each.path)).toEqual(['stepHz', 'stations']);
  });

  it.each([
    ['a step of 1 GHz judges one candidate', 1_000_000_000, 200],
    ['a step of 0 is refused', 0, 400],
  ])('%s', async (_what, stepHz, status) => {
    const range = { fromHz: 450_000, toHz: 470_000, stepHz };

    await visitor
      .post('/api/if-candidates', { receiver, site: BARE_SITE, everyChannelDb: 60, ...range })
      .expect(status);
  });
});
