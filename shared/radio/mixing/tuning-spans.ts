/**
 * What the oscillator and the image sweep while a band is tuned.
 *
 * Source: arithmetic.
 *
 * @module radio/mixing/tuning-spans
 */
import type { Band } from '../receiver.ts';
import { imageFrequency, oscillatorFrequency } from './superheterodyne.ts';

/** Two frequencies, whole hertz, the lower first. */
export interface FrequencySpan {
  readonly low: number;
  readonly high: number;
}

type Tuning = Pick<Band, 'lowHz' | 'highHz' | 'oscillator' | 'oscillatorHarmonic'>;

/**
 * Range of the oscillator's fundamental, on which the set radiates: `(fs + s IF)/h`.
 *
 * @param band The band.
 * @param ifHz Intermediate frequency, hertz.
 * @returns Whole hertz, half up.
 *
 * @example
 *   oscillatorSpan({ lowHz: 550_000, highHz: 1_600_000, oscillator: 'above',
 *     oscillatorHarmonic: 1 }, 455_000); // { low: 1005000, high: 2055000 }
 */
export function oscillatorSpan(band: Tuning, ifHz: number): FrequencySpan {
  const at = (dialHz: number): number =>
    Math.round(oscillatorFrequency(dialHz, ifHz, band.oscillator) / band.oscillatorHarmonic);
  return { low: at(band.lowHz), high: at(band.highHz) };
}

/**
 * Range of the image: from the least to the greatest of `|fs + 2 s IF|` on the band.
 *
 * With an oscillator below, an image that passes through zero turns back there.
 *
 * @param band The band.
 * @param ifHz Intermediate frequency, hertz.
 * @returns Whole hertz.
 *
 * @example
 *   imageSpan({ lowHz: 550_000, highHz: 1_600_000, oscillator: 'above',
 *     oscillatorHarmonic: 1 }, 455_000); // { low: 1460000, high: 2510000 }
 */
export function imageSpan({ lowHz, highHz, oscillator }: Tuning, ifHz: number): FrequencySpan {
  const ends = [lowHz, highHz].map((hz) => imageFrequency(hz, ifHz, oscillator));
  const folds = oscillator === 'below' && lowHz < 2 * ifHz && highHz > 2 * ifHz;
  return { low: folds ? 0 : Math.min(...ends), high: Math.max(...ends) };
}
