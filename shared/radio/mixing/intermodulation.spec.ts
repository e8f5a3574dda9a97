import { describe, expect, it } from 'vitest';

import { givenStations } from '../../../test/support/plain-sets.ts';
import { intermodulatingPairs, strongestStations } from './intermodulation.ts';
import { Spectrum } from '../channels/spectrum.ts';

function strongest(list: readonly (readonly [number, number])[]) {
  const { stations, fields } = givenStations(list);
  return strongestStations(new Spectrum(stations, fields));
}

describe('intermodulatingPairs', () => {
  it('gives the value of its example', () => {
    const two = [
      { position: 0, id: 0, hz: 1_000_000 },
      { position: 1, id: 1, hz: 1_455_000 },
    ];

    expect(intermodulatingPairs(two, 455_000, 3_000)).toHaveLength(1);
  });

  it('finds sums and differences within reach, the limit included', () => {
    const stations = strongest([
      [200_000, 90],
      [258_000, 80],
      [1_000_000, 70],
      [1_452_000, 60],
    ]);

    expect(
      intermodulatingPairs(stations, 455_000, 3_000).map(({ relation, beatHz }) => [
        relation,
        beatHz,
      ]),
    ).toEqual([
      ['sum', 3_000],
      ['difference', 3_000],
    ]);
    expect(intermodulatingPairs(stations, 455_000, 2_999)).toEqual([]);
  });

  it('pairs only the 50 strongest, of equals those with the lower number', () => {
    const many = Array.from({ length: 60 }, (_, k) => [1_000_000 + k, 70] as const);
    const stations = strongest([...many, [900_000, 80]]);

    expect(stations).toHaveLength(50);
    expect(stations[0]?.id).toBe(60);
    expect(stations.slice(1).map(({ id }) => id)).toEqual([...Array(49).keys()]);
  });
});
