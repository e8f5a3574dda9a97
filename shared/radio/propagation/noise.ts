/**
 * Man-made radio noise as a field strength.
 *
 * Source: ITU-R P.372; field of the noise from memory, not re-read.
 *
 * @module radio/propagation/noise
 */
import type { NoiseClass, Site } from '../site.ts';
import { type Decibels, decibels } from '../units.ts';

/** Coefficients c and d of ITU-R P.372, `Fam = c - d log10 f(MHz)`. */
const MAN_MADE: Readonly<Record<NoiseClass, readonly [c: number, d: number]>> = {
  city: [76.8, 27.7],
  residential: [72.5, 27.7],
  rural: [67.2, 27.7],
  quiet: [53.6, 28.6],
};

/** What the electronics of a modern house add to the noise, dB. */
const INDOORS_DB = 25;

/**
 * Median field of man-made noise in a receiver's bandwidth.
 *
 *     En = Fam + 20 log10 f(MHz) + 10 log10 b(Hz) - 95.5,   Fam = c - d log10 f(MHz)
 *
 * Indoors in a modern house 25 dB are added. A measured floor replaces all of it, at every
 * frequency and in every bandwidth. At night below 1 MHz the atmosphere is often louder.
 *
 * Valid from 300 kHz; below, the straight line is carried on. Source: ITU-R P.372, Radio noise,
 * man-made noise (c and d); the constant 95.5 (half-wave dipole against short monopole) and the
 * 25 dB from memory of the literature, not re-read.
 *
 * @param site Class of noise, whether indoors, and the measured floor if there is one.
 * @param frequencyHz Frequency, hertz, above 0, whole or not.
 * @param bandwidthHz Noise bandwidth, hertz, above 0.
 * @returns Noise field, dB(uV/m).
 * @throws {RangeError} If there is neither a class nor a floor, or a number is not above 0.
 * @example
 *   noiseField({ noise: 'city', indoors: false, noiseFloorDb: null }, 1e6, 9e3); // 20.84
 */
export function noiseField(
  site: Pick<Site, 'noise' | 'indoors' | 'noiseFloorDb'>,
  frequencyHz: number,
  bandwidthHz: number,
): Decibels {
  if (!(frequencyHz > 0)) throw new RangeError(`frequency must be above 0, got ${frequencyHz}`);
  if (!(bandwidthHz > 0)) throw new RangeError(`bandwidth must be above 0, got ${bandwidthHz}`);
  if (site.noiseFloorDb !== null) return decibels(site.noiseFloorDb);
  if (site.noise === null) {
    throw new RangeError('noise: the site needs a class of noise or a measured noise floor');
  }
  const [c, d] = MAN_MADE[site.noise];
  const decades = Math.log10(frequencyHz / 1e6);
  const external = c - d * decades + 20 * decades + 10 * Math.log10(bandwidthHz) - 95.5;
  return decibels(external + (site.indoors ? INDOORS_DB : 0));
}
