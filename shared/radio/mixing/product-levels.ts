/**
 * Levels of the products of a mixer relative to the wanted one: a stated model.
 *
 * `L = H_m - H_h + K_n + (n - 1)(signal relative to the oscillator)`. The first three harmonics
 * follow the conversion transconductance about 28, 14 and 9 % of the peak given by E. W. Herold,
 * Proc. IRE, February 1942 (abstract); the others are estimates of our own.
 *
 * Source: own model after E. W. Herold, Proc. IRE, February 1942 (abstract).
 *
 * @module radio/mixing/product-levels
 */

/** H_1 to H_5: conversion by a harmonic of the oscillator relative to the fundamental, dB. */
const OSCILLATOR_DB = [0, -6, -10, -14, -17] as const;
/** K_1 to K_3: response to a harmonic of the signal, dB. */
const SIGNAL_DB = [0, -15, -30] as const;

/** Highest order of the oscillator that the model knows. */
export const MAX_OSCILLATOR_ORDER = OSCILLATOR_DB.length;
/** Highest order of the signal that the model knows. */
export const MAX_SIGNAL_ORDER = SIGNAL_DB.length;

/**
 * Level that the mixer gives a product of order m of the oscillator, when the wanted signal is
 * converted by the h-th: `H_m - H_h`; for m = 0 the IF feedthrough H_0, without H_h.
 *
 * @param m Order of the oscillator, 0 to 5.
 * @param harmonic Harmonic h that converts the wanted signal, 1 to 5.
 * @param ifFeedthroughDb H_0: +3 for single-ended valve mixers, -20 to -30 balanced.
 * @returns Decibels.
 * @throws {RangeError} If m or the harmonic is out of range.
 *
 * @example
 *   mixerLevel(2, 1, 3); // -6
 */
export function mixerLevel(m: number, harmonic: number, ifFeedthroughDb: number): number {
  const converting = OSCILLATOR_DB[harmonic - 1];
  if (converting === undefined) {
    throw new RangeError(`oscillatorHarmonic must be 1 to 5, got ${harmonic}`);
  }
  if (m === 0) return ifFeedthroughDb;
  const order = OSCILLATOR_DB[m - 1];
  if (order === undefined) throw new RangeError(`m must be 0 to 5, got ${m}`);
  return order - converting;
}

/**
 * Level of a response to the n-th harmonic of the signal: K_n.
 *
 * @param n Order of the signal, 1 to 3.
 * @returns Decibels.
 * @throws {RangeError} If n is out of range.
 *
 * @example
 *   signalOrderLevel(2); // -15
 */
export function signalOrderLevel(n: number): number {
  const level = SIGNAL_DB[n - 1];
  if (level === undefined) throw new RangeError(`n must be 1 to 3, got ${n}`);
  return level;
}
