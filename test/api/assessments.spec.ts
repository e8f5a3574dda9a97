import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { assessment } from '../../shared/contracts/assessment.ts';
import { candidatesAnswer } from '../../shared/contracts/candidates.ts';
import { fieldStrengthsAnswer } from '../../shared/contracts/field-strengths.ts';
import type { ReceiverInput } from '../../shared/contracts/receiver.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';
import { sentReceiver } from '../support/receivers.ts';
import { BARE_SITE, sentSite } from '../support/sites.ts';

let server: ApiServer;
let visitor: ApiClient;
let librarian: ApiClient;
let editionId: number;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
  librarian = await server.newcomer();
  editionId = await importList(librarian, await addRegion(librarian), cleanList(300));
});
afterAll(() => server.close());

const { name: _name, ...SITE } = sentSite();
const STATIONS = [{ name: 'Strong one', frequencyHz: 1_521_000, fieldDb: 90 }];
const asked = (change: object = {}) => ({
  receiver: sentReceiver(),
  site: BARE_SITE,
  stations: STATIONS,
  ...change,
});
const bands = (change: object): ReceiverInput['bands'] => [
  { name: 'MW', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above', ...change },
];

describe('POST /api/assessments', () => {
  it('answers a visitor for stations whose field is given', async () => {
    const receiver = sentReceiver({ strayDb: null });

    const { body } = await visitor.post('/api/assessments', asked({ receiver })).expect(200);

    const [image] = assessment.parse(body).bands[0]?.responses ?? [];
    // Q 80, one circuit, IF 455 kHz, widths 6 and 22 kHz: the project's second implementation.
    expect(image).toMatchObject({ station: 0, cause: 'image', dialHz: 612_000, beatHz: 1000 });
    expect(image?.interferenceDb).toBeCloseTo(45.565, 2);
    expect(image?.ratioDb).toBeCloseTo(0.353, 2);
    expect(image?.grade).toBe('very-annoying');
  });

  it('answers a visitor who has no list', async () => {
    const request = { receiver: sentReceiver(), site: BARE_SITE, everyChannelDb: 70 };

    const { body } = await visitor.post('/api/assessments', request).expect(200);

    expect(assessment.parse(body).verdict.usable).toBeGreaterThan(100);
  });

  it('computes with an edition of one’s own, by the ids of its stations', async () => {
    const request = { receiver: sentReceiver(), site: SITE, editionId, leaveOutBetterThan: null };

    const { body } = await librarian.post('/api/assessments', request).expect(200);
    const { body: again } = await librarian.post('/api/assessments', request).expect(200);

    const { verdict, bands: judged } = assessment.parse(body);
    const { body: page } = await librarian.get(`/api/editions/${editionId}/stations?pageSize=500`);
    const ids = new Set(page.items.map(({ id }: { id: number }) => id));
    expect(verdict.usable).toBeGreaterThan(0);
    expect(judged[0]?.total).toBeGreaterThan(0);
    expect(judged[0]?.responses.every(({ station }) => ids.has(station))).toBe(true);
    expect(again).toEqual(body);
  });

  it('asks a visitor to sign in for an edition, and hides that of others', async () => {
    const request = { receiver: sentReceiver(), site: SITE, editionId };
    const stranger = await server.newcomer();

    await visitor.post('/api/assessments', request).expect(401);
    await stranger.post('/api/assessments', request).expect(404);
    await librarian.post('/api/assessments', { ...request, editionId: 4e9 }).expect(404);
  });

  it('says which stations could not be computed, and why', async () => {
    const stations = [...STATIONS, { frequencyHz: 900_000, latitude: 50, longitude: 8 }];

    const { body } = await visitor
      .post('/api/assessments', asked({ site: SITE, stations }))
      .expect(200);

    expect(body.skipped).toMatchObject([{ station: 1 }]);
  });

  it('asks for place and ground where a field has to be computed', async () => {
    const stations = [{ frequencyHz: 900_000, latitude: 50, longitude: 8, powerDayW: 1000 }];

    const { body } = await visitor.post('/api/assessments', asked({ stations })).expect(400);

    expect(body.issues.map(({ path }: { path: string }) => path)).toEqual([
      'site.latitude',
      'site.longitude',
      'site.ground',
    ]);
  });

  it('warns of an IF inside a band of the set, for such sets exist', async () => {
    const receiver = sentReceiver({ ifHz: 560_000 });

    const { body } = await visitor.post('/api/assessments', asked({ receiver })).expect(200);

    expect(body.warnings).toContainEqual(expect.objectContaining({ path: 'ifHz' }));
  });

  it.each<[string, object]>([
    ['receiver.ifHz', { receiver: sentReceiver({ ifHz: 0 }) }],
    ['receiver.ifHz', { receiver: { ...sentReceiver(), ifHz: 'high' } }],
    ['receiver.bands.0.highHz', { receiver: sentReceiver({ bands: bands({ highHz: 500_000 }) }) }],
    [
      'receiver.bands.0.oscillator',
      { receiver: sentReceiver({ bands: bands({ lowHz: 400_000, oscillator: 'below' }) }) },
    ],
    ['receiver.colour', { receiver: { ...sentReceiver(), colour: 'walnut' } }],
    ['site.latitude', { site: { ...SITE, latitude: 95 } }],
    ['site.ituRegion', { site: { noise: 'rural' } }],
    ['site.noise', { site: { ituRegion: 1 } }],
    ['stations.0.frequencyHz', { stations: [{ frequencyHz: 0, fieldDb: 60 }] }],
    ['stations', { editionId: 1 }],
    ['stations', { stations: undefined }],
    ['period', { period: 'dusk' }],
    ['maxN', { maxN: 4 }],
    ['limit', { limit: 10_001 }],
    ['colour', { colour: 'red' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await visitor.post('/api/assessments', asked(change)).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });
});

describe('POST /api/if-candidates', () => {
  const range = { fromHz: 445_000, toHz: 465_000, stepHz: 5000 };

  it('judges each candidate in the order of the ranking', async () => {
    const request = asked({ ...range, periods: ['night'] });

    const { body } = await visitor.post('/api/if-candidates', request).expect(200);

    const { present, candidates, ranking } = candidatesAnswer.parse(body);
    expect(present.ifHz).toBe(455_000);
    expect(candidates.map(({ ifHz }) => ifHz).sort()).toEqual([
      445_000, 450_000, 455_000, 460_000, 465_000,
    ]);
    expect(ranking).not.toBe('');
  });

  it('says where an oscillator below the signal would reach zero', async () => {
    const receiver = sentReceiver({ ifRange: 0.5, bands: bands({ oscillator: 'below' }) });
    const request = asked({ receiver, fromHz: 540_000, toHz: 560_000, stepHz: 10_000 });

    const { body } = await visitor.post('/api/if-candidates', request).expect(200);

    const { candidates } = candidatesAnswer.parse(body);
    const within = candidates.filter(({ reachable }) => reachable.ok).map(({ ifHz }) => ifHz);
    expect(within).toEqual([540_000]);
    expect(candidates[1]?.reachable.reason).toContain('would reach zero');
  });

  it('takes several cases, each from its own source', async () => {
    const cases = [
      { site: SITE, editionId },
      { site: BARE_SITE, everyChannelDb: 60 },
    ];
    const request = { receiver: sentReceiver(), cases, ...range };

    const { body } = await librarian.post('/api/if-candidates', request).expect(200);

    expect(candidatesAnswer.parse(body).candidates[0]).toMatchObject({ day: {}, night: {} });
    await visitor.post('/api/if-candidates', request).expect(401);
  });

  it.each<[string, object]>([
    ['stepHz', { stepHz: 10 }],
    ['toHz', { toHz: 400_000 }],
    ['site', { site: undefined }],
    ['cases', { cases: [{ site: BARE_SITE, everyChannelDb: 60 }] }],
    [
      'cases.0.site.latitude',
      {
        cases: [{ site: BARE_SITE, stations: [{ frequencyHz: 900_000, powerDayW: 1 }] }],
        site: undefined,
        stations: undefined,
      },
    ],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const request = asked({ ...range, ...change });

    const { body } = await visitor.post('/api/if-candidates', request).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });
});

describe('POST /api/field-strengths', () => {
  it('answers the field of each station with its name and what is missing', async () => {
    const stations = [
      { name: 'Near', frequencyHz: 1_000_000, latitude: 50.4, longitude: 8, powerDayW: 10_000 },
      { name: 'Nowhere', frequencyHz: 1_000_000, powerDayW: 10_000 },
      { name: 'Given', frequencyHz: 1_000_000, fieldDb: 61 },
    ];

    const { body } = await visitor
      .post('/api/field-strengths', { site: SITE, stations, period: 'day' })
      .expect(200);

    const [near, nowhere, given] = fieldStrengthsAnswer.parse(body).fields;
    expect(near).toMatchObject({ station: 0, name: 'Near', frequencyHz: 1_000_000, skyDb: null });
    expect(near?.fieldDb).toBeGreaterThan(60);
    expect(nowhere).toMatchObject({ fieldDb: null, notes: ['The station has no place.'] });
    expect(given?.fieldDb).toBe(61);
  });

  it('computes an edition at a site', async () => {
    const request = { site: SITE, editionId, period: 'night' };

    const { body } = await librarian.post('/api/field-strengths', request).expect(200);

    expect(fieldStrengthsAnswer.parse(body).fields).toHaveLength(300);
  });

  describe('at a moment', () => {
    const stations = [
      {
        frequencyHz: 1_000_000,
        latitude: 54,
        longitude: 8,
        powerDayW: 10_000,
        powerNightW: 10_000,
      },
    ];
    const fieldAt = async (period: string) => {
      const { body } = await visitor
        .post('/api/field-strengths', { site: SITE, stations, period })
        .expect(200);
      return fieldStrengthsAnswer.parse(body).fields[0];
    };

    it('is day at noon, night at midnight and between the two at sunrise', async () => {
      const [morning, day, night] = [
        await fieldAt('2026-03-20T07:00:00+01:00'),
        await fieldAt('day'),
        await fieldAt('night'),
      ];

      expect(await fieldAt('2026-03-20T12:00:00Z')).toEqual(day);
      expect(await fieldAt('2026-03-20T23:30:00+01:00')).toEqual(night);
      expect(morning?.fieldDb).toBeLessThan(night?.fieldDb ?? NaN);
      expect(morning?.fieldDb).toBeGreaterThan(day?.fieldDb ?? NaN);
    });

    it('judges a receiver at a moment as by day or at night', async () => {
      const judged = async (period: string) => {
        const request = asked({ site: SITE, stations, period, leaveOutBetterThan: null });
        return (await visitor.post('/api/assessments', request).expect(200)).body;
      };

      expect(await judged('2026-03-20T12:00:00Z')).toEqual(await judged('day'));
      expect(await judged('2026-12-21T22:00:00Z')).toEqual(await judged('night'));
    });

    it.each([
      'noon',
      '2026-03-20',
      '2026-03-20T12:00:00',
      '2026-02-30T12:00:00Z',
      '9999-01-01T00:00:00Z',
      5,
    ])('refuses %s as a time', async (period) => {
      const { body } = await visitor
        .post('/api/field-strengths', { site: SITE, stations, period })
        .expect(400);

      expect(body.issues).toMatchObject([{ path: 'period' }]);
    });
  });

  it('computes the sky wave that was asked for, and says so', async () => {
    const stations = [{ frequencyHz: 1_000_000, latitude: 54, longitude: 8, powerNightW: 10_000 }];
    const field = async (skyWave?: object) => {
      const request = { site: SITE, stations, skyWave };
      const { body } = await visitor.post('/api/field-strengths', request).expect(200);
      return fieldStrengthsAnswer.parse(body).fields[0];
    };
    const [usual, tenth] = [await field(), await field({ nights: 10 })];

    expect(await field({ form: 'cfr-73-190', nights: 50 })).toEqual(usual);
    expect(tenth?.skyDb).toBeGreaterThan((usual?.skyDb ?? NaN) + 5.9);
    expect(tenth?.notes.join(' ')).toContain('10 %');
    expect((await field({ form: 'itu-r-p1147' }))?.notes.join(' ')).toContain('P.1147');

    const request = { site: SITE, stations, skyWave: { nights: 20 } };
    const { body } = await visitor.post('/api/field-strengths', request).expect(400);
    expect(body.issues).toMatchObject([{ path: 'skyWave.nights' }]);
    await visitor.post('/api/assessments', asked({ skyWave: { nights: 10 } })).expect(200);
  });

  it('takes the grounds of the path and the pattern of the aerial along', async () => {
    const plain = { frequencyHz: 1_000_000, latitude: 51, longitude: 8, powerDayW: 10_000 };
    const patternDb = Array<number>(36).fill(-6);
    const path = [
      { ground: 'sea', lengthM: 50_000 },
      { ground: 'average', lengthM: 50_000 },
    ];
    const stations = [plain, { ...plain, patternDb }, { ...plain, path }];

    const { body } = await visitor
      .post('/api/field-strengths', { site: SITE, stations, period: 'day' })
      .expect(200);

    const [first, beamed, mixed] = fieldStrengthsAnswer.parse(body).fields;
    expect(beamed?.fieldDb).toBeCloseTo((first?.fieldDb ?? NaN) - 6, 9);
    expect(mixed?.notes.join(' ')).toContain('Millington');
    expect(mixed?.fieldDb).not.toBeCloseTo(first?.fieldDb ?? NaN, 1);
  });

  it.each([
    ['stations.0.patternDb', { patternDb: [0, 0, 0] }],
    ['stations.0.path', { path: [] }],
    ['stations.0.path.0.lengthM', { path: [{ ground: 'sea', lengthM: 0 }] }],
    ['stations.0.path.0.ground', { path: [{ ground: 'ice', lengthM: 10 }] }],
  ])('names %s when it is wrong', async (path, change) => {
    const stations = [{ frequencyHz: 1_000_000, fieldDb: 60, ...change }];

    const { body } = await visitor
      .post('/api/field-strengths', { site: SITE, stations })
      .expect(400);

    expect(body.issues).toMatchObject([{ path }]);
  });
});
