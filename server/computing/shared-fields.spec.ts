import { describe, expect, it } from 'vitest';

import { FIELD_NOTES, fieldStrengths } from '../../shared/radio/propagation/field-strength.ts';
import type { Site } from '../../shared/radio/site.ts';
import type { Station } from '../../shared/radio/station.ts';
import { keptFields, roomForFields } from './shared-fields.ts';

const site: Site = {
  latitude: 47,
  longitude: -3,
  ground: 'average',
  noise: 'rural',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
};

const plain: Station = {
  id: 7,
  name: '',
  frequencyHz: 909_000,
  latitude: 48,
  longitude: -2,
  powerDayW: 1000,
  powerNightW: 500,
  fieldDb: null,
};

const stations: Station[] = [
  plain,
  { ...plain, id: 9, frequencyHz: 200_000 },
  { ...plain, id: 8, latitude: null, longitude: null, powerNightW: null },
  { ...plain, id: 3, fieldDb: 60 },
  { ...plain, id: 1, powerNightW: 0, patternDb: Array.from({ length: 36 }, () => -3) },
  { ...plain, id: 2, latitude: 47, longitude: -3, patternDb: Array.from({ length: 36 }, () => -3) },
  { ...plain, id: 4, path: [{ ground: 'sea', lengthM: 10 }], latitude: 70 },
];
const fields = fieldStrengths(site, stations, 'night', { form: 'itu-r-p1147', nights: 10 });

describe('keptFields', () => {
  it('answers exactly what was computed, the first time and every other', () => {
    const room = roomForFields(stations.length);

    expect(keptFields(room, stations, () => fields)).toEqual(fields);
    expect(keptFields(room, stations, () => [])).toEqual(fields);
  });

  it('computes once', () => {
    const room = roomForFields(stations.length);
    let computed = 0;
    const make = () => {
      computed += 1;
      return fields;
    };
    for (let turn = 0; turn < 3; turn++) keptFields(room, stations, make);

    expect(computed).toBe(1);
  });

  it('leaves the room to the next when computing fails', () => {
    const room = roomForFields(stations.length);
    const fail = () => {
      throw new RangeError('latitude: beyond a pole');
    };

    expect(() => keptFields(room, stations, fail)).toThrow(RangeError);
    expect(keptFields(room, stations, () => fields)).toEqual(fields);
  });

  it('has a bit for every note', () => {
    expect(Object.keys(FIELD_NOTES).length).toBeLessThanOrEqual(8 * Uint32Array.BYTES_PER_ELEMENT);
  });
});
