import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { breakthroughHoursAnswer } from '../../shared/contracts/breakthrough-hours.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';
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
const STATIONS = [
  { frequencyHz: 455_000, latitude: 54, longitude: 8, powerDayW: 1e6, powerNightW: 1e6 },
];
const asked = (change: object = {}) => ({
  receiver: sentReceiver({ strayDb: null }),
  site: SITE,
  stations: STATIONS,
  date: '2026-03-20',
  ...change,
});

describe('POST /api/breakthrough-hours', () => {
  it('answers every half-hour of the day, and when the breakthrough rises and falls', async () => {
    const { body } = await visitor.post('/api/breakthrough-hours', asked()).expect(200);

    const { hours, rises, falls } = breakthroughHoursAnswer.parse(body);
    expect(hours.map(({ at }) => at.slice(11, 16)).slice(0, 3)).toEqual([
      '00:00',
      '00:30',
      '01:00',
    ]);
    expect(hours).toHaveLength(48);
    expect(hours[0]?.breakthrough).toMatchObject({ station: 0 });
    // Equinox at 8 degrees east: up about 05:35, down about 17:45 UTC, critical hours within.
    expect(falls.map((at) => at.slice(0, 12))).toEqual(['2026-03-20T0']);
    expect(rises.map((at) => at.slice(0, 12))).toEqual(['2026-03-20T1']);
  });

  it('computes the sky wave that is asked for: more in 10 % of the nights, and by either form', async () => {
    const atMidnight = async (skyWave: object | undefined) => {
      const { body } = await visitor
        .post('/api/breakthrough-hours', asked({ skyWave }))
        .expect(200);
      return breakthroughHoursAnswer.parse(body).hours[0]?.breakthrough?.levelDb ?? NaN;
    };
    const [usual, said, tenth, other] = await Promise.all(
      [undefined, { nights: 50 }, { nights: 10 }, { form: 'itu-r-p1147' }].map(atMidnight),
    );

    expect(said).toBe(usual);
    // 0.2 |geomagnetic latitude| - 2, some 56 degrees here; a little less, the ground wave added.
    expect((tenth ?? NaN) - (usual ?? NaN)).toBeCloseTo(9, 0);
    expect(other).not.toBeCloseTo(usual ?? NaN, 1);
    expect(other).toBeGreaterThan((usual ?? NaN) - 4);
  });

  it('computes with an edition of one’s own, and hides that of others', async () => {
    const librarian = await server.newcomer();
    const editionId = await importList(librarian, await addRegion(librarian), cleanList(50));
    const request = { ...asked(), stations: undefined, editionId };

    const { body } = await librarian.post('/api/breakthrough-hours', request).expect(200);

    expect(breakthroughHoursAnswer.parse(body).hours).toHaveLength(48);
    await visitor.post('/api/breakthrough-hours', request).expect(401);
    const stranger = await server.newcomer();
    await stranger.post('/api/breakthrough-hours', request).expect(404);
  });

  it.each<[string, object]>([
    ['date', { date: undefined }],
    ['date', { date: 'today' }],
    ['date', { date: '2026-02-29' }],
    ['date', { date: '9999-01-01' }],
    ['date', { date: '2026-03-20T00:00:00Z' }],
    ['stations', { stations: undefined }],
    ['skyWave.nights', { skyWave: { nights: 20 } }],
    ['skyWave.form', { skyWave: { form: 'other' } }],
    ['site.latitude', { site: { ...SITE, latitude: null } }],
  ])('names %s when it is wrong', async (path, change) => {
    const { body } = await visitor.post('/api/breakthrough-hours', asked(change)).expect(400);

    expect(body.issues.map((issue: { path: string }) => issue.path)).toContain(path);
  });
});
