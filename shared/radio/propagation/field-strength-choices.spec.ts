import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { FIELD_NOTES, FieldsAtSite, fieldStrengths } from './field-strength.ts';
import { sunTimes } from './path.ts';
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

describe('fieldStrengths at a moment', () => {
  /** 500 km to the north: by night the sky wave rules. */
  const far: Partial<Station> = { latitude: 48.5, powerDayW: 1000, powerNightW: 1000 };
  const { sunrise, sunset } = sunTimes(
    { latitude: 46.25, longitude: -20 },
    new Date('2026-03-20T13:00:00Z'),
  );
  const at = (from: Date | null, minutes: number) => new Date(Number(from) + minutes * 60_000);

  it('is the day at noon and the night at midnight', () => {
    expect(fieldOf({}, {}, new Date('2026-03-20T13:20:00Z'))).toEqual(fieldOf({}));
    expect(fieldOf({}, {}, new Date('2026-03-20T01:20:00Z'))).toEqual(fieldOf({}, {}, 'night'));
  });

  it('fades the sky wave 12 dB in the first hour of sun, and says so', () => {
    const night = fieldOf(far, {}, 'night');
    const morning = fieldOf(far, {}, at(sunrise, 60));

    expect(level(night.skyDb) - level(morning.skyDb)).toBeCloseTo(12.04, 1);
    expect(morning.notes).toEqual([FIELD_NOTES.criticalHours]);
    expect(fieldOf(far, {}, at(sunset, -60)).skyDb).toBeCloseTo(level(morning.skyDb), 0);
    expect(fieldOf(far, {}, at(sunrise, 121)).skyDb).toBeNull();
    expect(fieldOf(far, {}, at(sunset, 1))).toEqual(night);
  });

  it('has no step where the power does not change', () => {
    for (let minute = -10; minute < 130; minute++) {
      const [now, next] = [minute, minute + 1].map((each) =>
        level(fieldOf(far, {}, at(sunrise, each)).fieldDb),
      );

      expect(Math.abs((now ?? NaN) - (next ?? NaN))).toBeLessThan(2);
    }
  });

  it('takes the power by the sun at the station, not at the site', () => {
    // Sunrise in the east, still dark at the site 30 degrees to the west.
    const east = { longitude: 10, powerDayW: 1000, powerNightW: 0 };

    expect(fieldOf(east, {}, new Date('2026-03-20T06:00:00Z')).fieldDb).not.toBeNull();
    expect(fieldOf(east, {}, new Date('2026-03-20T05:00:00Z')).notes).toEqual([FIELD_NOTES.silent]);
  });

  it('holds in the polar day and the polar night', () => {
    const north = { ...far, latitude: 80 };
    const here = { latitude: 75 };

    expect(fieldOf(north, here, new Date('2026-06-21T00:00:00Z')).skyDb).toBeNull();
    expect(fieldOf(north, here, new Date('2026-12-21T12:00:00Z'))).toEqual(
      fieldOf(north, here, 'night'),
    );
  });

  it('does without a place where both powers are the same, and says what lacks where not', () => {
    const nowhere = { latitude: null, powerDayW: 5, powerNightW: 5 };
    const time = new Date('2026-03-20T12:00:00Z');

    expect(fieldOf(nowhere, {}, time).notes).toEqual([FIELD_NOTES.noStationPlace]);
    expect(fieldOf({ ...nowhere, powerNightW: 0 }, {}, time).fieldDb).toBeNull();
  });

  it('answers for many moments what it answers for each', () => {
    const fields = new FieldsAtSite(site, [{ ...station, ...far }, station]);
    for (let hour = 0; hour < 24; hour++) {
      const time = new Date(Date.UTC(2026, 2, 20, hour, 30));
      const levels = (of: readonly { fieldDb: number | null }[]) =>
        of.map(({ fieldDb }) => level(fieldDb).toFixed(6));

      expect(levels(fields.at(time))).toEqual(
        levels(fieldStrengths(site, [{ ...station, ...far }, station], time)),
      );
    }
  });

  it('is a number at any moment and place, and never above the night', () => {
    const latitude = fc.oneof(
      fc.constantFrom(-90, 90),
      fc.double({ min: -90, max: 90, noNaN: true }),
    );
    const longitude = fc.double({ min: -180, max: 180, noNaN: true });
    const place = fc.record({ latitude, longitude });
    const date = fc.date({
      min: new Date('1900-01-01'),
      max: new Date('2100-12-31'),
      noInvalidDate: true,
    });
    fc.assert(
      fc.property(place, place, date, (from, to, time) => {
        const even = { ...from, powerDayW: 1000, powerNightW: 1000 };
        const field = fieldOf(even, to, time);

        expect(Number.isFinite(field.fieldDb)).toBe(true);
        expect(level(field.fieldDb)).toBeLessThanOrEqual(level(fieldOf(even, to, 'night').fieldDb));
      }),
    );
  });

  it('refuses what is no moment', () => {
    expect(() => fieldOf({}, {}, new Date(NaN))).toThrow(RangeError);
  });
});

