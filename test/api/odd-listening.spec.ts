/** What no sensible client sends to the calls about fields, hours, whistles and tracking. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { breakthroughHoursAnswer } from '../../shared/contracts/breakthrough-hours.ts';
import { fieldStrengthsAnswer } from '../../shared/contracts/field-strengths.ts';
import { trackingAnswer } from '../../shared/contracts/tracking.ts';
import { whistlesAnswer } from '../../shared/contracts/whistles.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';
import { sentSite } from '../support/sites.ts';

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
const station = { frequencyHz: 900_000, powerDayW: 1000, powerNightW: 1000 };
const paths = (body: { issues: { path: string }[] }): string[] =>
  body.issues.map(({ path }) => path);

const calls = [
  ['/api/field-strengths', fieldStrengthsAnswer, { period: 'night' }],
  ['/api/field-strengths', fieldStrengthsAnswer, { period: '2026-06-21T00:00:00Z' }],
  ['/api/breakthrough-hours', breakthroughHoursAnswer, { receiver, date: '2026-06-21' }],
  ['/api/whistles', whistlesAnswer, { receiver, dialHz: 900_000, pitchHz: 1000 }],
] as const;

describe.each(calls)('%s with %o', (path, answer, more) => {
  const send = (change: object) => visitor.post(path, { site: SITE, ...more, ...change });

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

    const { body } = await send({ site, stations: [{ ...station, ...change }] }).expect(200);

    // JSON writes what is not finite as null, which the schema refuses where a number is due.
    answer.parse(body);
  });

  it('says why a station without a place or a power has no field', async () => {
    const stations = [{ ...station }, { frequencyHz: 900_000, latitude: 50, longitude: 9 }];

    const { body } = await send({ stations }).expect(200);

    const said = JSON.stringify(body);
    if (path === '/api/breakthrough-hours') return;
    expect(said).toContain('The station has no place.');
    expect(said).toContain('The station has no power for this period.');
  });

  it.each<[string, object]>([
    ['site.latitude', { site: { ...SITE, latitude: 91 } }],
    ['site.longitude', { site: { ...SITE, longitude: 'NaN' } }],
    ['stations.0.latitude', { stations: [{ ...station, latitude: -90.1, longitude: 0 }] }],
    ['stations.0.frequencyHz', { stations: [{ ...station, frequencyHz: 0 }] }],
    ['stations.0.powerDayW', { stations: [{ ...station, powerDayW: -1 }] }],
    ['stations.0.fieldDb', { stations: [{ ...station, fieldDb: 1e9 }] }],
  ])('refuses a bad %s by name', async (field, change) => {
    const { body } = await send({ stations: [station], ...change }).expect(400);

    expect(paths(body)).toContain(field);
  });
});

describe.each(calls.slice(2))('%s', (path, _answer, more) => {
  const withBand = (change: object) => ({ ...receiver, bands: [{ ...band, ...change }] });

  it.each<[string, object]>([
    ['receiver.bands.0.circuits.0.qLow', withBand({ circuits: [{ qLow: 0, qHigh: 80 }] })],
    [
      'receiver.bands.0.circuits',
      withBand({ circuits: Array(10_000).fill({ qLow: 9, qHigh: 9 }) }),
    ],
    ['receiver.bands.0.highHz', withBand({ highHz: band?.lowHz })],
    ['receiver.ifHz', { ...receiver, ifHz: 'NaN' }],
  ])('refuses a bad %s by name', async (field, bad) => {
    const request = { site: SITE, stations: [station], ...more, receiver: bad };

    const { body } = await visitor.post(path, request).expect(400);

    expect(paths(body)).toContain(field);
  });
});

describe('/api/tracking', () => {
  const design = {
    lowHz: 550_000,
    highHz: 1_600_000,
    ifHz: 455_000,
    oscillator: 'above',
    gangMinF: 40e-12,
    gangMaxF: 400e-12,
    trimmer: 'gang',
    points: [600_000, 1_000_000, 1_400_000],
  };

  it.each<[string, object]>([
    ['highHz', { highHz: 550_000 }],
    ['lowHz', { lowHz: 'NaN' }],
    ['ifHz', { ifHz: 0 }],
    ['lowHz', { lowHz: 1 }],
    ['oscillator', { oscillator: 'below', lowHz: 400_000 }],
    ['gangMaxF', { gangMaxF: 40e-12 }],
    ['gangMinF', { gangMinF: 0 }],
    ['strayF', { strayF: -1e-12 }],
    ['points', { points: [600_000, 600_000, 1_400_000] }],
    ['points', { points: [500_000, 1_000_000, 1_400_000] }],
    ['alignHz', { alignHz: [600_000, 600_000] }],
    ['fixedPadderF', { fixedPadderF: 0 }],
  ])('refuses a bad %s by name', async (field, change) => {
    const { body } = await visitor.post('/api/tracking', { ...design, ...change }).expect(400);

    expect(paths(body)).toContain(field);
  });

  it.each<[string, object]>([
    ['points a hertz apart', { points: [1_000_000, 1_000_001, 1_000_002] }],
    ['a gang of hardly any swing', { gangMinF: 399e-12 }],
    ['a gang of a million to one', { gangMinF: 1e-13, gangMaxF: 1e-7 }],
    ['an IF of 1 kHz', { ifHz: 1000 }],
    ['an IF of 1 GHz', { ifHz: 1_000_000_000 }],
    ['a band from 1 kHz', { lowHz: 1000, points: 'best' }],
    ['a band of 2 Hz, tracked as well as can be', { highHz: 550_002, points: 'best' }],
    ['a stray larger than the gang', { trimmer: 'coil', strayF: 1e-9 }],
    ['a padder of 1 mF', { fixedPadderF: 1e-3, alignHz: [600_000, 1_400_000] }],
    ['a padder of 0.01 pF', { fixedPadderF: 1e-14, alignHz: [600_000, 1_400_000] }],
  ])('answers finite parts or a reason for %s', async (_what, change) => {
    const { body } = await visitor.post('/api/tracking', { ...design, ...change }).expect(200);

    const { refused, signalCoilH, oscillatorCoilH, worstErrorHz } = trackingAnswer.parse(body);
    if (refused) expect(refused.reason).toMatch(/\w.*\.$/u);
    else
      for (const part of [signalCoilH, oscillatorCoilH, worstErrorHz]) expect(part).not.toBeNull();
  });
});
