/**
 * The closed-form solver against a sweep: at each listed dial setting every product of every
 * station is multiplied out, and whatever falls into the IF must be what the engine answers there.
 * Source: arithmetic.
 */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { assess } from '../../shared/radio/assessment/assessment.ts';
import { givenStations, plainBand, plainReceiver, siteIn } from '../support/plain-sets.ts';

const REACH_HZ = 11_000;
const [LOW_HZ, HIGH_HZ] = [550_000, 1_600_000];
const [MAX_M, MAX_N] = [5, 3];

const lists = fc
  .uniqueArray(fc.integer({ min: 150, max: 6000 }), { minLength: 8, maxLength: 40 })
  .map((channels) => channels.map((kHz) => 1000 * kHz));
const sets = fc.record({
  frequencies: lists,
  ifHz: fc.integer({ min: 440_000, max: 480_000 }),
  oscillator: fc.constantFrom('above' as const, 'below' as const),
  harmonic: fc.constantFrom(1, 2),
});

/** Every product that falls into the IF at a setting, with its beat: multiplied out, not solved. */
function swept(frequencies: readonly number[], ifHz: number, side: 1 | -1, harmonic: number) {
  const found = new Map<string, number>();
  const settings = frequencies.filter((f) => f >= LOW_HZ + REACH_HZ && f <= HIGH_HZ - REACH_HZ);
  for (const dialHz of settings) {
    const oscillatorHz = (dialHz + side * ifHz) / harmonic;
    frequencies.forEach((stationHz, station) => {
      if (stationHz === dialHz) return;
      for (let m = 1; m <= MAX_M; m++) {
        for (let n = 1; n <= MAX_N; n++) {
          for (const product of [
            m * oscillatorHz + n * stationHz,
            m * oscillatorHz - n * stationHz,
          ]) {
            // The way of the wanted signal: a neighbour on the dial, not a product.
            const isWantedWay = m === harmonic && n === 1 && Math.sign(product) === side;
            const beatHz = Math.abs(Math.abs(product) - ifHz);
            if (beatHz > (m / harmonic) * REACH_HZ) continue;
            if (isWantedWay && product === m * oscillatorHz - n * stationHz) continue;
            const key = `${station}/${m}/${n}/${dialHz}`;
            found.set(key, Math.min(beatHz, found.get(key) ?? Infinity));
          }
        }
      }
    });
  }
  return { found, settings: new Set(settings) };
}

describe('products found in closed form', () => {
  it('are those that a sweep of the dial finds, no more and no fewer', () => {
    fc.assert(
      fc.property(sets, ({ frequencies, ifHz, oscillator, harmonic }) => {
        const side = oscillator === 'above' ? 1 : -1;
        const { found, settings } = swept(frequencies, ifHz, side, harmonic);
        const band = plainBand({
          lowHz: LOW_HZ,
          highHz: HIGH_HZ,
          oscillator,
          oscillatorHarmonic: harmonic,
        });
        const receiver = plainReceiver({ ifHz, bands: [band] });
        const stations = givenStations(frequencies.map((hz): [number, number] => [hz, 110]));

        const { bands } = assess({
          receiver,
          site: siteIn(1),
          ...stations,
          raster: defaultRaster(1),
          period: 'night',
          maxM: MAX_M,
          maxN: MAX_N,
          leaveOutBetterThan: null,
          limit: 10_000,
        });

        const answered = new Map(
          (bands[0]?.responses ?? [])
            .filter(({ m, dialHz }) => m !== null && m > 0 && settings.has(dialHz ?? NaN))
            .map(({ station, m, n, dialHz, beatHz }) => [`${station}/${m}/${n}/${dialHz}`, beatHz]),
        );
        expect([...answered.keys()].toSorted()).toEqual([...found.keys()].toSorted());
        for (const [key, beatHz] of answered) {
          expect(Math.abs(beatHz - (found.get(key) ?? NaN))).toBeLessThanOrEqual(0.5);
        }
      }),
      { numRuns: 100 },
    );
  });
});
