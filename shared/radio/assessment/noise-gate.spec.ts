import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { plainCase, receivers, sites, stationLists } from '../../../test/support/random-cases.ts';
import { type BandScan } from './band-scan.ts';
import type { Finding, FindingSink } from './finding.ts';
import { bandScans, WeightingTables } from './receiver-at-site.ts';
import type { Aerial } from '../receiver.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { Spectrum } from '../channels/spectrum.ts';

/** Keeps what is heard. */
class Heard implements FindingSink {
  readonly takesHidden: boolean;
  readonly found: string[] = [];

  constructor(takesHidden: boolean) {
    this.takesHidden = takesHidden;
  }

  take({ group, m, n, dialHz, heard }: Readonly<Finding>): void {
    if (heard > 0) this.found.push(`${group}/${m}/${n}/${dialHz}/${heard}`);
  }
}

function heard(scan: BandScan, ifHz: number, takesHidden: boolean): string[] {
  const sink = new Heard(takesHidden);
  scan.scan(ifHz, { maxM: 4, maxN: 3 }, sink);
  return sink.found.sort();
}

const aerials = fc.constantFrom<Aerial | null>(
  null,
  { kind: 'loop' },
  { kind: 'primary', resonanceHz: 380_000, q: 30 },
);

describe('NoiseGate', () => {
  it('never silences what the full computation lets be heard', () => {
    fc.assert(
      fc.property(receivers, aerials, sites, stationLists, (drawn, aerial, site, stations) => {
        const receiver = { ...drawn, aerial };
        const { input } = plainCase({
          receiver,
          site,
          stations,
          period: 'night',
          maxM: 4,
          maxN: 3,
        });
        const spectrum = new Spectrum(input.stations, input.fields);
        const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
        const tables = new WeightingTables(receiver, selectivity, site.ituRegion, 4);

        for (const scan of bandScans(receiver, site, input.raster, spectrum, tables)) {
          expect(heard(scan, receiver.ifHz, false)).toEqual(heard(scan, receiver.ifHz, true));
        }
      }),
      { numRuns: 60 },
    );
  }, 30_000);
});
