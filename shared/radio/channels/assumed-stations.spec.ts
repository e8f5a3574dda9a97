import { describe, expect, it } from 'vitest';

import { stationsOnEveryChannel } from './assumed-stations.ts';
import { defaultRaster } from './raster.ts';

describe('stationsOnEveryChannel', () => {
  it('puts one station of the given field on every channel', () => {
    const stations = stationsOnEveryChannel(defaultRaster(2), 70);

    expect(stations).toHaveLength(117);
    expect(stations[1]).toMatchObject({
      id: 1,
      frequencyHz: 550_000,
      fieldDb: 70,
      name: '550 kHz',
    });
  });
});
