/**
 * What a second conversion adds to the responses of a receiver.
 *
 * Source: arithmetic.
 *
 * @module radio/mixing/second-conversion
 */
import type { Receiver, SecondConversion } from '../receiver.ts';
import { sideSign } from './superheterodyne.ts';

/** Harmonics of the second oscillator that are looked at. */
const HARMONICS = [1, 2, 3, 4, 5, 6, 7, 8] as const;

/** A harmonic of the second oscillator on a band. */
export interface OscillatorHarmonic {
  readonly harmonic: number;
  readonly dialHz: number;
}

/**
 * Image of the second mixer, in the first IF: `IF1 + 2 s2 IF2`.
 *
 * It lies 2 IF2 from the first IF, whose selectivity alone rejects it. At the aerial it is the
 * frequency `fs - 2 s s2 IF2`.
 *
 * @param firstIfHz First IF, hertz.
 * @param second The second conversion.
 * @returns Hertz; negative when it is folded at zero.
 *
 * @example
 *   secondImage(1_600_000, { ifHz: 85_000, oscillator: 'above' }); // 1770000
 */
export function secondImage(firstIfHz: number, { ifHz, oscillator }: SecondConversion): number {
  return firstIfHz + 2 * sideSign(oscillator) * ifHz;
}

/**
 * Frequency of the second oscillator: `IF1 + s2 IF2`.
 *
 * @param firstIfHz First IF, hertz.
 * @param second The second conversion.
 * @returns Hertz.
 *
 * @example
 *   secondOscillator(1_600_000, { ifHz: 85_000, oscillator: 'above' }); // 1685000
 */
export function secondOscillator(
  firstIfHz: number,
  { ifHz, oscillator }: SecondConversion,
): number {
  return firstIfHz + sideSign(oscillator) * ifHz;
}

/**
 * Harmonics of the fixed second oscillator that whistle on a band. Their level cannot be
 * predicted.
 *
 * @param receiver The receiver.
 * @param lowHz Low end of the band, hertz.
 * @param highHz High end, hertz.
 * @returns The harmonics, ascending; none without a second conversion.
 *
 * @example
 *   const set = { ifHz: 1_600_000, secondConversion: { ifHz: 85_000, oscillator: 'above' } };
 *   secondOscillatorHarmonics(set, 1_600_000, 4_000_000).length; // 2: on 1685000 and 3370000
 */
export function secondOscillatorHarmonics(
  { ifHz, secondConversion }: Pick<Receiver, 'ifHz' | 'secondConversion'>,
  lowHz: number,
  highHz: number,
): OscillatorHarmonic[] {
  if (secondConversion === null) return [];
  const oscillatorHz = secondOscillator(ifHz, secondConversion);
  return HARMONICS.map((harmonic) => ({ harmonic, dialHz: harmonic * oscillatorHz })).filter(
    ({ dialHz }) => dialHz >= lowHz && dialHz <= highHz,
  );
}

/**
 * Why a second conversion cannot be, or is unwise; null: it is in order.
 *
 * @param receiver The receiver.
 * @param reachHz Half of B6: a harmonic of the second oscillator this near the first IF is heard.
 * @returns A sentence, or null.
 * @example
 *   secondConversionWarning(receiver, 3000); // null: there is none
 */
export function secondConversionWarning(
  { ifHz, secondConversion }: Pick<Receiver, 'ifHz' | 'secondConversion'>,
  reachHz: number,
): string | null {
  if (secondConversion === null) return null;
  const oscillatorHz = secondOscillator(ifHz, secondConversion);
  if (!(oscillatorHz > 0)) return 'The second oscillator would reach zero.';
  const near = HARMONICS.find((harmonic) => Math.abs(harmonic * oscillatorHz - ifHz) <= reachHz);
  if (near === undefined) return null;
  return `Harmonic ${near} of the second oscillator falls on the first IF and whistles everywhere.`;
}
