/**
 * What a directional aerial sends towards a bearing.
 *
 * Source: own rule: straight lines between 36 bearings, in decibels.
 *
 * @module radio/propagation/directional-pattern
 */
import { type Decibels, decibels } from '../units.ts';

/** Bearings of a pattern: every 10 degrees from north. */
export const PATTERN_BEARINGS = 36;
const STEP = 360 / PATTERN_BEARINGS;

/**
 * Gain towards a bearing, relative to the power of the list, on a straight line in decibels
 * between the two neighbouring bearings of the table, around the circle.
 *
 * @param patternDb 36 gains, dB, every 10 degrees clockwise from true north.
 * @param bearing Bearing from the station, degrees clockwise from north; any number of turns.
 * @returns Gain, dB.
 * @throws {RangeError} If there are not 36 gains, or a number is not finite.
 * @example
 *   patternGain([0, -10, ...Array(34).fill(-20)], 5); // -5
 */
export function patternGain(patternDb: readonly number[], bearing: number): Decibels {
  if (patternDb.length !== PATTERN_BEARINGS) {
    throw new RangeError(`patternDb: needs ${PATTERN_BEARINGS} gains, got ${patternDb.length}`);
  }
  const place = (((bearing % 360) + 360) % 360) / STEP;
  const before = Math.floor(place) % PATTERN_BEARINGS;
  const share = place - Math.floor(place);
  const low = patternDb[before] ?? NaN;
  const high = patternDb[(before + 1) % PATTERN_BEARINGS] ?? NaN;
  const gain = low + share * (high - low);
  if (!Number.isFinite(gain)) throw new RangeError('patternDb: every gain must be finite');
  return decibels(gain);
}
