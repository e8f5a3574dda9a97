import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import type { BandScan } from './band-scan.ts';
import { Deficit, kindOf } from './deficit.ts';
import { defaultRaster } from '../channels/raster.ts';
import { bandScans, WeightingTables } from './receiver-at-site.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { Spectrum } from '../channels/spectrum.ts';

const receiver = plainReceiver({
  ifHz: 560_000,
  bands: [plainBand({ lowHz: 600_000, circuits: [{ qLow: 40, qHigh: 40 }] })],
});

function scanOf(list: readonly (readonly [number, number])[]): BandScan {
  const { stations, fields } = givenStations(list);
  const site = siteIn(2, { noiseFloorDb: 0 });
  const tables = new WeightingTables(receiver, ifSelectivity(receiver.selectivity, 560_000), 2);
  const spectrum = new Spectrum(stations, fields);
  const [scan] = bandScans(receiver, site, defaultRaster(2), spectrum, tables);
  if (scan === undefined) throw new Error('the receiver has a band');
  return scan;
}

function deficitOf(list: readonly (readonly [number, number])[]): Deficit {
  const scan = scanOf(list);
  const deficit = new Deficit(scan);
  scan.scan(560_000, { maxM: 3, maxN: 2 }, deficit);
  return deficit;
}

describe('Deficit', () => {
  it('counts the worst breakthrough at an empty setting once', () => {
    const deficit = deficitOf([[560_000, 90]]);
    const worst = deficit.worst.breakthrough;

    expect(worst?.dialHz).toBe(600_000);
    expect(deficit.deficitDb()).toBeCloseTo(26 - (worst?.ratioDb ?? NaN), 9);
    expect(deficit.deficitDb('breakthrough')).toBe(deficit.deficitDb());
    expect(deficit.deficitDb('image')).toBe(0);
  });

  it('adds what usable stations lack, apart by kind', () => {
    // 2020 kHz is the image of the usable station on 900 kHz.
    const deficit = deficitOf([
      [900_000, 60],
      [2_020_000, 90],
    ]);
    const [station] = deficit.usable();

    expect(station?.dialHz).toBe(900_000);
    expect(deficit.deficitDb('image')).toBeCloseTo(26 - (station?.ratioDb ?? NaN), 9);
    expect(deficit.deficitDb('breakthrough')).toBe(0);
  });

  it('leaves a station beside which nothing is heard without a ratio', () => {
    expect(deficitOf([[900_000, 60]]).usable()).toMatchObject([{ ratioDb: Infinity }]);
    expect(deficitOf([[900_000, 60]]).deficitDb()).toBe(0);
  });
});

describe('kindOf', () => {
  it('gives the value of its example', () => {
    expect(kindOf(2, 2, 1)).toBe('products');
    expect(kindOf(2, 1, 2)).toBe('image');
    expect(kindOf(0, 3, 1)).toBe('breakthrough');
  });
});
