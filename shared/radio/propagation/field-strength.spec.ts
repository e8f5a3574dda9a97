import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { FIELD_NOTES, fieldStrengths } from './field-strength.ts';
import type { ReceptionTime, Site } from '../site.ts';
import type { Station } from '../station.ts';

const site: Site = {
  latitude: 44,
  longitude: -20,
  ground: 'average',
  noise: 'rural',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
};

/** 10 kW on 1 MHz, 50 km due north. */
const station: Station = {
  id: 0,
  name: 'Radio Nowhere',
  frequencyHz: 1_000_000,
  latitude: 44.45,
  longitude: -20,
  powerDayW: 10_000,
  powerNightW: 1000,
  fieldDb: null,
};

function fieldOf(changes: Partial<Station>, at: Partial<Site> = {}, time: ReceptionTime = 'day') {
  const [field] = fieldStrengths({ ...site, ...at }, [{ ...station, ...changes }], time);
  if (!field) throw new Error('one station, one field');
  return field;
}

/** A level that must be there: NaN otherwise, which equals nothing. */
const level = (value: number | null): number => value ?? NaN;

describe('fieldStrengths', () => {
  it('is the ground wave of the power by day', () => {
    const field = fieldOf({});

    expect(field.distanceM).toBeCloseTo(50_000, -3);
    expect(field.fieldDb).toBeCloseTo(67.03, 0);
    expect(field.fieldDb).toBe(field.groundDb);
    expect(field.skyDb).toBeNull();
    expect(field.notes).toEqual([]);
  });

  it('adds the powers of ground and sky wave at night, with the power at night', () => {
    const [day, night] = [fieldOf({}), fieldOf({}, {}, 'night')];
    const sum = 10 ** (level(night.groundDb) / 10) + 10 ** (level(night.skyDb) / 10);

    expect(night.groundDb).toBeCloseTo(level(day.groundDb) - 10, 9);
    expect(night.fieldDb).toBeCloseTo(10 * Math.log10(sum), 9);
  });

  it('passes a given field through, and still tells the distance', () => {
    expect(fieldOf({ fieldDb: 71.5, powerDayW: 0 })).toMatchObject({
      groundDb: null,
      skyDb: null,
      fieldDb: 71.5,
      notes: [FIELD_NOTES.given],
    });
    expect(fieldOf({ fieldDb: 71.5, latitude: null }, { ground: null }).distanceM).toBeNull();
  });

  it('has no field of a silent station', () => {
    const silent = fieldOf({ powerNightW: 0 }, {}, 'night');

    expect(silent).toMatchObject({ fieldDb: null, groundDb: null, notes: [FIELD_NOTES.silent] });
    expect(silent.distanceM).not.toBeNull();
  });

  it.each<[string, Partial<Station>, Partial<Site>]>([
    ['noPower', { powerDayW: null }, {}],
    ['noStationPlace', { longitude: null }, {}],
    ['noSitePlace', {}, { latitude: null }],
    ['noGround', {}, { ground: null }],
  ])('says what is missing: %s', (note, changes, at) => {
    expect(fieldOf(changes, at)).toMatchObject({
      fieldDb: null,
      notes: [FIELD_NOTES[note as keyof typeof FIELD_NOTES]],
    });
  });

  it('says all that is missing at once', () => {
    const { notes } = fieldOf({ powerDayW: null, latitude: null }, { ground: null });

    expect(notes).toHaveLength(3);
  });

  it.each([
    [149_999, null, [FIELD_NOTES.noSkyWave]],
    [150_000, 'some', [FIELD_NOTES.skyWaveExtrapolated]],
    [534_999, 'some', [FIELD_NOTES.skyWaveExtrapolated]],
    [535_000, 'some', []],
    [1_710_000, 'some', []],
    [1_710_001, null, [FIELD_NOTES.noSkyWave]],
  ])('on %i Hz at night has %s sky wave', (frequencyHz, sky, notes) => {
    const field = fieldOf({ frequencyHz }, {}, 'night');

    expect(field.skyDb === null).toBe(sky === null);
    expect(field.notes).toEqual(notes);
  });

  it('flags short waves by day as well', () => {
    expect(fieldOf({ frequencyHz: 6_000_000 }).notes).toEqual([FIELD_NOTES.noSkyWave]);
  });

  it('flags a path near the geomagnetic pole and a station next door', () => {
    const north = fieldOf({ latitude: 75 }, { latitude: 74 }, 'night');

    expect(north.notes).toEqual([FIELD_NOTES.skyWaveLatitude]);
    expect(fieldOf({ latitude: 44 }).notes).toEqual([FIELD_NOTES.near]);
  });

  it('does not hear the noise: indoors and floor change nothing', () => {
    expect(fieldOf({}, { indoors: true, noise: 'city', noiseFloorDb: 40 })).toEqual(fieldOf({}));
  });

  it('answers every station in order, by its id, and each as if it were alone', () => {
    const stations = [3, 1, 2].map((id) => ({ ...station, id, latitude: 44 + id }));
    const fields = fieldStrengths(site, stations, 'night');

    expect(fields.map((field) => field.station)).toEqual([3, 1, 2]);
    expect(fields.map((field) => field)).toEqual(
      stations.flatMap((each) => fieldStrengths(site, [each], 'night')),
    );
    expect(fieldStrengths(site, [], 'night')).toEqual([]);
  });

  it('is a finite number for any two places, powers and frequencies', () => {
    const latitude = fc.oneof(
      fc.constantFrom(-90, 0, 90),
      fc.double({ min: -90, max: 90, noNaN: true }),
    );
    const longitude = fc.oneof(
      fc.constantFrom(-180, 0, 180),
      fc.double({ min: -180, max: 180, noNaN: true }),
    );
    const place = fc.record({ latitude, longitude });
    const powerW = fc.double({ min: 1e-6, max: 1e8, noNaN: true });
    const frequency = fc.integer({ min: 1000, max: 1_000_000_000 });
    const ground = fc.constantFrom(
      'sea' as const,
      'wet' as const,
      'average' as const,
      'dry' as const,
      'poor' as const,
    );
    fc.assert(
      fc.property(place, place, powerW, frequency, ground, (from, to, power, frequencyHz, kind) => {
        const here = { ...to, ground: kind };
        const field = fieldOf({ ...from, frequencyHz, powerNightW: power }, here, 'night');

        expect(Number.isFinite(field.fieldDb)).toBe(true);
        expect(Number.isFinite(field.distanceM)).toBe(true);
      }),
    );
  });

  it('rises 10 dB with ten times the power', () => {
    const weak = fieldOf({ powerNightW: 50 }, {}, 'night');
    const strong = fieldOf({ powerNightW: 500 }, {}, 'night');

    expect(level(strong.fieldDb) - level(weak.fieldDb)).toBeCloseTo(10, 9);
  });
});
