import { describe, expect, it } from 'vitest';

import { harmonicsOnChannels, nearestWhistle } from './harmonics-on-channels.ts';
import { defaultRaster } from '../channels/raster.ts';

const medium = { lowHz: 520_000, highHz: 1_710_000 };

describe('harmonicsOnChannels', () => {
  it('gives the values of its example', () => {
    expect(harmonicsOnChannels(455_000, [medium], defaultRaster(1))).toEqual([
      { harmonic: 2, dialHz: 910_000, channelHz: 909_000, beatHz: 1_000 },
      { harmonic: 3, dialHz: 1_365_000, channelHz: 1_368_000, beatHz: 3_000 },
    ]);
  });

  it('takes each harmonic once, and the lower of two channels equally near', () => {
    const found = harmonicsOnChannels(452_500, [medium, medium], defaultRaster(2));

    expect(found).toHaveLength(2);
    expect(found[0]).toMatchObject({ dialHz: 905_000, channelHz: 900_000, beatHz: 5_000 });
  });

  it('has no channel on a band without a raster', () => {
    const short = { lowHz: 3_000_000, highHz: 3_200_000 };

    expect(harmonicsOnChannels(455_000, [short], defaultRaster(1))).toEqual([
      { harmonic: 7, dialHz: 3_185_000, channelHz: null, beatHz: null },
    ]);
  });
});

describe('nearestWhistle', () => {
  it('is Infinity when nothing whistles', () => {
    expect(nearestWhistle([])).toBe(Infinity);
    expect(nearestWhistle(harmonicsOnChannels(455_000, [medium], defaultRaster(1)))).toBe(1_000);
  });
});
