import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { criticalHoursFade, geomagneticLatitude, skyWave } from './sky-wave.ts';
import { metres } from '../units.ts';

describe('skyWave', () => {
  it('is 30.9 dB(uV/m) from 1 kW at 1329 km under 46.3 degrees', () => {
    expect(skyWave(metres(1_329_018), 46.3138)).toBeCloseTo(30.9, 1);
  });

  it('falls with distance and with geomagnetic latitude, north as south', () => {
    const distance = fc.double({ min: 0, max: 19_000_000, noNaN: true });
    const latitude = fc.double({ min: 0, max: 59, noNaN: true });
    fc.assert(
      fc.property(distance, latitude, (d, phi) => {
        const field = skyWave(metres(d), phi);

        expect(skyWave(metres(d + 10_000), phi)).toBeLessThan(field);
        expect(skyWave(metres(d), phi + 1)).toBeLessThan(field);
        expect(skyWave(metres(d), -phi)).toBe(field);
      }),
    );
  });

  it('takes latitudes beyond 60 degrees as 60, also the pole', () => {
    expect(skyWave(metres(800_000), 90)).toBe(skyWave(metres(800_000), 60));
  });

  it('is 6 to 10 dB stronger in a tenth of the nights', () => {
    const gain = (phi: number) => skyWave(metres(800_000), phi, 10) - skyWave(metres(800_000), phi);

    expect([0, 39.9, 40, 50, 60, 75].map((phi) => Number(gain(phi).toFixed(6)))).toEqual([
      6, 6, 6, 8, 10, 10,
    ]);
  });

  it('is 0.44 dB and 2 sin phi weaker by ITU-R P.1147', () => {
    const weaker = (phi: number) =>
      skyWave(metres(800_000), phi) - skyWave(metres(800_000), phi, 50, 'itu-r-p1147');

    expect(weaker(0)).toBeCloseTo(0.4424, 3);
    expect(weaker(30)).toBeCloseTo(1.4424, 3);
    expect(weaker(-30)).toBeCloseTo(-0.5576, 3);
    expect(weaker(80)).toBeCloseTo(weaker(60), 9);
  });
});

describe('geomagneticLatitude', () => {
  it('is 90 degrees at the geomagnetic pole and 78.5 at the geographic one', () => {
    expect(geomagneticLatitude({ latitude: 78.5, longitude: -69 })).toBeCloseTo(90, 5);
    expect(geomagneticLatitude({ latitude: 90, longitude: 0 })).toBeCloseTo(78.5, 9);
  });

  it('is opposite at the opposite place', () => {
    const [lat, lon] = [
      fc.double({ min: -90, max: 90, noNaN: true }),
      fc.double({ min: -180, max: 180, noNaN: true }),
    ];
    fc.assert(
      fc.property(lat, lon, (latitude, longitude) => {
        const here = geomagneticLatitude({ latitude, longitude });
        const there = geomagneticLatitude({ latitude: -latitude, longitude: longitude + 180 });

        expect(here + there).toBeCloseTo(0, 5);
        expect(Math.abs(here)).toBeLessThanOrEqual(90);
      }),
    );
  });
});

describe('criticalHoursFade', () => {
  it('begins with the night, is -12 dB after an hour and ends in nothing', () => {
    expect(criticalHoursFade(0)).toBeCloseTo(0, 12);
    expect(criticalHoursFade(1)).toBeCloseTo(-12.04, 2);
    expect(criticalHoursFade(2)).toBe(-Infinity);
    expect(criticalHoursFade(Infinity)).toBe(-Infinity);
  });

  it('only ever falls', () => {
    const hours = fc.double({ min: 0, max: 2.5, noNaN: true });
    fc.assert(
      fc.property(hours, hours, (a, b) => {
        expect(criticalHoursFade(Math.max(a, b))).toBeLessThanOrEqual(
          criticalHoursFade(Math.min(a, b)),
        );
      }),
    );
  });
});
