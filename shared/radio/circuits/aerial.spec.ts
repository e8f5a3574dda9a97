import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { aerialLoss, loopLoss, primaryLoss, primaryRefusal } from './aerial.ts';
import { assess } from '../assessment/assessment.ts';
import { FrontEnd } from './front-end.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Aerial } from '../receiver.ts';

const band = { lowHz: 550e3, highHz: 1600e3 };
const primary: Aerial = { kind: 'primary', resonanceHz: 380e3, q: 30 };

describe('primaryLoss', () => {
  it('gives the value of its example', () => {
    expect(primaryLoss(455e3, 380e3, 30) - primaryLoss(1000e3, 380e3, 30)).toBeCloseTo(-15.8, 1);
  });

  it('makes IF rejection worse and image rejection better (common practice)', () => {
    const rejection = (aerial: Aerial | null, hz: number): number =>
      new FrontEnd(plainReceiver({ aerial }), plainBand()).rejectionDb(hz, 1_000_000);

    expect(rejection(primary, 455e3)).toBeLessThan(rejection(null, 455e3) - 4);
    expect(rejection(primary, 1_910e3)).toBeGreaterThan(rejection(null, 1_910e3));
  });

  it('refuses values that are not above 0', () => {
    expect(() => primaryLoss(0, 1, 1)).toThrow(/frequencyHz/);
    expect(() => primaryLoss(1, 0, 1)).toThrow(/resonanceHz/);
    expect(() => primaryLoss(1, 1, 0)).toThrow(/q must/);
  });
});

describe('loopLoss', () => {
  it('gives the value of its example: 6 dB an octave', () => {
    expect(loopLoss(500e3) - loopLoss(1000e3)).toBeCloseTo(6.02, 2);
    expect(() => loopLoss(0)).toThrow(/frequencyHz/);
  });
});

describe('primaryRefusal', () => {
  it('refuses a primary from 0.95 of the low end to 1.3 of the high end', () => {
    const refused = (resonanceHz: number): boolean =>
      primaryRefusal({ ...primary, resonanceHz }, band) !== null;

    expect([522e3, 522.5e3, 2_080e3, 2_081e3].map(refused)).toEqual([false, true, true, false]);
    expect(primaryRefusal({ kind: 'loop' }, band)).toBeNull();
    expect(primaryRefusal(null, band)).toBeNull();
  });

  it('leaves the term out and says so in an assessment', () => {
    const aerial: Aerial = { ...primary, resonanceHz: 600e3 };
    const { warnings } = assess({
      receiver: plainReceiver({ aerial }),
      site: siteIn(1),
      ...givenStations([[1_521_000, 90]]),
      raster: defaultRaster(1),
      period: 'day',
      maxM: 1,
      maxN: 1,
      leaveOutBetterThan: null,
      limit: 10,
    });

    expect(aerialLoss(aerial, band)).toBeNull();
    expect(warnings).toMatchObject([
      { path: 'aerial', message: expect.stringMatching(/too close/) as string },
    ]);
  });
});

describe('aerialLoss', () => {
  it('is never greater than it says', () => {
    const aerials = fc.constantFrom<Aerial>(
      primary,
      { kind: 'loop' },
      { ...primary, resonanceHz: 4e6 },
    );
    fc.assert(
      fc.property(aerials, fc.integer({ min: band.lowHz, max: band.highHz }), (aerial, hz) => {
        const loss = aerialLoss(aerial, band);

        expect(loss?.lossDb(hz)).toBeLessThanOrEqual(
          (loss?.greatestDb(band.lowHz, band.highHz) ?? NaN) + 1e-9,
        );
      }),
    );
  });
});
