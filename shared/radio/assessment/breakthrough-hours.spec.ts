import { describe, expect, it } from 'vitest';

import { plainBand, plainReceiver } from '../../../test/support/plain-sets.ts';
import { assess } from './assessment.ts';
import { breakthroughHours } from './breakthrough-hours.ts';
import type { SkyWaveChoice } from '../propagation/sky-wave.ts';
import { fieldStrengths } from '../propagation/field-strength.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Site } from '../site.ts';
import type { Station } from '../station.ts';

const receiver = plainReceiver({
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 8000, b60Hz: 45_000 },
  bands: [plainBand({ lowHz: 600_000 })],
});
const halfHoursOf = (date: string): Date[] =>
  Array.from(
    { length: 48 },
    (_, index) => new Date(Date.parse(`${date}T00:00:00Z`) + index * 1_800_000),
  );
const site: Site = {
  latitude: 44,
  longitude: 0,
  ground: 'average',
  noise: 'quiet',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 2,
};
const raster = defaultRaster(2);
const station = (changes: Partial<Station>): Station => ({
  id: 7,
  name: '',
  frequencyHz: 560_000,
  latitude: 49,
  longitude: 0,
  powerDayW: 1_000_000,
  powerNightW: 1_000_000,
  fieldDb: null,
  ...changes,
});
const day = (date: string, stations: readonly Station[], change: Partial<Site> = {}) =>
  breakthroughHours({
    receiver,
    site: { ...site, ...change },
    stations,
    raster,
    times: halfHoursOf(date),
  });
const clocks = (times: readonly Date[]) => times.map((time) => time.toISOString().slice(11, 16));

describe('breakthroughHours', () => {
  it('rises about sunset and falls about sunrise with the sky wave', () => {
    // Equinox at Greenwich: sunrise and sunset about 06 and 18 hours, critical hours within.
    const { hours, rises, falls } = day('2026-03-20', [station({})]);

    expect(hours).toHaveLength(48);
    expect(clocks(rises)).toHaveLength(1);
    expect(clocks(rises)[0]).toMatch(/^1[678]/);
    expect(clocks(falls)[0]).toMatch(/^0[678]/);
    expect(hours[0]?.breakthrough?.levelDb).toBeGreaterThan(
      (hours[24]?.breakthrough?.levelDb ?? -Infinity) + 10,
    );
    expect(hours[0]?.breakthrough).toMatchObject({ station: 7 });
  });

  it('judges each moment as an assessment does', () => {
    const stations = [station({}), station({ id: 8, frequencyHz: 1_900_000, latitude: 44.2 })];
    const { hours } = day('2026-03-20', stations);
    for (const { at, breakthrough, image } of [0, 13, 14, 24].map((index) => hours[index]!)) {
      const fields = fieldStrengths(site, stations, at);
      const input = { receiver, site, stations, fields, raster, maxM: 1, maxN: 1, limit: 10_000 };
      const { bands } = assess({ ...input, period: 'night', leaveOutBetterThan: null });
      const worst = (cause: string) =>
        bands[0]?.responses.find((each) => each.cause === cause && each.hidden === null);

      expect(breakthrough?.ratioDb).toBe(worst('breakthrough')?.ratioDb ?? undefined);
      expect(image?.ratioDb).toBe(worst('image')?.ratioDb ?? undefined);
      expect(image?.grade).toBe(worst('image')?.grade);
    }
  });

  it('rises and falls by the power where a station is silent at night', () => {
    const { hours, rises, falls } = day('2026-03-20', [
      station({ latitude: 44.3, powerNightW: 0 }),
    ]);

    expect(hours[0]?.breakthrough).toBeNull();
    expect(clocks(rises)).toEqual(['06:30']);
    expect(clocks(falls)).toEqual(['18:30']);
  });

  it('neither rises nor falls with a given field, or in the polar night', () => {
    const given = day('2026-03-20', [station({ fieldDb: 80 })]);
    const polar = day('2026-12-21', [station({ latitude: 80 })], { latitude: 76 });

    for (const { rises, falls } of [given, polar]) expect([...rises, ...falls]).toEqual([]);
    expect(given.hours.every(({ breakthrough }) => breakthrough !== null)).toBe(true);
  });

  it('takes the sky wave that is chosen: more in a tenth of the nights, other by another form', () => {
    const levels = (skyWave?: SkyWaveChoice): number =>
      breakthroughHours({ receiver, site, raster, stations: [station({})], times, skyWave })
        .hours[0]?.breakthrough?.levelDb ?? NaN;
    const times = halfHoursOf('2026-03-20').slice(0, 1);
    const usual = levels();

    expect(levels({ form: 'cfr-73-190', nights: 50 })).toBe(usual);
    expect(levels({ form: 'cfr-73-190', nights: 10 })).toBeGreaterThan(usual + 5);
    expect(levels({ form: 'itu-r-p1147', nights: 50 })).not.toBe(usual);
  });

  it('hears nothing without stations', () => {
    const { hours, rises } = day('2026-03-20', []);

    expect(hours[0]).toMatchObject({ breakthrough: null, image: null });
    expect(rises).toEqual([]);
  });
});
