import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { receivers, sites } from '../../../test/support/random-cases.ts';
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

/** Responses by all that identifies them, with the frequency in place of the station. */
function byIdentity(all: Assessment, list: List): Map<string, Response> {
  return new Map(
    all.bands.flatMap(({ name, responses }, index) =>
      responses.map((each) => {
        const [hz, db] = list[each.station] ?? [];
        return [`${index}/${name}/${hz}/${db}/${each.m}/${each.n}/${each.dialHz}`, each] as const;
      }),
    ),
  );
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

describe('laws of the ratio', () => {
  const set = plainReceiver({ strayDb: null });

  it('raising every field by 6.02 dB lowers the ratio by n times as much', () => {
    fc.assert(
      fc.property(list, (drawn) => {
        // An assumed wanted field everywhere: no station is usable over this noise.
        const site = siteIn(1, { noiseFloorDb: 200 });
        const louder = drawn.map(([hz, db]) => [hz, db + 6.02] as const);
        const before = responsesOf(assessed(set, site, drawn));
        const after = new Map(
          responsesOf(assessed(set, site, louder)).map((each) => [
            `${each.station}/${each.m}/${each.n}/${each.dialHz}`,
            each,
          ]),
        );

        for (const each of before) {
          const same = after.get(`${each.station}/${each.m}/${each.n}/${each.dialHz}`);
          expect(same?.ratioDb).toBeCloseTo((each.ratioDb ?? NaN) - 6.02 * (each.n ?? NaN), 6);
        }
      }),
      RUNS,
    );
  });

  it('one more circuit never lowers it', () => {
    fc.assert(
      fc.property(list, fc.constantFrom(null, { if: 60, image: 60 }), (drawn, strayDb) => {
        const site = siteIn(1);
        const one = plainReceiver({ strayDb });
        const circuits = [...(one.bands[0]?.circuits ?? []), { qLow: 40, qHigh: 60 }];
        const two = plainReceiver({ strayDb, bands: [plainBand({ circuits })] });
        const more = byIdentity(assessed(two, site, drawn), drawn);

        for (const [key, each] of byIdentity(assessed(one, site, drawn), drawn)) {
          if (each.m === 0 || each.ratioDb === null) continue;
          expect(more.get(key)?.ratioDb).toBeGreaterThanOrEqual(each.ratioDb - 1e-9);
        }
      }),
      RUNS,
    );
  });

  it('the order of the stations never matters', () => {
    fc.assert(
      fc.property(receivers, sites, list, (receiver, site, drawn) => {
        const forth = byIdentity(assessed(receiver, site, drawn), drawn);
        const reversed = drawn.toReversed();
        const back = byIdentity(assessed(receiver, site, reversed), reversed);

        expect([...back.keys()].sort()).toEqual([...forth.keys()].sort());
        for (const [key, each] of forth) {
          const same = back.get(key);
          expect(same?.grade).toBe(each.grade);
          if (each.ratioDb !== null) expect(same?.ratioDb).toBeCloseTo(each.ratioDb, 9);
        }
      }),
      RUNS,
    );
  });

  it('above and below mirror the image about the dial', () => {
    const band = plainBand({ lowHz: 1_500_000, highHz: 3_000_000, tuningToleranceHz: 0 });
    const dialHz = 2_000_000;
    const image = (oscillator: 'above' | 'below', hz: number): Response | undefined =>
      responsesOf(
        assessed(plainReceiver({ bands: [{ ...band, oscillator }] }), siteIn(1), [[hz, 90]], {
          raster: [{ lowHz: dialHz, highHz: dialHz, stepHz: 1 }],
        }),
      ).find(({ cause }) => cause === 'image');

    expect(image('above', dialHz + 910_000)).toMatchObject({ dialHz, beatHz: 0 });
    expect(image('below', dialHz - 910_000)).toMatchObject({ dialHz, beatHz: 0 });
  });
});

describe('laws of the verdict', () => {
  it('two lists add their powers at each setting', () => {
    fc.assert(
      fc.property(list, list, (one, other) => {
        // Above 4 MHz no station is listed here, so neither list changes the settings of the other.
        const shift = (drawn: List): List => drawn.map(([hz, db]) => [hz + 9_000_000, db + 20]);
        const band = plainBand({ lowHz: 4_000_000, highHz: 9_000_000 });
        const receiver = plainReceiver({ bands: [band] });
        const raster = [{ lowHz: 4_000_000, highHz: 9_000_000, stepHz: 5_000 }];
        const site = siteIn(1, { noiseFloorDb: -100 });
        const sums = (drawn: List): Map<number, number> =>
          new Map(
            assessed(receiver, site, drawn, { raster }).bands[0]?.totals.map(
              ({ dialHz, ratioDb }) => [dialHz, 10 ** (-ratioDb / 10)],
            ),
          );
        const [a, b, both] = [shift(one), shift(other), [...shift(one), ...shift(other)]].map(sums);

        for (const [dialHz, power] of both ?? []) {
          const added = (a?.get(dialHz) ?? 0) + (b?.get(dialHz) ?? 0);
          expect(power / added).toBeCloseTo(1, 9);
        }
      }),
      RUNS,
    );
  });

  it('what a quieter site lets be heard beside a station usable before does not harm it by itself', () => {
    fc.assert(
      fc.property(receivers, list, fc.integer({ min: -10, max: 40 }), (receiver, drawn, floor) => {
        const at = (noiseFloorDb: number): Map<string, Response> =>
          byIdentity(assessed(receiver, siteIn(1, { noiseFloorDb }), drawn), drawn);
        const quieter = at(floor - 6);

        for (const [key, before] of at(floor)) {
          const now = quieter.get(key);
          if (before.hidden !== 'noise' || before.wantedStation === null) continue;
          if (now?.hidden !== null || now.marginDb === null) continue;
          expect(now.marginDb).toBeGreaterThanOrEqual(2 - 1e-9);
        }
      }),
      RUNS,
    );
  });

  /*
   * It may by several: each response under the noise leaves a ratio of 32 dB or more, but two of
   * them add up to 29, and 30 are required. So the count of harmed stations may rise as noise falls.
   */
  it('a quieter site may bare two responses that harm together what neither harms alone', () => {
    const floor = 20;
    const wanted = [1_000_000, floor + 26] as const;
    const harmedAt = (noiseFloorDb: number, images: readonly number[]): number => {
      const list = [wanted, ...images.map((db) => [1_910_000, db] as const)];
      return assessed(plainReceiver(), siteIn(1, { noiseFloorDb }), list).verdict.harmed.length;
    };
    const loud = assessed(plainReceiver(), siteIn(1), [wanted, [1_910_000, 90]]);
    const image = loud.bands
      .flatMap(({ responses }) => responses)
      .find(({ cause, dialHz }) => cause === 'image' && dialHz === 1_000_000);
    const levelDb = (image?.interferenceDb ?? NaN) + (image?.weightingDb ?? NaN);
    const justHidden = 90 + (floor - 6.01 - levelDb);

    expect(harmedAt(floor, [justHidden, justHidden])).toBe(0);
    expect(harmedAt(floor - 6, [justHidden])).toBe(0);
    expect(harmedAt(floor - 6, [justHidden, justHidden])).toBe(1);
  });

  it('a quieter site never loses a usable station', () => {
    fc.assert(
      fc.property(receivers, list, fc.integer({ min: -10, max: 40 }), (receiver, drawn, floor) => {
        const usable = (noiseFloorDb: number): number =>
          assessed(receiver, siteIn(1, { noiseFloorDb }), drawn).verdict.usable;

        expect(usable(floor - 6)).toBeGreaterThanOrEqual(usable(floor));
      }),
      RUNS,
    );
  });

  it('raising a weak station never worsens the verdict of others', () => {
    fc.assert(
      fc.property(list, fc.integer({ min: 59, max: 177 }), (drawn, k) => {
        // The raised station is on the band, its own responses are silent behind three circuits.
        const quiet = { qLow: 150, qHigh: 150 };
        const receiver = plainReceiver({ bands: [plainBand({ circuits: [quiet, quiet, quiet] })] });
        const weakHz = k * 9_000 + 1_000;
        const harmed = (db: number): number[] =>
          assessed(receiver, siteIn(1), [...drawn, [weakHz, db]])
            .verdict.harmed.map(({ station }) => station)
            .filter((station) => station < drawn.length);

        expect(harmed(10).length).toBeGreaterThanOrEqual(harmed(30).length);
      }),
      RUNS,
    );
  });

  it('counts a station that two bands tune once', () => {
    const receiver = plainReceiver({
      bands: [plainBand(), plainBand({ lowHz: 900_000, highHz: 2_000_000 })],
    });

    expect(assessed(receiver, siteIn(1), [[999_000, 80]]).verdict.usable).toBe(1);
  });
});
