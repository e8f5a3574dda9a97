import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { curesAnswer } from '../../shared/contracts/cures.ts';
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
  receiver: sentReceiver({ strayDb: null }),
  site: BARE_SITE,
  stations: [
    { name: 'Beside the IF', frequencyHz: 457_000, fieldDb: 95 },
    { name: 'At the image', frequencyHz: 1_521_000, fieldDb: 75 },
  ],
  ...change,
});
const curesFor = async (change: object = {}) => {
  const { body } = await visitor.post('/api/cures', asked(change)).expect(200);
  return curesAnswer.parse(body).cures;
};

describe('POST /api/cures', () => {
  it('puts what can be done on one table for a visitor', async () => {
    const cures = await curesFor();
    const trap = cures.find(({ kind }) => kind === 'trap');

    expect(new Set(cures.map(({ kind }) => kind))).toEqual(
      new Set(['move-if', 'trap', 'other-side', 'one-more-circuit', 'screening']),
    );
    expect(Math.abs((trap?.trap?.frequencyHz ?? NaN) - 457_000)).toBeLessThan(1_500);
    expect(trap?.deficitAfterDb).toBeLessThan(trap?.deficitBeforeDb ?? NaN);
    for (const { gainDb, caution } of cures) {
      expect(gainDb.map(({ station }) => station)).toEqual([0, 1]);
      expect(caution).toContain('high tension');
    }
  });

  it('offers a trap that the receiver takes as it is, with the gain that was promised', async () => {
    const trap = (await curesFor()).find(({ kind }) => kind === 'trap');
    const receiver = sentReceiver({ strayDb: null, trap: trap?.trap?.trap ?? null });

    const [first] = await curesFor({ receiver });

    expect(first?.deficitBeforeDb).toBeCloseTo(trap?.deficitAfterDb ?? NaN, 6);
  });

  it('computes with an edition for its owner, and asks a visitor to sign in', async () => {
    const owner = await server.newcomer();
    const editionId = await importList(owner, await addRegion(owner), cleanList(300));
    const request = { receiver: sentReceiver(), site: SITE, editionId, periods: ['night'] };

    const { body } = await owner.post('/api/cures', request).expect(200);

    expect(curesAnswer.parse(body).cures.length).toBeGreaterThan(0);
    await visitor.post('/api/cures', request).expect(401);
    const stranger = await server.newcomer();
    await stranger.post('/api/cures', request).expect(404);
  });

  it('takes an assumed field on every channel', async () => {
    const change = { stations: undefined, everyChannelDb: 80, periods: ['day'] };

    expect((await curesFor(change)).length).toBeGreaterThan(0);
  });

  it.each<[string, object]>([
    ['periods', { periods: [] }],
    ['periods.0', { periods: ['dusk'] }],
    ['stations', { stations: undefined }],
    ['stations', { everyChannelDb: 80 }],
    ['site.ituRegion', { site: { noise: 'rural' } }],
    ['receiver.ifHz', { receiver: { ...sentReceiver(), ifHz: 'high' } }],
    ['colour', { colour: 'red' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await visitor.post('/api/cures', asked(change)).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });
});
