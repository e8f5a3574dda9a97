import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { sunTimes } from './path.ts';
import { periodAt, Sunlight } from './sunlight.ts';

const hours = (latitude: number, longitude: number, at: string) =>
  new Sunlight({ latitude, longitude }).hours(new Date(at));

describe('Sunlight', () => {
  it('counts from sunrise, and to sunset', () => {
    // Equinox at Greenwich on the equator: up 06:04, down 18:10 UTC.
    expect(hours(0, 0, '2026-03-20T07:04:12Z')).toBeCloseTo(1, 2);
    expect(hours(0, 0, '2026-03-20T17:10:43Z')).toBeCloseTo(1, 2);
    expect(hours(0, 0, '2026-03-20T05:00:00Z')).toBe(0);
    expect(hours(0, 0, '2026-03-20T19:00:00Z')).toBe(0);
    expect(hours(0, 0, '2026-03-20T12:00:00Z')).toBeGreaterThan(2);
  });

  it.each([-179.9, -90, 0, 90, 179.9])('finds the day at %d degrees east', (longitude) => {
    const { sunrise } = sunTimes({ latitude: 40, longitude }, new Date('2026-10-01T12:00:00Z'));
    const after = new Date(Number(sunrise) + 1_800_000).toISOString();
    const before = new Date(Number(sunrise) - 1_800_000).toISOString();

    expect(hours(40, longitude, after)).toBeCloseTo(0.5, 1);
    expect(hours(40, longitude, before)).toBe(0);
  });

  it('has no night in the polar day, and no day in the polar night', () => {
    for (const clock of ['00:00', '06:00', '12:00', '18:00']) {
      expect(hours(78, 15, `2026-06-21T${clock}:00Z`)).toBe(Infinity);
      expect(hours(78, 15, `2026-12-21T${clock}:00Z`)).toBe(0);
    }
    expect(hours(90, 0, '2026-06-21T00:00:00Z')).toBe(Infinity);
    expect(hours(-90, 0, '2026-06-21T00:00:00Z')).toBe(0);
  });

  it('passes through the day without a step, except where the sun does not set', () => {
    const latitude = fc.double({ min: -60, max: 60, noNaN: true });
    const longitude = fc.double({ min: -180, max: 180, noNaN: true });
    const start = fc.integer({ min: 0, max: 364 * 24 });
    fc.assert(
      fc.property(latitude, longitude, start, (north, east, hour) => {
        const sun = new Sunlight({ latitude: north, longitude: east });
        const at = (minute: number) =>
          Math.min(2, sun.hours(new Date(Date.UTC(2026, 0, 1, hour, minute))));
        for (let minute = 0; minute < 24 * 60; minute += 30) {
          expect(Math.abs(at(minute + 30) - at(minute))).toBeLessThan(0.51);
        }
      }),
      { numRuns: 20 },
    );
  });

  it('answers the same asked in one go or afresh', () => {
    const place = { latitude: 52, longitude: -3 };
    const sun = new Sunlight(place);
    for (let hour = 0; hour < 72; hour++) {
      const at = new Date(Date.UTC(2026, 3, 1, hour));

      expect(Math.min(2, sun.hours(at))).toBeCloseTo(Math.min(2, new Sunlight(place).hours(at)), 9);
    }
  });

  it('is up whenever it has been or will be up for a time, at any place', () => {
    const place = fc.record({
      latitude: fc.double({ min: -90, max: 90, noNaN: true }),
      longitude: fc.double({ min: -180, max: 180, noNaN: true }),
    });
    const minute = fc.integer({ min: 0, max: 365 * 24 * 60 });
    fc.assert(
      fc.property(place, minute, (where, since) => {
        const at = new Date(Date.UTC(2026, 0, 1, 0, since));

        expect(new Sunlight(where).isUp(at)).toBe(new Sunlight(where).hours(at) > 0);
      }),
      { numRuns: 5000 },
    );
  });

  it('refuses what is no date', () => {
    expect(() => new Sunlight({ latitude: 0, longitude: 0 }).hours(new Date(NaN))).toThrow(
      RangeError,
    );
  });
});

describe('periodAt', () => {
  it('is night at midnight and day at noon', () => {
    const place = { latitude: 0, longitude: 0 };

    expect(periodAt(place, new Date('2026-03-20T00:00:00Z'))).toBe('night');
    expect(periodAt(place, new Date('2026-03-20T12:00:00Z'))).toBe('day');
  });
});
