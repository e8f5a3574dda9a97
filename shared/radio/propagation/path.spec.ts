import fc from 'fast-check';
import { getPosition } from 'suncalc';
import { describe, expect, it } from 'vitest';

import { pathBearing, pathLength, pathMiddle, subsolarPoint, sunHeight, sunTimes } from './path.ts';

const anyPlace = fc.record({
  latitude: fc.double({ min: -90, max: 90, noNaN: true }),
  longitude: fc.double({ min: -180, max: 180, noNaN: true }),
});

describe('pathLength', () => {
  it('is 5554.9 km between the airports of New York and London', () => {
    const newYork = { latitude: 40.6413, longitude: -73.7781 };

    expect(pathLength(newYork, { latitude: 51.47, longitude: -0.4543 })).toBeCloseTo(5554908.8, 1);
  });

  it('is a degree of 110.574 km at the equator northward, 111.320 eastward', () => {
    const origin = { latitude: 0, longitude: 0 };

    expect(pathLength(origin, { latitude: 1, longitude: 0 })).toBeCloseTo(110_574, -1);
    expect(pathLength(origin, { latitude: 0, longitude: 1 })).toBeCloseTo(111_320, -1);
  });

  it('ends, also for opposite places and from pole to pole', () => {
    const north = { latitude: 90, longitude: 0 };
    const south = { latitude: -90, longitude: 0 };

    expect(pathLength(north, south)).toBeCloseTo(20_003_931.46, 1);
    expect(
      pathLength({ latitude: 30, longitude: 0 }, { latitude: -30, longitude: 180 }),
    ).toBeCloseTo(20_003_931.46, 1);
  });

  it('is the same both ways, 0 to the place itself, at most 20004 km', () => {
    fc.assert(
      fc.property(anyPlace, anyPlace, (a, b) => {
        expect(pathLength(a, b)).toBeCloseTo(pathLength(b, a), 4);
        expect(pathLength(a, a)).toBeCloseTo(0, 6);
        expect(pathLength(a, b)).toBeLessThan(20_004_000);
      }),
    );
  });

  it('refuses a latitude beyond the pole', () => {
    expect(() => pathLength({ latitude: 95, longitude: 0 }, { latitude: 0, longitude: 0 })).toThrow(
      RangeError,
    );
  });
});

describe('pathMiddle', () => {
  it('is half-way along the equator', () => {
    const middle = pathMiddle({ latitude: 0, longitude: 0 }, { latitude: 0, longitude: 90 });

    expect(middle.latitude).toBeCloseTo(0, 9);
    expect(middle.longitude).toBeCloseTo(45, 9);
  });

  it('crosses the date line and the pole', () => {
    const atDateLine = pathMiddle(
      { latitude: 0, longitude: 170 },
      { latitude: 0, longitude: -170 },
    );
    const atPole = pathMiddle({ latitude: 80, longitude: 0 }, { latitude: 80, longitude: 180 });

    expect(Math.abs(atDateLine.longitude)).toBeCloseTo(180, 9);
    expect(atPole.latitude).toBeCloseTo(90, 6);
  });

  it('lies as far from both ends, within 0.2 % of the path', () => {
    fc.assert(
      fc.property(anyPlace, anyPlace, (a, b) => {
        const whole = pathLength(a, b);
        fc.pre(whole < 19_000_000);
        const middle = pathMiddle(a, b);

        expect(Math.abs(pathLength(a, middle) - pathLength(middle, b))).toBeLessThan(
          0.005 * whole + 1,
        );
      }),
    );
  });

  it('is a place also for opposite ends', () => {
    const { latitude, longitude } = pathMiddle(
      { latitude: 90, longitude: 0 },
      { latitude: -90, longitude: 0 },
    );

    expect(Number.isFinite(latitude) && Number.isFinite(longitude)).toBe(true);
  });
});