describe('fieldStrengths with another sky wave', () => {
  const stations = [{ ...station, latitude: 52 }];
  const skyOf = (form: 'cfr-73-190' | 'itu-r-p1147', nights: 50 | 10) =>
    fieldStrengths(site, stations, 'night', { form, nights })[0];

  it('is stronger in a tenth of the nights and weaker in the north by ITU-R P.1147', () => {
    const usual = skyOf('cfr-73-190', 50);

    expect(usual).toEqual(fieldStrengths(site, stations, 'night')[0]);
    expect(skyOf('cfr-73-190', 10)?.skyDb).toBeGreaterThan(level(usual?.skyDb ?? null) + 5.9);
    expect(skyOf('itu-r-p1147', 50)?.skyDb).toBeLessThan(level(usual?.skyDb ?? null) - 1);
    expect(skyOf('itu-r-p1147', 10)?.groundDb).toBe(usual?.groundDb);
  });

  it('says what was chosen, where there is a sky wave', () => {
    const choice = { form: 'itu-r-p1147', nights: 10 } as const;

    expect(skyOf('itu-r-p1147', 10)?.notes).toEqual([
      FIELD_NOTES.skyWaveP1147,
      FIELD_NOTES.skyWaveTenth,
    ]);
    expect(fieldStrengths(site, stations, 'day', choice)[0]?.notes).toEqual([]);
  });
});

describe('fieldStrengths over sections and with a pattern', () => {
  const land = fieldOf({});

  it('is the plain field over one section of the same ground', () => {
    const path = [{ ground: 'average' as const, lengthM: level(land.distanceM) }];
    const field = fieldOf({ path }, { ground: null });

    expect(field.fieldDb).toBeCloseTo(level(land.fieldDb), 9);
    expect(field.notes).toEqual([FIELD_NOTES.mixedPath]);
  });

  it('is stronger the more sea there is, and does not mind the direction', () => {
    const half = level(land.distanceM) / 2;
    const mixed = (...grounds: ('sea' | 'average')[]) =>
      level(fieldOf({ path: grounds.map((ground) => ({ ground, lengthM: half })) }).fieldDb);

    expect(mixed('sea', 'average')).toBeCloseTo(mixed('average', 'sea'), 9);
    expect(mixed('sea', 'average')).toBeGreaterThan(mixed('average', 'average'));
    expect(mixed('sea', 'sea')).toBeGreaterThan(mixed('sea', 'average'));
  });

  it('scales sections to the distance and says so, also at the site itself', () => {
    const path = [{ ground: 'average' as const, lengthM: 1000 }];
    const field = fieldOf({ path });

    expect(field.fieldDb).toBeCloseTo(level(land.fieldDb), 9);
    expect(field.notes).toContain(FIELD_NOTES.scaledPath);
    expect(fieldOf({ path, latitude: 44 }).fieldDb).toBeCloseTo(
      level(fieldOf({ latitude: 44 }).fieldDb),
      9,
    );
  });

  it('adds the gain of the aerial towards the site to ground and sky wave', () => {
    // The site lies due south of the station.
    const patternDb = Array.from({ length: 36 }, (_, index) => (index === 18 ? 3 : -40));
    const [plain, beamed] = [fieldOf({}, {}, 'night'), fieldOf({ patternDb }, {}, 'night')];

    expect(level(beamed.groundDb) - level(plain.groundDb)).toBeCloseTo(3, 6);
    expect(level(beamed.skyDb) - level(plain.skyDb)).toBeCloseTo(3, 6);
    expect(beamed.notes).toEqual([FIELD_NOTES.pattern]);
    const away = fieldOf({ patternDb, latitude: 43.55 }, {}, 'night');
    expect(level(away.groundDb)).toBeLessThan(level(plain.groundDb) - 30);
  });

  it('is a number from pole to pole, opposite and on the spot', () => {
    const patternDb = Array<number>(36).fill(-3);
    const path = [{ ground: 'sea' as const, lengthM: 1 }];
    for (const [latitude, longitude] of [
      [90, 0],
      [-90, 0],
      [-44, 160],
      [44, -20],
    ]) {
      const field = fieldOf({ latitude: latitude!, longitude: longitude!, patternDb, path });

      expect(Number.isFinite(field.fieldDb)).toBe(true);
    }
  });
});
