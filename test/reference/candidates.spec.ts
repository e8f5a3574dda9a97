import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/candidates.json' with { type: 'json' };
import { assess } from '../../shared/radio/assessment/assessment.ts';
import { type Candidates, judgeCandidates } from '../../shared/radio/candidates/candidates.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { ItuRegion } from '../../shared/radio/site.ts';
import {
  givenStations,
  oneBandReceiver,
  plainBand,
  plainReceiver,
  siteIn,
} from '../support/plain-sets.ts';

const { guardBand, rasterDistances, dialEnds } = reference;

function judge(widths: readonly number[]): Candidates {
  const { stations, fields } = givenStations([[guardBand.stationHz, guardBand.fieldDb]]);
  const ituRegion = guardBand.ituRegion as ItuRegion;
  return judgeCandidates({
    receiver: oneBandReceiver({
      ifHz: guardBand.presentHz,
      lowHz: 600_000,
      highHz: 1_600_000,
      circuits: 2,
      q: 80,
      widths,
    }),
    cases: [
      {
        site: siteIn(ituRegion),
        stations,
        fields: { night: fields },
        raster: defaultRaster(ituRegion),
      },
    ],
    periods: ['night'],
    fromHz: guardBand.betterHz,
    toHz: guardBand.presentHz,
    stepHz: guardBand.presentHz - guardBand.betterHz,
    maxM: 3,
    maxN: 2,
  });
}

describe(`${guardBand.source} [${guardBand.mark}]`, () => {
  const { narrow, broad, betterHz, presentHz, secondHarmonicHz } = guardBand;

  it('ranks the IF in the guard band first', () => {
    const { candidates } = judge(narrow.widths);

    expect(candidates.map(({ ifHz }) => ifHz)).toEqual([betterHz, presentHz]);
    expect(100 * (candidates[0]?.capacitanceChange ?? NaN)).toBeCloseTo(
      guardBand.capacitancePercent,
      2,
    );
  });

  it('leaves the second harmonic on a channel all the same', () => {
    const { candidates, present } = judge(narrow.widths);
    const second = [present, candidates[0]].map((each) => each?.harmonics[0]);

    expect(second).toMatchObject([
      { dialHz: secondHarmonicHz.present, beatHz: 0 },
      { dialHz: secondHarmonicHz.better, beatHz: 0 },
    ]);
  });

  it('gains much with a narrow IF and nothing with a broad one', () => {
    const change = (widths: readonly number[]): number =>
      judge(widths).candidates.find(({ ifHz }) => ifHz === betterHz)?.night?.breakthroughChangeDb ??
      NaN;

    expect(change(narrow.widths)).toBeLessThan(-narrow.leastGainDb);
    expect(Math.abs(change(broad.widths))).toBeLessThan(broad.mostGainDb);
  });
});

describe(`${rasterDistances.source} [${rasterDistances.mark}]`, () => {
  it.each(rasterDistances.checks)('IF $ifHz, Region $ituRegion', (check) => {
    const ituRegion = check.ituRegion as ItuRegion;
    const { present } = judgeCandidates({
      receiver: plainReceiver({ ifHz: check.ifHz }),
      cases: [
        {
          site: siteIn(ituRegion),
          stations: [],
          fields: { night: [] },
          raster: defaultRaster(ituRegion),
        },
      ],
      periods: ['night'],
      fromHz: check.ifHz,
      toHz: check.ifHz,
      stepHz: 1,
      maxM: 3,
      maxN: 2,
    });

    expect(present.rasterDistanceHz).toEqual(check.distanceHz);
  });
});

describe(`${dialEnds.source} [${dialEnds.mark}]`, () => {
  it.each(dialEnds.checks)('$lowHz to $highHz, IF $ifHz', (check) => {
    const { lowHz, highHz, ifHz, breakthroughHz } = check;
    const curve =
      assess({
        receiver: plainReceiver({ ifHz, bands: [plainBand({ lowHz, highHz })] }),
        site: siteIn(1),
        stations: [],
        fields: [],
        raster: [],
        period: 'night',
        maxM: 3,
        maxN: 2,
        leaveOutBetterThan: null,
        limit: 1,
      }).bands[0]?.rejection ?? [];
    const weakest = (of: 'ifDb' | 'imageDb'): number | undefined =>
      curve.toSorted((a, b) => a[of] - b[of])[0]?.dialHz;

    expect(curve).toHaveLength(41);
    expect(weakest('ifDb')).toBe(breakthroughHz);
    expect(weakest('imageDb')).toBe(highHz);
  });
});
