/**
 * Quantities the engine computes with.
 *
 * A branded number costs nothing at run time and stops the compiler from accepting metres where
 * hertz are wanted. Frequencies that are assigned are whole hertz, so equality and ordering are
 * exact; frequencies that are solved for are plain real numbers.
 *
 * Source: definition.
 *
 * @module radio/units
 */

declare const unit: unique symbol;
type Quantity<U extends string> = number & { readonly [unit]: U };

/** Frequency in hertz; always a whole number between 0 and 2^53 - 1. */
export type Hertz = Quantity<'Hz'>;
/** Distance in metres. */
export type Metres = Quantity<'m'>;
/** Ratio, or field relative to 1 uV/m, in decibels. */
export type Decibels = Quantity<'dB'>;

/**
 * Builds a frequency.
 *
 * @param value Frequency in hertz.
 * @returns The same number, typed.
 * @throws {RangeError} If the value is negative, fractional or not exactly representable.
 * @example
 *   hertz(455_000); // 455000
 */
export function hertz(value: number): Hertz {
  if (!Number.isSafeInteger(value) || value < 0) {
    throw new RangeError(`frequency must be a whole number of hertz, got ${value}`);
  }
  return value as Hertz;
}

/**
 * Builds a distance.
 *
 * @param value Distance in metres.
 * @returns The same number, typed.
 * @throws {RangeError} If the value is negative or not finite.
 * @example
 *   metres(50_000); // 50000
 */
export function metres(value: number): Metres {
  if (!Number.isFinite(value) || value < 0) {
    throw new RangeError(`distance must be a finite number of metres, got ${value}`);
  }
  return value as Metres;
}

/**
 * Types a number that is already in decibels.
 *
 * @param value Ratio or field in decibels.
 * @returns The same number, typed.
 * @example
 *   decibels(6.02); // 6.02
 */
export const decibels = (value: number): Decibels => value as Decibels;

/**
 * Adds the powers of two levels: `10 log10(10^(a/10) + 10^(b/10))`.
 *
 * @param a Level, dB.
 * @param b Level, dB; either may be -Infinity, which adds nothing.
 * @returns The level of the sum, dB.
 * @example
 *   powerSum(decibels(60), decibels(60)); // 63.0103
 */
export function powerSum(a: Decibels, b: Decibels): Decibels {
  const larger = Math.max(a, b);
  if (!Number.isFinite(larger)) return decibels(larger);
  return decibels(larger + 10 * Math.log10(1 + 10 ** ((Math.min(a, b) - larger) / 10)));
}