describe('sunTimes', () => {
  it('gives sunrise before sunset at middle latitudes', () => {
    const { sunrise, sunset, polar } = sunTimes(
      { latitude: 51.5, longitude: 0 },
      new Date('2026-03-20T12:00:00Z'),
    );

    expect(polar).toBeNull();
    expect((Number(sunset) - Number(sunrise)) / 3_600_000).toBeCloseTo(12.2, 1);
  });

  it.each([
    ['2026-06-21T12:00:00Z', 'day'],
    ['2026-12-21T12:00:00Z', 'night'],
  ])('says on %s at 78 degrees north that it is polar %s', (date, polar) => {
    expect(sunTimes({ latitude: 78, longitude: 15 }, new Date(date))).toEqual({
      sunrise: null,
      sunset: null,
      polar,
    });
  });
});

describe('pathBearing', () => {
  const origin = { latitude: 0, longitude: 0 };

  it.each([
    [1, 0, 0],
    [0, 1, 90],
    [-1, 0, 180],
    [0, -1, -90],
  ])('towards %d, %d is %d degrees', (latitude, longitude, bearing) => {
    expect(pathBearing(origin, { latitude, longitude })).toBeCloseTo(bearing, 9);
  });

  it('is a number for any two places, and refused beyond a pole', () => {
    fc.assert(
      fc.property(anyPlace, anyPlace, (a, b) => {
        expect(Math.abs(pathBearing(a, b))).toBeLessThanOrEqual(180);
      }),
    );
    expect(() => pathBearing({ latitude: 91, longitude: 0 }, origin)).toThrow(RangeError);
  });
});

describe('subsolarPoint', () => {
  // From memory of almanacs, not re-read: equinox and solstices of 2026; the equation of time is
  // +16.4 minutes at the beginning of November and -14.2 minutes in the middle of February.
  it.each([
    ['2026-03-20T14:46:00Z', 0],
    ['2026-06-21T08:25:00Z', 23.44],
    ['2026-12-21T20:50:00Z', -23.44],
  ])('lies on %s at latitude %d', (at, latitude) => {
    expect(subsolarPoint(new Date(at)).latitude).toBeCloseTo(latitude, 1);
  });

  it.each([
    ['2026-11-03T12:00:00Z', -16.4 / 4],
    ['2026-02-11T12:00:00Z', 14.2 / 4],
    ['2026-11-03T00:00:00Z', 180 - 16.4 / 4],
  ])('lies on %s at longitude %d', (at, longitude) => {
    expect(subsolarPoint(new Date(at)).longitude).toBeCloseTo(longitude, 1);
  });

  it('has the sun overhead at any moment, and moves on westward', () => {
    const first = Date.UTC(2000, 0, 1);
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 36_525 * 24 * 60 }), (minutes) => {
        const at = new Date(first + minutes * 60_000);
        const place = subsolarPoint(at);
        const later = subsolarPoint(new Date(at.getTime() + 60_000));

        expect(getPosition(at, place.latitude, place.longitude).altitude).toBeGreaterThan(89.95);
        expect((place.longitude - later.longitude + 360) % 360).toBeCloseTo(0.25, 2);
      }),
    );
  });

  it('refuses what is no moment', () => {
    expect(() => subsolarPoint(new Date(NaN))).toThrow(RangeError);
  });
});

describe('sunHeight', () => {
  it('is the altitude of suncalc above the refraction of the air, at any place and moment', () => {
    const first = Date.UTC(2000, 0, 1);
    fc.assert(
      fc.property(anyPlace, fc.integer({ min: 0, max: 36_525 * 24 * 60 }), (place, minutes) => {
        const at = new Date(first + minutes * 60_000);
        const { altitude } = getPosition(at, place.latitude, place.longitude);

        // From 10 degrees up, refraction is less than 0.1 degree; it only ever lifts the sun.
        const height = sunHeight(place, at);
        expect(height).toBeLessThan(altitude + 0.03);
        if (altitude > 10) expect(height).toBeGreaterThan(altitude - 0.13);
        else expect(height).toBeGreaterThan(altitude - 0.6);
      }),
    );
  });

  it('refuses what is no moment', () => {
    expect(() => sunHeight({ latitude: 0, longitude: 0 }, new Date(NaN))).toThrow(RangeError);
  });
});
