import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { locator, locatorCentre } from './locator.ts';

describe('locatorCentre', () => {
  it('is 48.1458 north, 11.625 east for JN58td', () => {
    const { latitude, longitude } = locatorCentre('JN58td');

    expect(latitude).toBeCloseTo(48.1458, 4);
    expect(longitude).toBeCloseTo(11.625, 9);
  });

  it('takes 2, 4, 6 and 8 characters, capital or small', () => {
    expect(locatorCentre('JN')).toEqual({ latitude: 45, longitude: 10 });
    expect(locatorCentre('JN58')).toEqual({ latitude: 48.5, longitude: 11 });
    expect(locatorCentre('jn58TD')).toEqual(locatorCentre('JN58td'));
    expect(locatorCentre('JN58td00').latitude).toBeCloseTo(48.125 + 1 / 480, 9);
  });

  it.each(['', 'J', 'JN5', 'SN58', 'JN58ty', 'JN58t', '58JN', 'JN58td0', ' JN58'])(
    'refuses "%s"',
    (text) => {
      expect(() => locatorCentre(text)).toThrow(/expected a locator/);
    },
  );
});

describe('locator', () => {
  it('is JN58td for a place in Munich', () => {
    expect(locator({ latitude: 48.14666, longitude: 11.60833 })).toBe('JN58td');
  });

  it('keeps the poles and the date line inside', () => {
    expect(locator({ latitude: 90, longitude: 180 })).toBe('RR99xx');
    expect(locator({ latitude: -90, longitude: -180 })).toBe('AA00aa');
  });

  it('names the square whose centre is nearest', () => {
    const [lat, lon] = [
      fc.double({ min: -90, max: 90, noNaN: true }),
      fc.double({ min: -180, max: 180, noNaN: true }),
    ];
    fc.assert(
      fc.property(lat, lon, (latitude, longitude) => {
        const centre = locatorCentre(locator({ latitude, longitude }));

        expect(Math.abs(centre.latitude - latitude)).toBeLessThanOrEqual(1 / 48 + 1e-9);
        expect(Math.abs(centre.longitude - longitude)).toBeLessThanOrEqual(1 / 24 + 1e-9);
      }),
    );
  });

  it('refuses places off the earth', () => {
    expect(() => locator({ latitude: 91, longitude: 0 })).toThrow(RangeError);
    expect(() => locator({ latitude: NaN, longitude: 0 })).toThrow(RangeError);
  });
});
