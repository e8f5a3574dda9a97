import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { packStations, unpackNames, unpackStations } from './station-columns.ts';

const quantity = fc.option(fc.double({ noNaN: true, noDefaultInfinity: true }));
const station = fc.record({
  id: fc.nat(4_294_967_295),
  name: fc.string({ unit: 'grapheme' }),
  frequencyHz: fc.integer({ min: 1000, max: 1_000_000_000 }),
  latitude: quantity,
  longitude: quantity,
  powerDayW: quantity,
  powerNightW: quantity,
  fieldDb: quantity,
});

describe('packStations', () => {
  it('keeps every station exactly, the names apart', () => {
    fc.assert(
      fc.property(fc.array(station, { maxLength: 20 }), (stations) => {
        const columns = packStations(stations);

        expect(unpackStations(columns)).toEqual(stations.map((each) => ({ ...each, name: '' })));
        expect(unpackNames(columns)).toEqual(stations.map(({ name }) => name));
      }),
    );
  });
});
