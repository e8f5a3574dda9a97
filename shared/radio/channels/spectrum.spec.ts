import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { givenStations } from '../../../test/support/plain-sets.ts';
import { lowerBound, Spectrum } from './spectrum.ts';

function spectrumOf(list: readonly (readonly [number, number])[]): Spectrum {
  const { stations, fields } = givenStations(list);
  return new Spectrum(stations, fields);
}

describe('Spectrum', () => {
  const spectrum = spectrumOf([
    [900, 50],
    [700, 40],
    [900, 60],
    [900, 60],
  ]);

  it('groups by frequency, the strongest of each first', () => {
    expect([...spectrum.hz]).toEqual([700, 900]);
    expect([...spectrum.start]).toEqual([0, 1, 4]);
    expect(spectrum.ids).toEqual([1, 2, 3, 0]);
  });

  it('wants the strongest by ground wave, of equals the first in the list', () => {
    const { stations } = givenStations([
      [900, 70],
      [900, 70],
    ]);
    const computed = stations.map((station) => ({ ...station, fieldDb: null }));
    const fields = [30, 45].map((groundDb, station) => ({
      station,
      distanceM: 1,
      groundDb,
      skyDb: 70,
      fieldDb: 70,
      notes: [],
    }));

    expect(spectrum.ids[spectrum.wanted[1] ?? -1]).toBe(2);
    expect(new Spectrum(computed, fields).wanted[0]).toBe(1);
  });

  it('finds groups by frequency and by position', () => {
    expect([spectrum.groupAt(900), spectrum.groupAt(800), spectrum.firstFrom(701)]).toEqual([
      1, -1, 1,
    ]);
    expect([0, 1, 3].map((position) => spectrum.groupOf(position))).toEqual([0, 1, 1]);
  });

  it('sums powers of a group, with or without one of its stations', () => {
    expect(spectrum.powerOf(1)).toBeCloseTo(2e6 + 1e5, 3);
    expect(spectrum.powerOf(1, 1)).toBeCloseTo(1e6 + 1e5, 3);
    expect(spectrum.powerOf(1, 0)).toBeCloseTo(2e6 + 1e5, 3);
  });

  it('leaves out stations without a field', () => {
    const { stations } = givenStations([[900, 70]]);

    expect(new Spectrum([{ ...stations[0]!, fieldDb: null }], []).ids).toEqual([]);
  });
});

describe('lowerBound', () => {
  it('gives the value of its example and agrees with a plain search', () => {
    expect(lowerBound([1, 3, 5], 3)).toBe(1);
    fc.assert(
      fc.property(fc.array(fc.integer({ max: 50 })), fc.integer({ max: 60 }), (drawn, limit) => {
        const sorted = drawn.toSorted((a, b) => a - b);
        const found = sorted.findIndex((value) => value >= limit);

        expect(lowerBound(sorted, limit)).toBe(found < 0 ? sorted.length : found);
      }),
    );
  });
});
