import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/mixer.json' with { type: 'json' };
import { mixerLevel } from '../../shared/radio/mixing/product-levels.ts';
import { productFrequencies } from '../../shared/radio/mixing/superheterodyne.ts';
import { besselI, productLines, spectrumOf } from '../support/simulated-mixer.ts';

const { oscillatorHarmonics } = reference;

describe(`${oscillatorHarmonics.source} [${oscillatorHarmonics.mark}]`, () => {
  it.each(oscillatorHarmonics.percentOfPeak.map((percent, index) => ({ percent, m: index + 1 })))(
    'harmonic $m: $percent %',
    ({ percent, m }) => {
      const fundamental = oscillatorHarmonics.percentOfPeak[0] ?? NaN;
      const expected = 20 * Math.log10(percent / fundamental);

      expect(Math.abs(mixerLevel(m, 1, 3) - expected)).toBeLessThan(
        oscillatorHarmonics.toleranceDb,
      );
    },
  );
});

// Frequencies in cycles of the span; divisible by 2 and 3, so that every product is a whole one.
const OSCILLATOR = 1998;
const IF = 606;
const VOLTS = { oscillator: OSCILLATOR, oscillatorVolts: 0.5, signalVolts: 0.3 };
const NOISE = 1e-13;

const exponential = (volts: number): number => Math.exp(volts);
const squareLaw = (volts: number): number => (1 + volts) ** 2;
/** A valve on its three-halves-power characteristic, biased so that it never cuts off. */
const threeHalves = (volts: number): number => (1 + volts) ** 1.5;

/** Each product with the frequencies the engine says it receives. */
const products = [0, 1, 2, 3, 4, 5].flatMap((m) =>
  [1, 2, 3].flatMap((n) =>
    [...new Set(productFrequencies(OSCILLATOR, IF, m, n))].map((signal) => ({ m, n, signal })),
  ),
);
/** What a device makes at the IF of a station there. */
const atIf = (device: (volts: number) => number, signal: number): number =>
  spectrumOf(device, { ...VOLTS, signal })[IF] ?? NaN;

describe('products of a simulated mixer, by the fast Fourier transform of its current', () => {
  it.each(products)('station on $signal through m = $m, n = $n', ({ m, n, signal }) => {
    const bessel = 2 * besselI(m, 0.5) * besselI(n, 0.3);

    expect(Number.isInteger(signal)).toBe(true);
    // e^(x cos a) is I_0(x) + 2 sum I_m(x) cos(m a): Jacobi and Anger, any table of functions.
    expect(atIf(exponential, signal) / bessel).toBeCloseTo(1, 3);
    expect(atIf(threeHalves, signal)).toBeGreaterThan(100 * NOISE);
  });

  it.each(products.filter(({ m }) => m > 0))(
    'a square law makes the IF of m = $m, n = $n only if both are 1: $signal',
    ({ m, n, signal }) => {
      const level = atIf(squareLaw, signal);

      if (m === 1 && n === 1) expect(level).toBeCloseTo(0.5 * 0.3, 9);
      else expect(level).toBeLessThan(NOISE);
    },
  );

  it.each([
    ['exponential', exponential],
    ['square-law', squareLaw],
    ['3/2-power', threeHalves],
  ])('an %s device makes nothing but products', (_name, device) => {
    const drive = { ...VOLTS, signal: 1391 };
    const lines = productLines(drive, 40);

    const strays = spectrumOf(device, drive)
      .map((level, line) => (lines.has(line) ? 0 : level))
      .filter((level) => level > NOISE);

    expect([...strays]).toEqual([]);
  });
});
