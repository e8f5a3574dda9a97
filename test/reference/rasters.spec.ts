import { describe, expect, it } from 'vitest';

import rasters from '../../datasets/reference/rasters.json' with { type: 'json' };
import {
  defaultRaster,
  guardBands,
  nearestChannel,
  rasterChannels,
  rasterDistance,
} from '../../shared/radio/channels/raster.ts';
import type { ItuRegion } from '../../shared/radio/site.ts';

const { channels, distances, neighbours } = rasters;
const rasterOf = (ituRegion: number) => defaultRaster(ituRegion as ItuRegion);

describe(`channels: ${channels.source} [${channels.mark}]`, () => {
  it.each(channels.checks)('Region $ituRegion from $lowHz to $highHz: $count', (check) => {
    const found = rasterChannels(rasterOf(check.ituRegion), check.lowHz, check.highHz);

    expect(found).toHaveLength(check.count);
    expect(found.at(0) ?? null).toBe(check.firstHz);
    expect(found.at(-1) ?? null).toBe(check.lastHz);
  });
});

describe(`distances: ${distances.source} [${distances.mark}]`, () => {
  it.each(distances.checks)('$ifHz on $stepHz: $once, $twice, $thrice', (check) => {
    const { ifHz, stepHz, once, twice, thrice } = check;
    const found = [1, 2, 3].map((multiple) => rasterDistance(stepHz, multiple * ifHz));

    expect(found).toEqual([once, twice, thrice]);
  });
});

describe(`neighbours: ${neighbours.source} [${neighbours.mark}]`, () => {
  it.each(neighbours.checks)('Region $ituRegion, $hz', ({ ituRegion, hz, channelHz, middleHz }) => {
    const middles = guardBands(rasterOf(ituRegion), hz - 2000, hz + 2000);

    expect(nearestChannel(rasterOf(ituRegion), hz)).toBe(channelHz);
    expect(middles.at(0) ?? null).toBe(middleHz);
  });
});
