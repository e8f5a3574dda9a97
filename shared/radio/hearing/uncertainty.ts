/**
 * How far off a figure may be: estimates of our own, one standard deviation.
 *
 * Source: own estimate.
 *
 * @module radio/hearing/uncertainty
 */
import type { Period } from '../site.ts';

/** Uncertainty of a computed field, dB: by day and by night. */
const FIELD_DB: Readonly<Record<Period, number>> = { day: 6, night: 8 };
/** Uncertainty of a listed wanted station, dB. */
const WANTED_DB = 6;
/** Uncertainty of the rejection of one circuit, dB. */
const CIRCUIT_DB = 4;

/**
 * Uncertainty of a ratio: `sqrt[(n sf)^2 + (4 n circuits)^2 + sw^2]`.
 *
 * sf is 6 by day, 8 by night, 0 for a field that was given; sw is 6, 0 for an assumed field.
 *
 * @param n Order of the signal.
 * @param circuits Number of tuned signal circuits.
 * @param given Whether the interferer's field was given.
 * @param period Day or night.
 * @param assumedWanted Whether the wanted field is assumed.
 * @returns One standard deviation, decibels.
 *
 * @example
 *   ratioUncertainty(1, 1, false, 'night', false); // 10.77
 */
export function ratioUncertainty(
  n: number,
  circuits: number,
  given: boolean,
  period: Period,
  assumedWanted: boolean,
): number {
  const field = given ? 0 : n * FIELD_DB[period];
  return Math.hypot(field, CIRCUIT_DB * n * circuits, assumedWanted ? 0 : WANTED_DB);
}

/**
 * Uncertainty of a change of ratio against the present IF, where field, wanted level and noise
 * cancel: that of the weighting, by the IF being 0.5 kHz off, and of the circuits.
 *
 * @param n Order of the signal.
 * @param circuits Number of tuned signal circuits.
 * @param weightingDb The weighting as a function of the beat.
 * @param beatHz Beat at the new IF, hertz.
 * @returns One standard deviation, decibels.
 *
 * @example
 *   changeUncertainty(1, 1, (hz) => -hz / 1000, 5000); // 4.03 = hypot(0.5, 4)
 */
export function changeUncertainty(
  n: number,
  circuits: number,
  weightingDb: (beatHz: number) => number,
  beatHz: number,
): number {
  const below = weightingDb(Math.abs(beatHz - OFFSET_HZ));
  const offset = Math.abs(weightingDb(beatHz + OFFSET_HZ) - below) / 2;
  return Math.hypot(offset, CIRCUIT_DB * n * circuits);
}

/** How far off an IF is set and drifts, hertz. */
const OFFSET_HZ = 500;
