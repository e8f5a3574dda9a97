import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  oneBandReceiver,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { plainCase, receivers, sites, stationLists } from '../../../test/support/random-cases.ts';
import { advise } from './advice.ts';
import { assess } from '../assessment/assessment.ts';
import { type CandidatesInput, judgeCandidates } from './candidates.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';

const narrow = oneBandReceiver({
  ifHz: 560_000,
  lowHz: 600_000,
  highHz: 1_600_000,
  circuits: 2,
  q: 80,
  widths: [3_000, 12_000],
});

function inRegion2(
  list: readonly (readonly [number, number])[],
  over: Partial<CandidatesInput> = {},
): CandidatesInput {
  const { stations, fields } = givenStations(list);
  return {
    receiver: narrow,
    cases: [
      {
        site: siteIn(2),
        stations,
        fields: { day: fields, night: fields },
        raster: defaultRaster(2),
      },
    ],
    periods: ['night'],
    fromHz: 545_000,
    toHz: 565_000,
    stepHz: 500,
    maxM: 3,
    maxN: 2,
    ...over,
  };
}

describe('judgeCandidates', () => {
  it('finds the middle of the guard band between two equal stations', () => {
    const { candidates, present, ranking } = judgeCandidates(
      inRegion2(
        [
          [550_000, 90],
          [560_000, 90],
        ],
        { fromHz: 551_000, toHz: 560_000 },
      ),
    );

    // A little below the middle: 560 kHz, nearer to the band, comes through more strongly.
    expect(candidates[0]?.ifHz).toBe(554_500);
    expect(candidates).toHaveLength(19);
    expect(present.ifHz).toBe(560_000);
    expect(ranking).toMatch(/comes before/);
  });

  it('judges each IF as an assessment with that IF does', () => {
    const cases = fc.record({ receiver: receivers, site: sites, stations: stationLists });
    fc.assert(
      fc.property(cases, fc.integer({ min: -20, max: 20 }), (drawn, shift) => {
        const orders = { period: 'night', maxM: 3, maxN: 2 } as const;
        const { input } = plainCase({ ...drawn, ...orders });
        const ifHz = drawn.receiver.ifHz + 1_000 * shift;
        const { stations, fields, raster } = input;
        const found = judgeCandidates({
          receiver: drawn.receiver,
          cases: [{ site: drawn.site, stations, fields: { night: fields }, raster }],
          periods: ['night'],
          fromHz: ifHz,
          toHz: ifHz,
          stepHz: 1,
          ...orders,
        }).candidates[0];
        const all = assess({
          ...input,
          receiver: { ...drawn.receiver, ifHz },
          site: drawn.site,
          leaveOutBetterThan: 'imperceptible',
          limit: 10_000,
          ...orders,
        });
        const worst = (causes: (cause: string) => boolean): number | undefined =>
          all.bands
            .flatMap(({ responses }) => responses)
            .filter(({ cause, ratioDb }) => ratioDb !== null && causes(cause))
            .map(({ ratioDb }) => ratioDb ?? NaN)
            .toSorted((a, b) => a - b)[0];

        expect(found?.deficitDb).toBeCloseTo(all.verdict.deficitDb, 6);
        const { breakthrough, image, products } = found?.night ?? {};
        const close = (db: number | null | undefined, expected: number | undefined): void => {
          if (expected === undefined) expect(db).toBeNull();
          else expect(db).toBeCloseTo(expected, 6);
        };
        close(
          breakthrough?.worstRatioDb,
          worst((cause) => cause === 'breakthrough'),
        );
        close(
          image?.worstRatioDb,
          worst((cause) => cause === 'image'),
        );
        close(
          products?.worstRatioDb,
          worst((cause) => !['breakthrough', 'image', 'intermodulation'].includes(cause)),
        );
      }),
      { numRuns: 60 },
    );
  }, 60_000);

  it('gives each period asked, and orders by the worse', () => {
    const input = inRegion2([[560_000, 90]], { periods: ['day', 'night'] });
    const quietDay = input.cases.map((each) => ({
      ...each,
      stations: each.stations.map((station) => ({ ...station, fieldDb: null })),
      fields: { ...each.fields, day: [] },
    }));
    const { present } = judgeCandidates({ ...input, cases: quietDay });

    expect(present.day?.breakthrough.worstRatioDb).toBeNull();
    expect(present.night?.breakthrough.worstRatioDb).toBeLessThan(0);
    expect(present.deficitDb).toBeGreaterThan(30);
  });

  it('takes the worst of several cases', () => {
    const bad = inRegion2([[560_000, 90]]).cases;
    const good = inRegion2([[1_000_000, 60]]).cases;
    const both = judgeCandidates(inRegion2([], { cases: [...good, ...bad] }));
    const alone = judgeCandidates(inRegion2([], { cases: bad }));

    expect(both.present.deficitDb).toBe(alone.present.deficitDb);
    expect(both.present.night).toEqual(alone.present.night);
  });

  it('gives what else must move, and the window that must be kept', () => {
    const { candidates } = judgeCandidates(inRegion2([[560_000, 90]]));
    const moved = candidates.find(({ ifHz }) => ifHz === 555_000);

    expect(moved).toMatchObject({ bfoShiftHz: -5_000, trackingCostDb: null });
    expect(moved?.capacitanceChange).toBeCloseTo(0.0181, 4);
    expect(moved?.windowHz.high).toBeGreaterThan(555_000);
    expect(moved?.windowHz.high).toBeLessThan(556_000);
    expect(moved?.night?.changeSigmaDb).toBeGreaterThan(8);
  });

  it('puts candidates out of reach last', () => {
    const { candidates } = judgeCandidates(
      inRegion2([[560_000, 90]], { fromHz: 500_000, toHz: 560_000, stepHz: 5_000 }),
    );
    const reach = candidates.map(({ reachable }) => reachable.ok);

    expect(reach.indexOf(false)).toBe(reach.lastIndexOf(true) + 1);
    expect(candidates.at(-1)?.reachable.reason).toMatch(/reach/);
  });

  it('refuses a range upside down, no step and more than 400 candidates', () => {
    const judge = (over: Partial<CandidatesInput>) => () => judgeCandidates(inRegion2([], over));

    expect(judge({ toHz: 1 })).toThrow(/toHz/);
    expect(judge({ fromHz: 0 })).toThrow(/fromHz/);
    expect(judge({ stepHz: 0 })).toThrow(/stepHz/);
    expect(judge({ stepHz: 1 })).toThrow(/stepHz gives 20001/);
  });
});

describe('advise', () => {
  const list = [[560_000, 90]] as const;
  const adviceFor = (receiver: Receiver) => advise(judgeCandidates(inRegion2(list, { receiver })));

  it('advises the first candidate when the move pays, with what it changes', () => {
    const advice = adviceFor(narrow);

    expect(advice.ifHz).not.toBeNull();
    expect(advice).toMatchObject({ period: 'night', isHeardNow: true });
    expect(advice.deficitGainDb).toBeGreaterThan(20);
  });

  it('advises nothing when nothing is better', () => {
    const fixedFilter = { kind: 'crystal', centreHz: 560_000, widthHz: 200 } as const;
    const advice = adviceFor({ ...narrow, fixedFilter });

    expect(advice).toMatchObject({ ifHz: null, deficitGainDb: 0, bfoShiftHz: 0 });
    expect(advise(judgeCandidates(inRegion2([], { receiver: plainReceiver() }))).ifHz).toBeNull();
  });
});
