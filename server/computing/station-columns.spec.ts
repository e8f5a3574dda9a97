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

const EMPTY = {
  id: 0,
  name: '',
  frequencyHz: 1000,
  latitude: null,
  longitude: null,
  powerDayW: null,
  powerNightW: null,
  fieldDb: null,
};

describe('packStations', () => {
  it('keeps every station exactly, the names apart', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(station, { maxLength: 20 }), async (stations) => {
        const columns = await packStations(stations);

        expect(unpackStations(columns)).toEqual(stations.map((each) => ({ ...each, name: '' })));
        expect(unpackNames(columns)).toEqual(stations.map(({ name }) => name));
      }),
    );
  });

  it('keeps path and pattern of those that have any', async () => {
    const plain = { ...EMPTY, id: 1 };
    const patternDb = Array.from({ length: 36 }, (_, index) => 5 - index);
    const path = [{ ground: 'sea' as const, lengthM: 5 }];
    const stations = [plain, { ...plain, id: 2, path, patternDb }, { ...plain, patternDb }];
    const [first, second, third] = unpackStations(await packStations(stations));

    expect(first).toEqual(plain);
    expect(second).toMatchObject({ path, patternDb });
    expect(third).toMatchObject({ path: null, patternDb });
  });

  it('keeps a list that is packed in several slices', async () => {
    const path = [{ ground: 'sea' as const, lengthM: 5 }];
    const stations = Array.from({ length: 10_001 }, (_, id) => ({
      ...EMPTY,
      id,
      name: `Radio "${id}"`,
      ...(id % 5000 === 0 ? { path, patternDb: null } : {}),
    }));
    const columns = await packStations(stations);

    expect(unpackStations(columns)).toEqual(stations.map((each) => ({ ...each, name: '' })));
    expect(unpackNames(columns)).toEqual(stations.map(({ name }) => name));
  });
});
