import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { noiseField } from './noise.ts';

const outdoors = { noise: 'city', indoors: false, noiseFloorDb: null } as const;

describe('noiseField', () => {
  it('is 20.84 dB(uV/m) in a city on 1 MHz in 9 kHz', () => {
    expect(noiseField(outdoors, 1e6, 9e3)).toBeCloseTo(20.84, 2);
  });

  it('is 25 dB higher in a modern house', () => {
    const indoors = noiseField({ ...outdoors, indoors: true }, 1e6, 9e3);

    expect(indoors - noiseField(outdoors, 1e6, 9e3)).toBeCloseTo(25, 9);
  });

  it('is the measured floor where there is one, whatever else is known', () => {
    const measured = { noise: null, indoors: true, noiseFloorDb: 12 };

    expect(noiseField(measured, 1e6, 9e3)).toBe(12);
    expect(noiseField(measured, 3e7, 100)).toBe(12);
  });

  it('falls with frequency, rises 10 dB a decade of bandwidth, and from quiet to city', () => {
    const frequency = fc.double({ min: 1e5, max: 2.9e7, noNaN: true });
    const classes = ['quiet', 'rural', 'residential', 'city'] as const;
    fc.assert(
      fc.property(frequency, fc.double({ min: 50, max: 2e4, noNaN: true }), (f, b) => {
        const fields = classes.map((noise) => noiseField({ ...outdoors, noise }, f, b));
        const city = noiseField(outdoors, f, b);

        expect(noiseField(outdoors, f * 1.01, b)).toBeLessThan(city);
        expect(noiseField(outdoors, f, 10 * b)).toBeCloseTo(city + 10, 9);
        expect(fields).toEqual(fields.toSorted((a, b) => a - b));
      }),
    );
  });

  it('refuses a site of which nothing is known, and numbers not above 0', () => {
    expect(() => noiseField({ ...outdoors, noise: null }, 1e6, 9e3)).toThrow(/noise/);
    expect(() => noiseField(outdoors, 0, 9e3)).toThrow(/frequency/);
    expect(() => noiseField(outdoors, 1e6, 0)).toThrow(/bandwidth/);
  });
});
