/**
 * What the aerial adds to the tuned circuits.
 *
 * Source: a series circuit's reactance over its resistance; agrees with solved circuits within 0.6
 * dB.
 *
 * @module radio/circuits/aerial
 */
import type { Aerial, Band } from '../receiver.ts';
import { detuning } from './tuned-circuit.ts';

/** A primary resonant between these fractions of a band's ends couples too closely to compute. */
const TOO_CLOSE = { low: 0.95, high: 1.3 };

/** Loss against frequency of something that does not follow the dial, decibels. */
export interface FixedLoss {
  readonly lossDb: (frequencyHz: number) => number;
  /** The greatest loss between two frequencies, decibels. */
  readonly greatestDb: (lowHz: number, highHz: number) => number;
}

/**
 * Loss of a primary that resonates with the aerial, up to a constant:
 *
 *     10 log10[1/Qp^2 + rho_p(f)^2],  rho_p = f/fp - fp/f
 *
 * Taken as a difference between two frequencies it is what the primary adds to the rejection:
 * within 0.6 dB of the solved circuit for primaries at 300 and 380 kHz below a medium-wave band,
 * 3 dB at 430. It makes the IF rejection of a domestic set 4 to 27 dB worse than the circuits alone
 * and the image rejection better. Q is about 30 with the usual dummy aerial.
 *
 * @param frequencyHz Frequency, hertz, above 0.
 * @param resonanceHz fp, hertz, above 0.
 * @param q Qp, above 0.
 * @returns Decibels, least at resonance.
 * @throws {RangeError} If a value is not above 0.
 *
 * @example
 *   primaryLoss(455e3, 380e3, 30) - primaryLoss(1000e3, 380e3, 30); // -15.8: worse IF rejection
 */
export function primaryLoss(frequencyHz: number, resonanceHz: number, q: number): number {
  if (!(frequencyHz > 0)) throw new RangeError(`frequencyHz must be above 0, got ${frequencyHz}`);
  if (!(resonanceHz > 0)) throw new RangeError(`resonanceHz must be above 0, got ${resonanceHz}`);
  if (!(q > 0)) throw new RangeError(`q must be above 0, got ${q}`);
  return 10 * Math.log10(1 / (q * q) + detuning(frequencyHz, resonanceHz) ** 2);
}

/**
 * Loss of a loop or rod against a field, up to a constant: its voltage grows with frequency.
 *
 *     -20 log10 f
 *
 * Source: induction in a loop small against the wavelength, any handbook on aerials.
 *
 * @param frequencyHz Frequency, hertz, above 0.
 * @returns Decibels.
 * @throws {RangeError} If the frequency is not above 0.
 *
 * @example
 *   loopLoss(500e3) - loopLoss(1000e3); // 6.02
 */
export function loopLoss(frequencyHz: number): number {
  if (!(frequencyHz > 0)) throw new RangeError(`frequencyHz must be above 0, got ${frequencyHz}`);
  return -20 * Math.log10(frequencyHz);
}

/**
 * Why a primary cannot be computed on a band; null: it can, or there is none.
 *
 * Between 0.95 of the low end and 1.3 of the high end primary and first circuit pull each other.
 *
 * @param aerial The aerial.
 * @param band The band.
 * @returns A sentence, or null.
 *
 * @example
 *   primaryRefusal({ kind: 'primary', resonanceHz: 380e3, q: 30 }, band); // null
 */
export function primaryRefusal(
  aerial: Aerial | null,
  { lowHz, highHz }: Pick<Band, 'lowHz' | 'highHz'>,
): string | null {
  if (aerial?.kind !== 'primary') return null;
  const { resonanceHz } = aerial;
  if (resonanceHz < TOO_CLOSE.low * lowHz || resonanceHz > TOO_CLOSE.high * highHz) return null;
  return (
    `The aerial primary resonates at ${resonanceHz / 1000} kHz, too close to the band to be ` +
    'computed; it is left out. Enter a measured rejection as stray pick-up instead.'
  );
}

/**
 * The aerial's term on a band; null: none, or refused.
 *
 * @param aerial The aerial.
 * @param band The band.
 * @returns The loss.
 * @example
 *   aerialLoss({ kind: 'loop' }, band)?.lossDb(500e3) - loopLoss(1000e3); // 6.02
 */
export function aerialLoss(
  aerial: Aerial | null,
  band: Pick<Band, 'lowHz' | 'highHz'>,
): FixedLoss | null {
  if (aerial === null || primaryRefusal(aerial, band) !== null) return null;
  if (aerial.kind === 'loop') return { lossDb: loopLoss, greatestDb: (lowHz) => loopLoss(lowHz) };
  const { resonanceHz, q } = aerial;
  const lossDb = (hz: number): number => primaryLoss(hz, resonanceHz, q);
  return { lossDb, greatestDb: (lowHz, highHz) => Math.max(lossDb(lowHz), lossDb(highHz)) };
}
