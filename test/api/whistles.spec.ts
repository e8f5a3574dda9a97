import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { whistlesAnswer } from '../../shared/contracts/whistles.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';
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
const asked = (change: object = {}) => ({
  receiver: sentReceiver(),
  site: BARE_SITE,
  stations: [
    { name: 'Wanted', frequencyHz: 612_000, fieldDb: 70 },
    { name: 'Next door', frequencyHz: 621_000, fieldDb: 90 },
    { name: 'On the IF', frequencyHz: 456_000, fieldDb: 80 },
    { name: 'At the image', frequencyHz: 1_521_000, fieldDb: 75 },
  ],
  dialHz: 612_000,
  ...change,
});
const explained = async (change: object = {}) => {
  const { body } = await visitor.post('/api/whistles', asked(change)).expect(200);
  return whistlesAnswer.parse(body);
};

describe('POST /api/whistles', () => {
  it('tells a visitor what may whistle, the station listened to among it', async () => {
    const { wanted, causes } = await explained();

    expect(wanted).toEqual({ station: 0, frequencyHz: 612_000, fieldDb: 70 });
    expect(causes.map(({ cause }) => cause)).toEqual(
      expect.arrayContaining(['adjacent-carrier', 'breakthrough', 'image']),
    );
  });

  it('puts first what agrees with pitch and slope: an image moves twice as fast', async () => {
    const [image] = (await explained({ pitchHz: 1050, pitchSlope: 2 })).causes;

    // Oscillator 1067 kHz: 1521 less 1067 is 454 and falls, 455 rises.
    expect(image).toMatchObject({ cause: 'image', station: 3, pitchHz: 1000, slope: 2 });
    expect(image?.test).toContain('Caution');
  });

  it('computes with an edition for its owner, and asks a visitor to sign in', async () => {
    const owner = await server.newcomer();
    const editionId = await importList(owner, await addRegion(owner), cleanList(300));
    const request = { receiver: sentReceiver(), site: SITE, editionId, dialHz: 909_000 };

    const { body } = await owner.post('/api/whistles', request).expect(200);

    expect(whistlesAnswer.parse(body).causes.length).toBeGreaterThan(0);
    await visitor.post('/api/whistles', request).expect(401);
  });

  it('takes day, night and a moment', async () => {
    for (const period of ['day', 'night', '2026-12-21T18:30:00Z']) {
      expect((await explained({ period })).causes.length).toBeGreaterThan(0);
    }
  });

  it('says which stations could not be computed', async () => {
    const stations = [{ frequencyHz: 900_000, latitude: 50, longitude: 8 }];

    const { skipped } = await explained({ site: SITE, stations });

    expect(skipped).toMatchObject([{ station: 0 }]);
    expect(skipped[0]?.reason).not.toBe('');
  });

  it.each<[string, object]>([
    ['dialHz', { dialHz: 300_000 }],
    ['dialHz', { dialHz: undefined }],
    ['period', { period: 'dusk' }],
    ['pitchHz', { pitchHz: -1 }],
    ['pitchSlope', { pitchSlope: 'fast' }],
    ['stations', { stations: undefined }],
    ['site.ituRegion', { site: { noise: 'rural' } }],
    ['receiver.ifHz', { receiver: { ...sentReceiver(), ifHz: 'high' } }],
    ['colour', { colour: 'red' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await visitor.post('/api/whistles', asked(change)).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });
});
