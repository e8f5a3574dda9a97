import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/assessment.json' with { type: 'json' };
import { assess } from '../../shared/radio/assessment/assessment.ts';
import { earWeighting } from '../../shared/radio/hearing/ear-weighting.ts';
import { programmeBands } from '../../shared/radio/hearing/programme.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { ItuRegion } from '../../shared/radio/site.ts';
import { ifSelectivity } from '../../shared/radio/circuits/selectivity.ts';
import { programmeWeighting, type Weighting } from '../../shared/radio/hearing/weighting.ts';
import { weightingGrid, WeightingTable } from '../../shared/radio/hearing/weighting-table.ts';
import { givenStations, oneBandReceiver, siteIn } from '../support/plain-sets.ts';

const { earWeighting: ear, weighting, published, responses } = reference;

type Set = (typeof weighting.sets)[number];

function weightingOf({ b6Hz, b60Hz, audioCornerHz, emissionHz }: Set): Weighting {
  const selectivity = ifSelectivity({ kind: 'widths', b6Hz, b60Hz }, 455_000);
  return programmeWeighting(selectivity, audioCornerHz, programmeBands(emissionHz));
}

describe(`weighting by the ear: ${ear.source} [${ear.mark}]`, () => {
  it.each(ear.checks)('$frequencyHz Hz: $db dB', ({ frequencyHz, db }) => {
    expect(Math.abs(earWeighting(frequencyHz) - db)).toBeLessThan(ear.toleranceDb);
  });
});

describe(`${weighting.source} [${weighting.mark}]`, () => {
  it.each(weighting.sets)('$b6Hz/$b60Hz, audio $audioCornerHz, emission $emissionHz', (set) => {
    const w0 = weightingOf(set);
    const table = new WeightingTable(weightingGrid(w0), weighting.toleranceHz, 10_000);

    weighting.beatsHz.forEach((beatHz, index) => {
      expect(w0(beatHz)).toBeCloseTo(set.w0Db[index] ?? NaN, 2);
    });
    weighting.toleratedBeatsHz.forEach((beatHz, index) => {
      expect(table.at(beatHz)).toBeCloseTo(set.wDb[index] ?? NaN, 2);
    });
  });

  it(`lies on either side of ${published.source} [${published.mark}]`, () => {
    const at9 = weighting.sets.map((set) => weightingOf(set)(published.beatHz));

    expect(Math.min(...at9)).toBeLessThan(published.db);
    expect(Math.max(...at9)).toBeGreaterThan(published.db);
  });
});

describe(`${responses.source} [${responses.mark}]`, () => {
  it.each(responses.checks)('$name: $ratioDb dB, $grade', (check) => {
    const { ifHz, lowHz, highHz, circuits, widths, cause } = check;
    const ituRegion = check.ituRegion as ItuRegion;
    const receiver = oneBandReceiver({ ifHz, lowHz, highHz, circuits, widths, q: 80 });
    const { stations, fields } = givenStations(check.stations.map((hz) => [hz, 90] as const));
    const station = check.stations.indexOf(check.heard);

    const found = assess({
      receiver,
      site: siteIn(ituRegion),
      stations,
      fields,
      raster: defaultRaster(ituRegion),
      period: 'night',
      maxM: 3,
      maxN: 2,
      leaveOutBetterThan: null,
      limit: 2000,
    }).bands[0]?.responses.find((each) => each.station === station && each.cause === cause);

    expect(found).toMatchObject({ dialHz: check.dialHz, beatHz: check.beatHz, grade: check.grade });
    expect(found?.interferenceDb).toBeCloseTo(check.interferenceDb, 3);
    expect(found?.weightingDb).toBeCloseTo(check.weightingDb, 3);
    expect(found?.ratioDb).toBeCloseTo(check.ratioDb, 3);
    if (check.noiseDb !== undefined) expect(found?.noiseDb).toBeCloseTo(check.noiseDb, 3);
  });
});
