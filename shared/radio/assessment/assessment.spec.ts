import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { plainCase, receivers, sites, stationLists } from '../../../test/support/random-cases.ts';
import { assess, type Assessment, type AssessmentInput } from './assessment.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';
import type { Response } from './response.ts';
import type { Site } from '../site.ts';

type List = readonly (readonly [hz: number, db: number])[];

/** Assesses with every response answered. */
function assessed(
  receiver: Receiver,
  site: Site,
  list: List,
  over: Partial<AssessmentInput> = {},
): Assessment {
  return assess({
    receiver,
    site,
    ...givenStations(list),
    raster: defaultRaster(site.ituRegion),
    period: 'night',
    maxM: 3,
    maxN: 2,
    leaveOutBetterThan: null,
    limit: 10_000,
    ...over,
  });
}

function responsesOf(all: Assessment): Response[] {
  return all.bands.flatMap(({ responses }) => responses).filter(({ n }) => n !== null);
}

const list: fc.Arbitrary<List> = fc.uniqueArray(
  fc.tuple(
    fc.integer({ min: 59, max: 330 }).map((k) => k * 9_000),
    fc.integer({ min: 10, max: 100 }),
  ),
  { minLength: 1, maxLength: 15, selector: ([hz]) => hz },
);

/** Runs each law over enough cases to meet the odd ones. */
const RUNS = { numRuns: 25 };

describe('what is answered', () => {
  const receiver = plainReceiver();
  const site = siteIn(1);
  const images: List = [
    [1_521_000, 90],
    [1_530_000, 90],
    [1_539_000, 40],
  ];

  it('leaves out what is better than asked, and all that is hidden', () => {
    const all = assessed(receiver, site, images);
    const bad = assessed(receiver, site, images, { leaveOutBetterThan: 'annoying' });

    expect(responsesOf(all).some(({ grade }) => grade === 'hidden')).toBe(true);
    expect(responsesOf(bad).every(({ grade }) => grade?.endsWith('annoying'))).toBe(true);
    expect(responsesOf(bad).length).toBeLessThan(responsesOf(all).length);
    expect(bad.bands[0]?.total).toBe(bad.bands[0]?.responses.length);
    expect(bad.bands[0]?.totals).toEqual(all.bands[0]?.totals);
    expect(bad.verdict).toEqual(all.verdict);
  });

  it('answers the first of the order, whatever the limit, and counts all', () => {
    fc.assert(
      fc.property(
        receivers,
        sites,
        stationLists,
        fc.integer({ min: 1, max: 7 }),
        (set, at, drawn, limit) => {
          const { input } = plainCase({
            receiver: set,
            site: at,
            stations: drawn,
            period: 'night',
            maxM: 3,
            maxN: 2,
          });
          const asked = {
            ...input,
            receiver: set,
            site: at,
            period: 'night',
            maxM: 3,
            maxN: 2,
          } as const;
          const all = assess({ ...asked, leaveOutBetterThan: null, limit: 10_000 });
          const few = assess({ ...asked, leaveOutBetterThan: null, limit });

          few.bands.forEach((band, index) => {
            const whole = all.bands[index];
            expect(band.responses).toEqual(whole?.responses.slice(0, limit));
            expect(band.total).toBe(whole?.responses.length);
          });
        },
      ),
      RUNS,
    );
  });

  it('orders responses by ratio, then dial setting, station, m and n', () => {
    fc.assert(
      fc.property(receivers, sites, list, (set, at, drawn) => {
        for (const { responses } of assessed(set, at, drawn).bands) {
          const ratios = responses.map(({ ratioDb }) => ratioDb ?? Infinity);
          expect(ratios).toEqual(ratios.toSorted((a, b) => a - b));
        }
      }),
      RUNS,
    );
  });

  it('shows a working whose lines add up', () => {
    fc.assert(
      fc.property(receivers, sites, list, (set, at, drawn) => {
        for (const each of responsesOf(assessed(set, at, drawn))) {
          const lines = new Map(each.ledger.map(({ term, valueDb }) => [term, valueDb]));
          const parts = each.ledger.slice(
            0,
            each.ledger.findIndex(({ term }) => term === 'stray-limit' || term === 'interference'),
          );
          const n = each.n ?? NaN;
          const sum = parts.reduce((total, { valueDb }) => total + valueDb, 0);
          const limit = lines.get('stray-limit') ?? -Infinity;

          expect(each.interferenceDb).toBeCloseTo(n === 1 ? Math.max(sum, limit) : sum, 6);
          expect(lines.get('ratio')).toBeCloseTo(
            (lines.get('wanted') ?? NaN) - (lines.get('weighted-interference') ?? NaN),
            9,
          );
          expect(lines.get('margin')).toBe(each.marginDb);
        }
      }),
      RUNS,
    );
  });

  it('gives a pair of stations that make the IF between them once a band', () => {
    const all = assessed(receiver, site, [
      [1_000_000, 80],
      [1_456_000, 90],
      [1_500_000, 70],
    ]);

    expect(all.bands[0]?.responses.at(-1)).toMatchObject({
      cause: 'intermodulation',
      station: 1,
      secondStation: 0,
      beatHz: 1_000,
      m: null,
      dialHz: null,
      ratioDb: null,
      grade: null,
    });
  });

  it('lists stations without a field as skipped, with the reason', () => {
    const { stations, fields } = givenStations([[1_521_000, 90]]);
    const silent = { ...stations[0], id: 1, fieldDb: null, frequencyHz: 1_000_000 };
    const noted = { ...fields[0], station: 1, fieldDb: null, groundDb: null, notes: ['Silent.'] };
    const all = assess({
      receiver,
      site,
      stations: [...stations, silent] as typeof stations,
      fields: [...fields, noted] as typeof fields,
      raster: [],
      period: 'night',
      maxM: 1,
      maxN: 1,
      leaveOutBetterThan: null,
      limit: 10,
    });

    expect(all.skipped).toEqual([{ station: 1, reason: 'Silent.' }]);
  });

  it('answers an empty list with nothing heard and no number that is none', () => {
    const all = assessed(receiver, site, []);

    expect(all.verdict).toEqual({ usable: 0, harmed: [], emptyDial: null, deficitDb: 0 });
    expect(JSON.stringify(all)).not.toContain('null,"ifDb"');
    expect(all.bands[0]).toMatchObject({ total: 0, totals: [], responses: [] });
  });

  it('names the loudest response on an empty dial', () => {
    const { emptyDial } = assessed(receiver, site, [[1_521_000, 90]]).verdict;

    expect(emptyDial).toMatchObject({ dialHz: 612_000, station: 0 });
    expect(emptyDial?.overNoiseDb).toBeCloseTo(45.565 + 14.082 - 16.424, 2);
  });
});

