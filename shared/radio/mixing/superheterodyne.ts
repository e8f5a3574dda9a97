/**
 * Frequencies of the superheterodyne.
 *
 * Source: arithmetic.
 *
 * @module radio/mixing/superheterodyne
 */
import type { OscillatorSide } from '../receiver.ts';

/**
 * Sign of the oscillator's side: +1 above the signal, -1 below.
 *
 * @param side Side of the oscillator.
 * @returns The sign.
 * @example
 *   sideSign('below'); // -1
 */
export function sideSign(side: OscillatorSide): 1 | -1 {
  return side === 'above' ? 1 : -1;
}

/**
 * Frequency of the oscillator, or of the harmonic of it that mixes: `fs + s IF`.
 *
 * @param dialHz Dial frequency fs, hertz.
 * @param ifHz Intermediate frequency, hertz.
 * @param side Side of the oscillator.
 * @returns Hertz; not above 0 when an oscillator below the signal cannot run.
 *
 * @example
 *   oscillatorFrequency(1_000_000, 455_000, 'above'); // 1455000
 */
export function oscillatorFrequency(dialHz: number, ifHz: number, side: OscillatorSide): number {
  return dialHz + sideSign(side) * ifHz;
}

/**
 * Image frequency: `|fs + 2 s IF|`, the other frequency that the wanted product receives.
 *
 * @param dialHz Dial frequency fs, hertz.
 * @param ifHz Intermediate frequency, hertz.
 * @param side Side of the oscillator.
 * @returns Hertz.
 *
 * @example
 *   imageFrequency(1_000_000, 455_000, 'above'); // 1910000
 */
export function imageFrequency(dialHz: number, ifHz: number, side: OscillatorSide): number {
  return Math.abs(dialHz + 2 * sideSign(side) * ifHz);
}

/**
 * The two half-IF responses: `fs + s IF/2` and `fs + 3 s IF/2`.
 *
 * @param dialHz Dial frequency fs, hertz.
 * @param ifHz Intermediate frequency, hertz.
 * @param side Side of the oscillator.
 * @returns Two frequencies, hertz.
 *
 * @example
 *   halfIfFrequencies(1_000_000, 455_000, 'above'); // [1227500, 1682500]
 */
export function halfIfFrequencies(
  dialHz: number,
  ifHz: number,
  side: OscillatorSide,
): [number, number] {
  const half = (sideSign(side) * ifHz) / 2;
  return [Math.abs(dialHz + half), Math.abs(dialHz + 3 * half)];
}

/**
 * Frequencies that the product (m, n) receives: `|m osc +- IF| / n`.
 *
 * @param oscillatorHz Frequency of the oscillator's fundamental, hertz.
 * @param ifHz Intermediate frequency, hertz.
 * @param m Order of the oscillator, a whole number from 0.
 * @param n Order of the signal, a whole number from 1.
 * @returns The two frequencies, hertz, ascending; equal for m = 0.
 * @throws {RangeError} If an order is out of range.
 *
 * @example
 *   productFrequencies(1_455_000, 455_000, 3, 2); // [1955000, 2410000]
 */
export function productFrequencies(
  oscillatorHz: number,
  ifHz: number,
  m: number,
  n: number,
): [number, number] {
  if (!Number.isInteger(m) || m < 0) {
    throw new RangeError(`m must be a whole number from 0, got ${m}`);
  }
  if (!Number.isInteger(n) || n < 1) {
    throw new RangeError(`n must be a whole number from 1, got ${n}`);
  }
  return [Math.abs(m * oscillatorHz - ifHz) / n, Math.abs(m * oscillatorHz + ifHz) / n];
}

/**
 * Ratio of the highest to the lowest frequency that a circuit tunes; its square is the ratio of
 * the capacitances.
 *
 * @param lowHz Low end, hertz, above 0.
 * @param highHz High end, hertz, above 0.
 * @returns The ratio.
 * @throws {RangeError} If an end is not above 0.
 *
 * @example
 *   rangeRatio(550_000, 1_600_000); // 2.90909
 */
export function rangeRatio(lowHz: number, highHz: number): number {
  if (!(lowHz > 0)) throw new RangeError(`lowHz must be above 0, got ${lowHz}`);
  if (!(highHz > 0)) throw new RangeError(`highHz must be above 0, got ${highHz}`);
  return highHz / lowHz;
}
