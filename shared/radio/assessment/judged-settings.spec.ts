import { describe, expect, it } from 'vitest';

import { givenStations, plainReceiver, siteIn } from '../../../test/support/plain-sets.ts';
import { defaultRaster } from '../channels/raster.ts';
import { Spectrum } from '../channels/spectrum.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { judgedSettings } from './judged-settings.ts';
import { bandScans, WeightingTables } from './receiver-at-site.ts';

const receiver = plainReceiver();

function counted(frequenciesHz: readonly number[], maxM: number, maxN: number): number {
  const { stations, fields } = givenStations(frequenciesHz.map((hz) => [hz, 60] as const));
  const spectrum = new Spectrum(stations, fields);
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  const tables = new WeightingTables(receiver, selectivity, 1, maxM);
  let count = 0;
  const sink = { takesHidden: true, take: () => count++ };
  for (const scan of bandScans(receiver, siteIn(1), defaultRaster(1), spectrum, tables)) {
    scan.scan(receiver.ifHz, { maxM, maxN }, sink);
  }
  return count;
}

const every = (stepHz: number, count: number): number[] =>
  Array.from({ length: count }, (_, index) => 153_000 + index * stepHz);

describe('judgedSettings', () => {
  it('counts the image of a station above the band, and nothing of one far away', () => {
    const orders = { maxM: 1, maxN: 1 };

    expect(judgedSettings(receiver, [1_700_000], orders)).toBe(1);
    expect(judgedSettings(receiver, [9_000_000], orders)).toBe(0);
  });

  it.each([
    ['a raster', every(9000, 400), 3, 2],
    ['a dense list', every(500, 4000), 3, 2],
    ['a dense list at all orders', every(700, 3000), 5, 3],
  ])('is within a factor of two of what a scan judges on %s', (_list, hz, maxM, maxN) => {
    const ratio = judgedSettings(receiver, hz, { maxM, maxN }) / counted(hz, maxM, maxN);

    expect(ratio).toBeGreaterThan(0.5);
    expect(ratio).toBeLessThan(2);
  });
});