describe('refusals', () => {
  const refused =
    (over: Partial<Receiver>, input: Partial<AssessmentInput> = {}) =>
    () =>
      assessed(plainReceiver(over), siteIn(1), [[1_521_000, 90]], input);

  it.each([
    [
      'a Q of 0',
      { bands: [plainBand({ circuits: [{ qLow: 0, qHigh: 80 }] })] },
      /Q must be above 0/,
    ],
    ['a band of no width', { bands: [plainBand({ lowHz: 1e6, highHz: 1e6 })] }, /highHz/],
    ['a harmonic beyond the model', { bands: [plainBand({ oscillatorHarmonic: 6 })] }, /Harmonic/],
    ['widths upside down', { selectivity: { kind: 'widths', b6Hz: 9, b60Hz: 6 } }, /b60Hz/],
  ] as const)('refuses %s', (_, over, message) => {
    expect(refused(over as Partial<Receiver>)).toThrow(message);
  });

  it('refuses orders beyond the model and a limit of 0', () => {
    expect(refused({}, { maxM: 6 })).toThrow(/maxM must be 0 to 5/);
    expect(refused({}, { maxN: 4 })).toThrow(/maxN must be 1 to 3/);
    expect(refused({}, { limit: 0 })).toThrow(/limit/);
  });

  it('refuses a site without a class of noise or a floor', () => {
    expect(() => assessed(plainReceiver(), siteIn(1, { noise: null }), [])).toThrow(/noise/);
  });
});

describe('warnings', () => {
  const paths = (over: Partial<Receiver>, input: Partial<AssessmentInput> = {}): string[] =>
    assessed(plainReceiver(over), siteIn(1), [[1_521_000, 90]], input).warnings.map(
      ({ path }) => path,
    );

  it('names the field each is about', () => {
    expect(paths({ ifHz: 560_000 })).toContain('ifHz');
    expect(paths({ selectivity: { kind: 'widths', b6Hz: 6_000, b60Hz: 12_000 } })).toContain(
      'selectivity',
    );
    expect(paths({ strayDb: { if: 60, image: 60 } })).toContain('strayDb');
    expect(paths({ bands: [plainBand({ lowHz: 150_000 })] })).toContain('bands.0.lowHz');
    expect(paths({ bands: [plainBand({ oscillatorHarmonic: 4 })] })).toContain(
      'bands.0.oscillatorHarmonic',
    );
  });

  it('says nothing about what is in order', () => {
    expect(paths({}, { period: 'day' })).toEqual([]);
  });
});
