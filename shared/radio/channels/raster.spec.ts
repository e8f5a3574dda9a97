import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  defaultRaster,
  guardBands,
  nearestChannel,
  rasterChannels,
  rasterDistance,
  rasterStep,
} from './raster.ts';
import type { RasterRange } from '../station.ts';

const anyRaster = fc
  .array(
    fc
      .record({
        lowHz: fc.integer({ min: 100_000, max: 900_000 }),
        spanHz: fc.integer({ min: 0, max: 300_000 }),
        stepHz: fc.integer({ min: 3000, max: 20_000 }),
      })
      .map(({ lowHz, spanHz, stepHz }) => ({ lowHz, highHz: lowHz + spanHz, stepHz })),
    { minLength: 1, maxLength: 3 },
  )
  .map((ranges): RasterRange[] => ranges);
const anyFrequency = fc.double({ min: 50_000, max: 1_300_000, noNaN: true });

describe('defaultRaster', () => {
  it('is the 10 kHz raster in Region 2', () => {
    expect(defaultRaster(2)).toEqual([{ lowHz: 540_000, highHz: 1_700_000, stepHz: 10_000 }]);
  });

  it('is the same in Regions 1 and 3', () => {
    expect(defaultRaster(3)).toEqual(defaultRaster(1));
  });
});

describe('rasterChannels', () => {
  it('gives the channels of a span, limits included', () => {
    expect(rasterChannels(defaultRaster(2), 551_000, 575_000)).toEqual([560_000, 570_000]);
    expect(rasterChannels(defaultRaster(2), 560_000, 570_000)).toEqual([560_000, 570_000]);
  });

  it('joins ranges, each channel once, ascending', () => {
    const raster = [
      { lowHz: 600_000, highHz: 620_000, stepHz: 10_000 },
      { lowHz: 590_000, highHz: 610_000, stepHz: 5_000 },
    ];

    expect(rasterChannels(raster, 0, Infinity)).toEqual([
      590_000, 595_000, 600_000, 605_000, 610_000, 620_000,
    ]);
  });

  it('is empty beyond the raster and for a span upside down', () => {
    expect(rasterChannels(defaultRaster(2), 2_000_000, 3_000_000)).toEqual([]);
    expect(rasterChannels(defaultRaster(2), 600_000, 590_000)).toEqual([]);
  });

  it('refuses a step of 0', () => {
    const raster = [{ lowHz: 1, highHz: 2, stepHz: 0 }];

    expect(() => rasterChannels(raster, 0, 10)).toThrow(RangeError);
  });
});

describe('nearestChannel', () => {
  it('finds the channel above or below', () => {
    expect(nearestChannel(defaultRaster(1), 555_000)).toBe(558_000);
    expect(nearestChannel(defaultRaster(1), 400_000)).toBe(279_000);
  });

  it('takes the lower of two equally near', () => {
    expect(nearestChannel(defaultRaster(2), 555_000)).toBe(550_000);
  });

  it('is null without a raster', () => {
    expect(nearestChannel([], 555_000)).toBeNull();
  });

  it('agrees with a search through all channels', () => {
    fc.assert(
      fc.property(anyRaster, anyFrequency, (raster, hz) => {
        const channels = rasterChannels(raster, 0, Infinity);
        const least = Math.min(...channels.map((channel) => Math.abs(channel - hz)));

        expect(nearestChannel(raster, hz)).toBe(
          channels.find((channel) => Math.abs(channel - hz) === least),
        );
      }),
    );
  });
});

describe('guardBands', () => {
  it('lie midway between neighbours', () => {
    expect(guardBands(defaultRaster(1), 545_000, 560_000)).toEqual([553_500]);
    expect(guardBands(defaultRaster(2), 550_000, 560_000)).toEqual([555_000]);
  });

  it('do not reach beyond the outermost channels', () => {
    expect(guardBands(defaultRaster(2), 0, 545_000)).toEqual([545_000]);
    expect(guardBands(defaultRaster(2), 1_695_000, 3_000_000)).toEqual([1_695_000]);
  });
});

describe('rasterDistance', () => {
  it('is the distance to the nearest multiple of the step', () => {
    expect(rasterDistance(9_000, 455_000)).toBe(4_000);
    expect(rasterDistance(10_000, 560_000)).toBe(0);
  });

  it('is at most half a step and the same a step further', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 20_000 }), fc.nat(2_000_000), (step, hz) => {
        expect(rasterDistance(step, hz)).toBeLessThanOrEqual(step / 2);
        expect(rasterDistance(step, hz + step)).toBe(rasterDistance(step, hz));
      }),
    );
  });

  it('refuses a step of 0', () => {
    expect(() => rasterDistance(0, 455_000)).toThrow(/step of a raster/);
  });
});

describe('rasterStep', () => {
  const mixed = [
    { lowHz: 531_000, highHz: 1_602_000, stepHz: 9_000 },
    { lowHz: 5_900_000, highHz: 6_200_000, stepHz: 5_000 },
  ];

  it('is that of the range around the frequency or nearest to it', () => {
    expect(rasterStep(defaultRaster(2), 455_000)).toBe(10_000);
    expect(rasterStep(mixed, 1_000_000)).toBe(9_000);
    expect(rasterStep(mixed, 5_500_000)).toBe(5_000);
  });

  it('is null without a raster', () => {
    expect(rasterStep([], 455_000)).toBeNull();
  });
});
